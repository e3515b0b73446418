import { zodResolver } from '@hookform/resolvers/zod';
import { useMutation } from '@tanstack/react-query';
import { createFirstAdministrator } from '@windrow/client/session/session';
import { Button } from '@windrow/ui/controls/button';
import { WriteFault } from '@windrow/ui/controls/faults';
import { TextField } from '@windrow/ui/controls/text-field';
import { FirstAdministrator, type Session } from '@windrow/ventilation/contract/session';
import { useForm } from 'react-hook-form';
import { z } from 'zod';

const Form = FirstAdministrator.extend({ again: z.string() }).refine(
  (values) => values.again === values.password,
  {
    path: ['again'],
    error: 'the two passwords are not the same',
  },
);
type Form = z.infer<typeof Form>;

/** An empty Windrow: the first person, who then makes units, beds and people. */
export function FirstRunPage({ onSignedIn }: { onSignedIn: (session: Session) => void }) {
  const form = useForm<Form>({
    resolver: zodResolver(Form),
    defaultValues: { username: '', displayName: '', password: '', again: '' },
  });
  const { errors } = form.formState;
  const attempt = useMutation({
    mutationFn: ({ username, displayName, password }: Form) =>
      createFirstAdministrator({ username, displayName, password }),
    onSuccess: onSignedIn,
  });

  return (
    <form
      noValidate
      aria-labelledby="first-run-title"
      className="flex flex-col gap-4 rounded-xl bg-tile p-6"
      onSubmit={form.handleSubmit((values) => attempt.mutate(values))}
    >
      <h1 id="first-run-title" className="font-bold text-xl">
        The first administrator
      </h1>
      <p>
        This Windrow is empty. Whoever sets it up signs in with this name, then makes units, beds and people.
      </p>
      <TextField
        label="Your name"
        hint="As others will read it"
        error={errors.displayName?.message}
        {...form.register('displayName')}
      />
      <TextField
        label="User name"
        autoComplete="username"
        autoCapitalize="none"
        spellCheck={false}
        error={errors.username?.message}
        {...form.register('username')}
      />
      <TextField
        label="Password"
        type="password"
        hint="At least 12 characters; several words are a good way"
        autoComplete="new-password"
        error={errors.password?.message}
        {...form.register('password')}
      />
      <TextField
        label="Password again"
        type="password"
        autoComplete="new-password"
        error={errors.again?.message}
        {...form.register('again')}
      />
      <WriteFault error={attempt.error} />
      <Button type="submit" tone="main" disabled={attempt.isPending}>
        {attempt.isPending ? 'Setting up …' : 'Set up Windrow'}
      </Button>
    </form>
  );
}
