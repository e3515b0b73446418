import { useMutation, useQueryClient } from '@tanstack/react-query';
import { write } from '@windrow/client/writes/write';
import { Button } from '@windrow/ui/controls/button';
import { Dialog, DialogActions } from '@windrow/ui/controls/dialog';
import { Notice } from '@windrow/ui/controls/notice';
import { announce } from '@windrow/ui/controls/notice-host';
import { SegmentedChoice } from '@windrow/ui/controls/segmented-tabs';
import type { Unit } from '@windrow/ventilation/contract/board';
import type { Person, PersonChange } from '@windrow/ventilation/contract/setup';
import { useState } from 'react';
import { isStale } from '../form-words.ts';
import { NotSaved } from '../not-saved.tsx';
import { PEOPLE_KEY } from '../setup-queries.ts';
import { GrantsField } from './grants-field.tsx';
import { PasswordForm } from './password-form.tsx';
import { grantsInWords } from './role-words.ts';

const PARTS = [
  { value: 'roles', label: 'Roles' },
  { value: 'password', label: 'Password' },
  { value: 'sign-in', label: 'Sign-in' },
] as const;

/** One person: roles, a new password, and whether they may sign in at all. */
export function PersonDialog({
  person,
  units,
  onClose,
}: {
  person: Person;
  units: readonly Unit[];
  onClose: () => void;
}) {
  const queryClient = useQueryClient();
  const [part, setPart] = useState<(typeof PARTS)[number]['value']>('roles');
  const [grants, setGrants] = useState(person.grants);
  const mutation = useMutation({
    mutationFn: (body: PersonChange) =>
      write<Person>({
        method: 'PATCH',
        path: `/api/people/${encodeURIComponent(person.personId)}`,
        body,
        ifMatch: person.version,
      }),
    onSettled: () => queryClient.invalidateQueries({ queryKey: PEOPLE_KEY }),
    onSuccess: ({ displayName }) => {
      announce(`${displayName} was changed.`);
      onClose();
    },
  });
  const { isPending, error } = mutation;

  return (
    <Dialog
      open
      onClose={onClose}
      title={person.displayName}
      description={`Signs in as ${person.username}. A change signs them out wherever they are signed in.`}
    >
      <SegmentedChoice label="What to change" options={PARTS} value={part} onChoose={setPart} />
      {error && !isStale(error) && <NotSaved error={error} />}
      {error && isStale(error) && (
        <Notice tone="attention" isNews title={`Somebody else changed ${person.displayName} meanwhile`}>
          <p>
            Now: {grantsInWords(person.grants, units)}. What you entered is not saved; save again to put it in
            its place.
          </p>
        </Notice>
      )}
      {part === 'roles' && (
        <>
          <GrantsField grants={grants} units={units} onChange={setGrants} />
          <DialogActions>
            <Button tone="main" disabled={isPending} onClick={() => mutation.mutate({ grants })}>
              Save roles
            </Button>
            <Button onClick={onClose}>Cancel</Button>
          </DialogActions>
        </>
      )}
      {part === 'password' && (
        <PasswordForm
          isPending={isPending}
          onSave={(password) => mutation.mutate({ password })}
          onClose={onClose}
        />
      )}
      {part === 'sign-in' && (
        <>
          <p>
            {person.disabled
              ? 'May not sign in. Roles and everything recorded are kept.'
              : 'May sign in. Stopped, every session ends at once; roles and everything recorded are kept.'}
          </p>
          <DialogActions>
            <Button
              tone="main"
              disabled={isPending}
              onClick={() => mutation.mutate({ disabled: !person.disabled })}
            >
              {person.disabled ? 'Let them sign in again' : 'Stop them signing in'}
            </Button>
            <Button onClick={onClose}>Cancel</Button>
          </DialogActions>
        </>
      )}
    </Dialog>
  );
}
