import { zodResolver } from '@hookform/resolvers/zod';
import { useMutation, useQueryClient } from '@tanstack/react-query';
import { UNITS_KEY } from '@windrow/client/board/board-queries';
import { write } from '@windrow/client/writes/write';
import { Button } from '@windrow/ui/controls/button';
import { Dialog, DialogActions } from '@windrow/ui/controls/dialog';
import { SelectField } from '@windrow/ui/controls/select-field';
import { TextField } from '@windrow/ui/controls/text-field';
import type { Unit } from '@windrow/ventilation/contract/board';
import { NewUnit } from '@windrow/ventilation/contract/setup';
import { useForm } from 'react-hook-form';
import { NotSaved } from '../not-saved.tsx';

/** A unit: its name and the clock on its wall. Its policy begins with common practice, to be looked through. */
export function NewUnitDialog({ onAdded, onClose }: { onAdded: (unit: Unit) => void; onClose: () => void }) {
  const queryClient = useQueryClient();
  const form = useForm({
    resolver: zodResolver(NewUnit),
    defaultValues: { name: '', timeZone: Intl.DateTimeFormat().resolvedOptions().timeZone },
  });
  const { errors } = form.formState;
  const mutation = useMutation({
    mutationFn: (body: NewUnit) => write<Unit>({ method: 'POST', path: '/api/units', body }),
    onSuccess: async (unit) => {
      await queryClient.invalidateQueries({ queryKey: UNITS_KEY });
      onAdded(unit);
    },
  });
  return (
    <Dialog open onClose={onClose} title="Add a unit">
      <form
        noValidate
        onSubmit={(event) => void form.handleSubmit((body) => mutation.mutate(body))(event)}
        className="flex flex-col gap-4"
      >
        <TextField
          label="Name"
          hint="as staff say it"
          error={errors.name && 'enter a name of up to 60 letters'}
          {...form.register('name')}
        />
        <SelectField
          label="Time zone"
          hint="all times of the unit are shown by it"
          options={timeZones().map((zone) => ({ value: zone, label: zone.replaceAll('_', ' ') }))}
          error={errors.timeZone?.message}
          {...form.register('timeZone')}
        />
        {mutation.error && <NotSaved error={mutation.error} title="Not added" />}
        <DialogActions>
          <Button type="submit" tone="main" disabled={mutation.isPending}>
            {mutation.isPending ? 'Adding …' : 'Add'}
          </Button>
          <Button onClick={onClose}>Cancel</Button>
        </DialogActions>
      </form>
    </Dialog>
  );
}

/** Every zone that this device knows, its own and UTC among them. */
function timeZones(): string[] {
  const own = Intl.DateTimeFormat().resolvedOptions().timeZone;
  return [...new Set([...Intl.supportedValuesOf('timeZone'), 'UTC', own])].sort();
}
