import { useQuery, useQueryClient } from '@tanstack/react-query';
import { connectLive } from '@windrow/client/live/live-link';
import { sessionQuery } from '@windrow/client/session/session';
import { useEffect } from 'react';
import { CannotRead } from './messages/cannot-read.tsx';
import { Message } from './messages/message.tsx';
import { RETRY_EVERY_MS } from './messages/retry.ts';
import { SignIn } from './sign-in/sign-in.tsx';
import { UnitBoard } from './unit/unit-board.tsx';

/** Somebody must be signed in, if only as a display; then the board, kept by the live link. */
export function Wall() {
  const session = useQuery({
    ...sessionQuery(),
    refetchInterval: ({ state }) =>
      state.data === undefined && state.status === 'error' ? RETRY_EVERY_MS : false,
  });
  if (session.data) return <SignedIn key={session.data.person.personId} />;
  if (session.data === null) return <SignIn />;
  if (session.isError) return <CannotRead error={session.error} onRetry={() => void session.refetch()} />;
  return <Message title="Windrow" sentence="Looking for the server" />;
}

function SignedIn() {
  const queryClient = useQueryClient();
  // A wall hears what displays may hear, whoever has signed in: no names.
  useEffect(() => connectLive({ queryClient, audience: 'display' }), [queryClient]);
  return <UnitBoard />;
}
