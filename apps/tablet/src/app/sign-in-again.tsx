import { useQueryClient } from '@tanstack/react-query';
import { closeDialogs } from '@windrow/ui/controls/dialog';
import type { Session } from '@windrow/ventilation/contract/session';
import { useEffect } from 'react';
import { SignInPage } from '../features/session/sign-in-page.tsx';
import { OutsideFrame } from './outside-frame.tsx';
import { takeSession } from './session-state.ts';

/**
 * The session has ended by itself. The page behind is kept as it was, out of sight and out of reach;
 * the same person goes on where they were, another one starts afresh.
 */
export function SignInAgain({ session }: { session: Session }) {
  const queryClient = useQueryClient();
  useEffect(closeDialogs, []);

  const take = (signedIn: Session) => {
    if (takeSession(queryClient, signedIn)) void queryClient.invalidateQueries();
    else window.location.replace('/');
  };
  return (
    <div className="fixed inset-0 z-50 overflow-y-auto">
      <OutsideFrame isDemonstration={session.demonstration}>
        <SignInPage
          title="Sign in again"
          words={`Your session has ended. What ${session.person.displayName} has typed is kept.`}
          username={session.person.username}
          onSignedIn={take}
        />
      </OutsideFrame>
    </div>
  );
}
