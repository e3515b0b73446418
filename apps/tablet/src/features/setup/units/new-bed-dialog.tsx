import { zodResolver } from '@hookform/resolvers/zod';
import { useMutation } from '@tanstack/react-query';
import { write } from '@windrow/client/writes/write';
import { Button } from '@windrow/ui/controls/button';
import { Dialog, DialogActions } from '@windrow/ui/controls/dialog';
import { TextField } from '@windrow/ui/controls/text-field';
import type { Bed } from '@windrow/ventilation/contract/board';
import { NewBed } from '@windrow/ventilation/contract/setup';
import { useForm } from 'react-hook-form';
import { NotSaved } from '../not-saved.tsx';
import { bedsPath } from '../setup-queries.ts';
import { useBedsChanged } from './use-beds-changed.ts';

/** A bed for a free cell; a whole row is added by going on to the next. */
export function NewBedDialog({
  unitId,
  place,
  label,
  hasNext,
  onClose,
  onNext,
}: {
  unitId: string;
  place: { row: number; column: number };
  /** What is offered as its label. */
  label: string;
  hasNext: boolean;
  onClose: () => void;
  onNext: () => void;
}) {
  const changed = useBedsChanged();
  const form = useForm({
    resolver: zodResolver(NewBed),
    defaultValues: { label, row: place.row, column: place.column },
  });
  const mutation = useMutation({
    mutationFn: ({ bed }: { bed: NewBed; then: () => void }) =>
      write<Bed>({ method: 'POST', path: bedsPath(unitId), body: bed }),
    onSuccess: async (_, { then }) => {
      // The next label is offered from the beds as they are then.
      await changed();
      then();
    },
  });
  const send = (then: () => void) => form.handleSubmit((bed) => mutation.mutate({ bed, then }));

  return (
    <Dialog
      open
      onClose={onClose}
      title="Add a bed"
      description={`Row ${place.row}, column ${place.column} of the floor plan.`}
    >
      <form noValidate onSubmit={(event) => void send(onClose)(event)} className="flex flex-col gap-4">
        <TextField
          label="Label"
          hint="as it is written at the bed, up to 6 letters or figures"
          error={form.formState.errors.label && 'enter a label of 1 to 6 letters or figures'}
          {...form.register('label')}
        />
        {mutation.error && <NotSaved error={mutation.error} title="Not added" />}
        <DialogActions>
          <Button type="submit" tone="main" disabled={mutation.isPending}>
            {mutation.isPending ? 'Adding …' : 'Add'}
          </Button>
          {hasNext && (
            <Button disabled={mutation.isPending} onClick={(event) => void send(onNext)(event)}>
              Add, then the next
            </Button>
          )}
          <Button tone="quiet" onClick={onClose}>
            Cancel
          </Button>
        </DialogActions>
      </form>
    </Dialog>
  );
}
