import { useQueryClient } from '@tanstack/react-query';
import { ProblemError } from '@windrow/client/http';
import { signOut } from '@windrow/client/session/session';
import { useCallback, useState } from 'react';
import { useNavigate } from 'react-router-dom';
import { dropSession } from './session-state.ts';

/**
 * Ends the session on the server first: a tablet that only forgot it would leave a cookie behind for the
 * next hand. Where the server cannot be reached it says so.
 */
export function useSignOut(): { leave: () => Promise<void>; fault: string | null; forget: () => void } {
  const queryClient = useQueryClient();
  const navigate = useNavigate();
  const [fault, setFault] = useState<string | null>(null);

  const leave = async () => {
    try {
      await signOut();
    } catch (error) {
      const isOver = error instanceof ProblemError && error.problem.status === 401;
      if (!isOver) {
        setFault('The server did not answer, so you are still signed in on this tablet.');
        return;
      }
    }
    setFault(null);
    dropSession(queryClient);
    await navigate('/');
  };
  return { leave, fault, forget: useCallback(() => setFault(null), []) };
}
