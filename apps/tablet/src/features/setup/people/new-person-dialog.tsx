import { zodResolver } from '@hookform/resolvers/zod';
import { useMutation, useQueryClient } from '@tanstack/react-query';
import { write } from '@windrow/client/writes/write';
import { Button } from '@windrow/ui/controls/button';
import { Dialog, DialogActions } from '@windrow/ui/controls/dialog';
import { announce } from '@windrow/ui/controls/notice-host';
import { TextField } from '@windrow/ui/controls/text-field';
import type { Unit } from '@windrow/ventilation/contract/board';
import { NewPerson, type Person } from '@windrow/ventilation/contract/setup';
import type { Grant } from '@windrow/ventilation/permissions/permissions';
import { Controller, useForm } from 'react-hook-form';
import { NotSaved } from '../not-saved.tsx';
import { PEOPLE_KEY } from '../setup-queries.ts';
import { GrantsField } from './grants-field.tsx';

/** Somebody who may sign in, with the roles that say what they may see and do. */
export function NewPersonDialog({ units, onClose }: { units: readonly Unit[]; onClose: () => void }) {
  const queryClient = useQueryClient();
  const grants: Grant[] = [{ role: 'therapist', unitId: units[0]?.unitId ?? null }];
  const form = useForm({
    resolver: zodResolver(NewPerson),
    defaultValues: { username: '', displayName: '', initials: '', password: '', grants },
  });
  const { errors } = form.formState;
  const mutation = useMutation({
    mutationFn: (body: NewPerson) => write<Person>({ method: 'POST', path: '/api/people', body }),
    onSuccess: async ({ displayName }) => {
      await queryClient.invalidateQueries({ queryKey: PEOPLE_KEY });
      announce(`${displayName} may sign in.`);
      onClose();
    },
  });
  return (
    <Dialog open onClose={onClose} title="Add a person">
      <form
        noValidate
        onSubmit={(event) => void form.handleSubmit((body) => mutation.mutate(body))(event)}
        className="flex flex-col gap-4"
      >
        <TextField
          label="Name"
          error={errors.displayName && 'enter a name of 2 to 80 letters'}
          {...form.register('displayName')}
        />
        <div className="grid gap-4 sm:grid-cols-2">
          <TextField
            label="Initials"
            hint="on the wall, up to 3 letters"
            error={errors.initials && 'enter 1 to 3 letters'}
            {...form.register('initials')}
          />
          <TextField
            label="User name"
            hint="to sign in with"
            autoCapitalize="none"
            spellCheck={false}
            error={errors.username?.message}
            {...form.register('username')}
          />
        </div>
        <TextField
          label="First password"
          type="password"
          autoComplete="new-password"
          hint="at least 12 characters"
          error={errors.password?.message}
          {...form.register('password')}
        />
        <Controller
          control={form.control}
          name="grants"
          render={({ field }) => <GrantsField grants={field.value} units={units} onChange={field.onChange} />}
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
