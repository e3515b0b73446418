import { useMutation, useQueryClient } from '@tanstack/react-query';
import { NetworkError, ProblemError } from '@windrow/client/http';
import { keepBed } from '@windrow/client/writes/keep-bed';
import { write } from '@windrow/client/writes/write';
import type { Bed } from '@windrow/ventilation/contract/board';
import { useEffect, useRef, useState } from 'react';

/** A fact answers with its bed, a transfer with both. */
type Recorded = { bed?: Bed | null; beds?: Bed[] };

/** One act: however often it is sent, under its key it is recorded once. */
export type Act = { key: string; body: unknown };

export type RecordingState = 'idle' | 'sending' | 'sending-again' | 'no-network' | 'refused';

export type Recording = {
  state: RecordingState;
  problem: ProblemError | null;
  send: (act: Act) => void;
  /** Back to nothing sent; what was to be sent again is not. */
  reset: () => void;
};

const AGAIN_AFTER_MS = 8_000;

/**
 * Sends one act until it is answered.
 *
 * @param onRecorded told whether the person is still on the page that it was sent from: who has gone on must
 * not be called back. (The form itself may be gone: a transfer empties the very bed on whose page it stood.)
 */
export function useRecording({
  path,
  onRecorded,
  onUnanswered,
  onRefused,
}: {
  path: string;
  onRecorded: (act: Act, isHere: boolean) => void;
  /** A try got no answer: from now on it may stand in the record. */
  onUnanswered: () => void;
  onRefused: (problem: ProblemError) => void;
}): Recording {
  const queryClient = useQueryClient();
  const [isAgain, setAgain] = useState(false);
  const sentFrom = useRef<string | null>(null);

  const mutation = useMutation({
    mutationFn: ({ key, body }: Act) =>
      write<Recorded>({
        ...{ method: 'POST', path, body, key },
        onRetry: () => {
          setAgain(true);
          onUnanswered();
        },
      }),
    onSuccess: async ({ bed, beds = bed ? [bed] : [] }, act) => {
      for (const changed of beds) await keepBed(queryClient, changed);
      onRecorded(act, window.location.pathname === sentFrom.current);
      await queryClient.invalidateQueries({ queryKey: ['record'] });
    },
    onError: (error) => {
      if (error instanceof ProblemError) onRefused(error);
      else onUnanswered();
    },
  });
  const { mutate, variables, error } = mutation;
  const isLost = error instanceof NetworkError;

  // It was decided once; the network alone is in the way, so it is not asked for again.
  useEffect(() => {
    if (!isLost || !variables) return;
    const timer = setTimeout(() => mutate(variables), AGAIN_AFTER_MS);
    return () => clearTimeout(timer);
  }, [isLost, mutate, variables]);

  return {
    state: stateOf({
      isPending: mutation.isPending,
      isAgain,
      isLost,
      isRefused: error instanceof ProblemError,
    }),
    problem: error instanceof ProblemError ? error : null,
    send: (act) => {
      setAgain(false);
      sentFrom.current = window.location.pathname;
      mutate(act);
    },
    reset: mutation.reset,
  };
}

function stateOf({
  isPending,
  isAgain,
  isLost,
  isRefused,
}: {
  isPending: boolean;
  isAgain: boolean;
  isLost: boolean;
  isRefused: boolean;
}): RecordingState {
  if (isPending) return isAgain ? 'sending-again' : 'sending';
  if (isLost) return 'no-network';
  return isRefused ? 'refused' : 'idle';
}
