import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { ProblemError } from '@windrow/client/http';
import { SESSION_KEY, signIn, startQuery } from '@windrow/client/session/session';
import type { FormEvent } from 'react';
import { Button } from '../messages/button.tsx';
import { Message } from '../messages/message.tsx';
import { Field } from './field.tsx';

/** A display's own account, or a person's: the wall shows the same to both. */
export function SignIn() {
  const start = useQuery(startQuery());
  const queryClient = useQueryClient();
  const signing = useMutation({
    mutationFn: signIn,
    onSuccess: (session) => queryClient.setQueryData(SESSION_KEY, session),
  });

  const handleSubmit = (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    const form = new FormData(event.currentTarget);
    signing.mutate({ username: String(form.get('username')), password: String(form.get('password')) });
  };

  if (start.data?.needsAdministrator) {
    return (
      <Message
        title="Windrow is not set up yet"
        sentence="Its first administrator is made on the tablet's side."
      >
        <a className="font-bold underline" href="/">
          Go there
        </a>
      </Message>
    );
  }
  return (
    <Message title="Windrow wall" sentence="Sign in with the account of this display, or with your own.">
      {start.data?.demonstration && <p className="font-bold">Demonstration data</p>}
      <form className="flex flex-col gap-5" onSubmit={handleSubmit}>
        <Field name="username" label="User name" autoComplete="username" />
        <Field name="password" label="Password" type="password" autoComplete="current-password" />
        <p role="alert" className="min-h-8 font-bold">
          {signing.isError && whyNot(signing.error)}
        </p>
        <div>
          <Button disabled={signing.isPending}>{signing.isPending ? 'Signing in' : 'Sign in'}</Button>
        </div>
      </form>
    </Message>
  );
}

function whyNot(error: Error): string {
  return error instanceof ProblemError ? error.problem.detail : 'The server cannot be reached. Try again.';
}
