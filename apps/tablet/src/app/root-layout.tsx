import { useQuery, useQueryClient } from '@tanstack/react-query';
import { connectLive } from '@windrow/client/live/live-link';
import { sessionQuery, startQuery } from '@windrow/client/session/session';
import { hasUnfinished } from '@windrow/client/writes/drafts';
import { ReadFault } from '@windrow/ui/controls/faults';
import { LoadingState } from '@windrow/ui/controls/states';
import { useEffect } from 'react';
import { FirstRunPage } from '../features/session/first-run-page.tsx';
import { SignInPage } from '../features/session/sign-in-page.tsx';
import { OutsideFrame } from './outside-frame.tsx';

import { takeSession, useSessionOver } from './session-state.ts';
import { Shell } from './shell.tsx';

/** Who is there decides what is shown: the first run, the sign-in, or the work. */
export function RootLayout() {
  const queryClient = useQueryClient();
  const session = useQuery(sessionQuery());
  const start = useQuery(startQuery());
  const personId = session.data?.person.personId ?? null;
  useLiveLink(personId);
  useLeavingQuestion();

  if (session.isPending || start.isPending)
    return (
      <OutsideFrame isDemonstration={false}>
        <LoadingState what="Windrow" />
      </OutsideFrame>
    );
  if (session.data) return <Shell session={session.data} />;
  const fault = session.error ?? start.error;
  if (fault || !start.data) {
    return (
      <OutsideFrame isDemonstration={false}>
        <ReadFault
          error={fault}
          what="Windrow"
          onRetry={() => void Promise.all([session.refetch(), start.refetch()])}
        />
      </OutsideFrame>
    );
  }
  return (
    <OutsideFrame isDemonstration={start.data.demonstration}>
      {start.data.needsAdministrator ? (
        <FirstRunPage onSignedIn={(signedIn) => void takeSession(queryClient, signedIn)} />
      ) : (
        <SignInPage onSignedIn={(signedIn) => void takeSession(queryClient, signedIn)} />
      )}
    </OutsideFrame>
  );
}

/** The link belongs to a session: another person, or the same one signed in again, gets a new one. */
function useLiveLink(personId: string | null): void {
  const queryClient = useQueryClient();
  const isOver = useSessionOver();
  useEffect(() => {
    if (personId === null || isOver) return;
    return connectLive({ queryClient, audience: 'staff' });
  }, [queryClient, personId, isOver]);
}

/** The browser asks before a page with something unrecorded is closed. */
function useLeavingQuestion(): void {
  useEffect(() => {
    const ask = (event: BeforeUnloadEvent) => {
      if (hasUnfinished()) event.preventDefault();
    };
    window.addEventListener('beforeunload', ask);
    return () => window.removeEventListener('beforeunload', ask);
  }, []);
}
