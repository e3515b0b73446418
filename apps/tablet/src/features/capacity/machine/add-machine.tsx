import { zodResolver } from '@hookform/resolvers/zod';
import { useMutation, useQueryClient } from '@tanstack/react-query';
import { ProblemError } from '@windrow/client/http';
import { write } from '@windrow/client/writes/write';
import { Button } from '@windrow/ui/controls/button';
import { Dialog, DialogActions } from '@windrow/ui/controls/dialog';
import { Notice } from '@windrow/ui/controls/notice';
import { announce } from '@windrow/ui/controls/notice-host';
import { SelectField } from '@windrow/ui/controls/select-field';
import { TextField } from '@windrow/ui/controls/text-field';
import { NewVentilator, VENTILATOR_CLASSES, type Ventilator } from '@windrow/ventilation/contract/fleet';
import { useForm } from 'react-hook-form';
import { FLEET_KEY } from '../capacity-queries.ts';
import type { UnitNames } from './place-words.ts';

/** A machine that the fleet does not have yet. */
export function AddMachine({ units, onClose }: { units: UnitNames; onClose: () => void }) {
  const queryClient = useQueryClient();
  const form = useForm({
    resolver: zodResolver(NewVentilator),
    defaultValues: { assetNumber: '', model: '', class: 'adult-icu', homeUnitId: null },
  });
  const { errors } = form.formState;
  const mutation = useMutation({
    mutationFn: (body: NewVentilator) =>
      write<Ventilator>({ method: 'POST', path: '/api/ventilators', body }),
    onSuccess: (machine) => {
      for (const queryKey of [FLEET_KEY, ['capacity']]) void queryClient.invalidateQueries({ queryKey });
      announce(`${machine.assetNumber} is in the fleet.`);
      onClose();
    },
  });
  const isRefused = mutation.error instanceof ProblemError;

  return (
    <Dialog open onClose={onClose} title="Add a machine">
      <form
        noValidate
        onSubmit={(event) => void form.handleSubmit((body) => mutation.mutate(body))(event)}
        className="flex flex-col gap-4"
      >
        <TextField
          label="Asset number"
          error={errors.assetNumber && 'enter the number on its label, up to 30 letters'}
          {...form.register('assetNumber')}
        />
        <TextField
          label="Model"
          error={errors.model && 'enter the model, up to 60 letters'}
          {...form.register('model')}
        />
        <SelectField
          label="Class"
          options={Object.entries(VENTILATOR_CLASSES).map(([value, label]) => ({ value, label }))}
          {...form.register('class')}
        />
        <SelectField
          label="Belongs to"
          empty="the house"
          options={[...units].map(([value, label]) => ({ value, label }))}
          {...form.register('homeUnitId', { setValueAs: (value: string | null) => value || null })}
        />
        {mutation.error && (
          <Notice tone="attention" isNews title={isRefused ? 'Not added' : 'No answer from the server'}>
            <p>
              {isRefused
                ? mutation.error.message
                : 'What you entered is kept. Look for the number in the fleet before you add it again.'}
            </p>
          </Notice>
        )}
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
