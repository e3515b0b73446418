import { useMutation, useQueryClient } from '@tanstack/react-query';
import { serverNow } from '@windrow/client/clock/server-clock';
import { actKeys } from '@windrow/client/writes/act-key';
import { keepBed } from '@windrow/client/writes/keep-bed';
import { write } from '@windrow/client/writes/write';
import { announce } from '@windrow/ui/controls/notice-host';
import type { Bed } from '@windrow/ventilation/contract/board';
import type { Happening } from '@windrow/ventilation/contract/observations';
import { useState } from 'react';

export type NewHappening = Omit<Happening, 'observedAt'>;
type Recorded = { bed: Bed | null };

/**
 * Records a happening as of now. The moment is that of the first press: pressed again after a lost network the
 * same act goes out with the same time and key, so that it is recorded once.
 */
export function useHappening({ stayId, doneWords }: { stayId: string; doneWords: string }) {
  const queryClient = useQueryClient();
  const [acts] = useState(() => ({ keyOf: actKeys(), last: null as { text: string; at: string } | null }));
  return useMutation({
    mutationFn: (happening: NewHappening) => {
      const text = JSON.stringify(happening);
      if (acts.last?.text !== text) acts.last = { text, at: new Date(serverNow()).toISOString() };
      const body = { observedAt: acts.last.at, ...happening };
      return write<Recorded>({
        method: 'POST',
        path: `/api/stays/${encodeURIComponent(stayId)}/happenings`,
        body,
        key: acts.keyOf(body),
      });
    },
    onSuccess: async ({ bed }) => {
      acts.last = null;
      announce(doneWords);
      if (bed) await keepBed(queryClient, bed);
      await queryClient.invalidateQueries({ queryKey: ['record'] });
    },
  });
}
