import { zodResolver } from '@hookform/resolvers/zod';
import { Button } from '@windrow/ui/controls/button';
import { DialogActions } from '@windrow/ui/controls/dialog';
import { TextField } from '@windrow/ui/controls/text-field';
import { NewPassword } from '@windrow/ventilation/contract/session';
import { useForm } from 'react-hook-form';
import { z } from 'zod';

const Entry = z.object({ password: NewPassword });

/** A new password for somebody who has lost theirs. */
export function PasswordForm({
  isPending,
  onSave,
  onClose,
}: {
  isPending: boolean;
  onSave: (password: string) => void;
  onClose: () => void;
}) {
  const form = useForm({ resolver: zodResolver(Entry), defaultValues: { password: '' } });
  return (
    <form
      noValidate
      onSubmit={(event) => void form.handleSubmit(({ password }) => onSave(password))(event)}
      className="flex flex-col gap-4"
    >
      <TextField
        label="New password"
        type="password"
        autoComplete="new-password"
        hint="at least 12 characters"
        error={form.formState.errors.password?.message}
        {...form.register('password')}
      />
      <DialogActions>
        <Button type="submit" tone="main" disabled={isPending}>
          Set password
        </Button>
        <Button onClick={onClose}>Cancel</Button>
      </DialogActions>
    </form>
  );
}
