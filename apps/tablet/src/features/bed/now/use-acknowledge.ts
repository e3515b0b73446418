import { useMutation, useQueryClient } from '@tanstack/react-query';
import { actKeys } from '@windrow/client/writes/act-key';
import { keepBed } from '@windrow/client/writes/keep-bed';
import { write } from '@windrow/client/writes/write';
import { announce } from '@windrow/ui/controls/notice-host';
import type { Bed } from '@windrow/ventilation/contract/board';
import type { Acknowledgement } from '@windrow/ventilation/contract/observations';
import { useState } from 'react';

/** Sends one acknowledgement; the same words are recorded once, however often they are sent. */
export function useAcknowledge({
  stayId,
  short,
  onDone,
}: {
  stayId: string;
  short: string;
  onDone: () => void;
}) {
  const queryClient = useQueryClient();
  const [keyOf] = useState(actKeys);
  return useMutation({
    mutationFn: (body: Acknowledgement) =>
      write<{ bed: Bed | null }>({
        method: 'POST',
        path: `/api/stays/${encodeURIComponent(stayId)}/acknowledgements`,
        body,
        key: keyOf(body),
      }),
    onSuccess: async ({ bed }) => {
      if (bed) await keepBed(queryClient, bed);
      announce(`${short}: acknowledged`);
      onDone();
      await queryClient.invalidateQueries({ queryKey: ['record', stayId] });
    },
  });
}
