import { zodResolver } from '@hookform/resolvers/zod';
import { useMutation } from '@tanstack/react-query';
import { signIn } from '@windrow/client/session/session';
import { Button } from '@windrow/ui/controls/button';
import { WriteFault } from '@windrow/ui/controls/faults';
import { TextField } from '@windrow/ui/controls/text-field';
import { type Session, SignIn } from '@windrow/ventilation/contract/session';
import { useEffect } from 'react';
import { useForm } from 'react-hook-form';

/** User name and password. Also over a page whose session has ended. */
export function SignInPage({
  title = 'Sign in',
  words,
  username = '',
  onSignedIn,
}: {
  title?: string;
  words?: string;
  /** Who is expected, where somebody is. */
  username?: string;
  onSignedIn: (session: Session) => void;
}) {
  const form = useForm<SignIn>({
    resolver: zodResolver(SignIn),
    defaultValues: { username, password: '' },
  });
  const { errors } = form.formState;
  const attempt = useMutation({
    mutationFn: signIn,
    onSuccess: onSignedIn,
    onError: () => form.setFocus('password'),
  });

  const { setFocus } = form;
  useEffect(() => setFocus(username === '' ? 'username' : 'password'), [setFocus, username]);

  return (
    <form
      noValidate
      aria-labelledby="sign-in-title"
      className="flex flex-col gap-4 rounded-xl bg-tile p-6"
      onSubmit={form.handleSubmit((values) => attempt.mutate(values))}
    >
      <h1 id="sign-in-title" className="font-bold text-xl">
        {title}
      </h1>
      {words && <p>{words}</p>}
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
        autoComplete="current-password"
        error={errors.password?.message}
        {...form.register('password')}
      />
      <WriteFault error={attempt.error} />
      <Button type="submit" tone="main" disabled={attempt.isPending}>
        {attempt.isPending ? 'Signing in …' : 'Sign in'}
      </Button>
    </form>
  );
}
