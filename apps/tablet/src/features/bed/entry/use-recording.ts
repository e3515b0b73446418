import { useMutation, useQueryClient } from '@tanstack/react-query';
import { NetworkError, ProblemError } from '@windrow/client/http';
import { actKeys } from '@windrow/client/writes/act-key';
import { keepBed } from '@windrow/client/writes/keep-bed';
import { write } from '@windrow/client/writes/write';
import type { Bed } from '@windrow/ventilation/contract/board';
import { useEffect, useState } from 'react';

/** A fact answers with its bed, a transfer with both. */
type Recorded = { bed?: Bed | null; beds?: Bed[] };

export type RecordingState = 'idle' | 'sending' | 'sending-again' | 'no-network' | 'refused';

export type Recording = {
  state: RecordingState;
  problem: ProblemError | null;
  send: (body: unknown) => void;
  reset: () => void;
};

const AGAIN_AFTER_MS = 8_000;

/**
 * Sends one entry until it is answered, always under the key of its words.
 */
export function useRecording({
  path,
  onRecorded,
  onRefused,
}: {
  path: string;
  onRecorded: () => void;
  onRefused: (problem: ProblemError) => void;
}): Recording {
  const queryClient = useQueryClient();
  const [keyOf] = useState(actKeys);
  const [isAgain, setAgain] = useState(false);

  const mutation = useMutation({
    mutationFn: (body: unknown) => {
      return write<Recorded>({ method: 'POST', path, body, key: keyOf(body), onRetry: () => setAgain(true) });
    },
    onSuccess: async ({ bed, beds = bed ? [bed] : [] }) => {
      for (const changed of beds) await keepBed(queryClient, changed);
      onRecorded();
      await queryClient.invalidateQueries({ queryKey: ['record'] });
    },
    onError: (error) => {
      if (error instanceof ProblemError) onRefused(error);
    },
  });
  const { mutate, variables, error } = mutation;
  const isLost = error instanceof NetworkError;

  // It was decided once; the network alone is in the way, so it is not asked for again.
  useEffect(() => {
    if (!isLost) return;
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
    send: (body) => {
      setAgain(false);
      mutate(body);
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
