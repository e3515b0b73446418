import { useMutation, useQueryClient } from '@tanstack/react-query';
import { serverNow } from '@windrow/client/clock/server-clock';
import { actKeys } from '@windrow/client/writes/act-key';
import { keepBed } from '@windrow/client/writes/keep-bed';
import { write } from '@windrow/client/writes/write';
import { Button } from '@windrow/ui/controls/button';
import { WriteFault } from '@windrow/ui/controls/faults';
import { announce } from '@windrow/ui/controls/notice-host';
import type { Bed } from '@windrow/ventilation/contract/board';
import type { EnteredSigns, Surveillance } from '@windrow/ventilation/contract/surveillance';
import { formatDay } from '@windrow/ventilation/format/clock';
import { dayMoved } from '@windrow/ventilation/format/zoned-time';
import { useState } from 'react';
import { surveillanceKey } from './surveillance-query.ts';

/** The days of one agent; the day after the last is entered by one press, since a course is many days alike. */
export function AntimicrobialCourse({
  course: { agent, days },
  surveillance: { stayId, today },
  mayEnter,
}: {
  course: EnteredSigns['antimicrobialDays'][number];
  surveillance: Surveillance;
  mayEnter: boolean;
}) {
  const queryClient = useQueryClient();
  const [keyFor] = useState(actKeys);
  const next = dayMoved(days.at(-1) ?? today, 1);
  const enter = useMutation({
    mutationFn: () => {
      const act = { sign: 'antimicrobial', agent, day: next };
      return write<{ bed: Bed | null }>({
        method: 'POST',
        path: `/api/stays/${encodeURIComponent(stayId)}/infection-signs`,
        body: { ...act, observedAt: new Date(serverNow()).toISOString() },
        key: keyFor(act),
      });
    },
    onSuccess: async ({ bed }) => {
      announce(`${agent} on ${formatDay(next)} recorded`);
      if (bed) await keepBed(queryClient, bed);
      await queryClient.invalidateQueries({ queryKey: surveillanceKey(stayId) });
      await queryClient.invalidateQueries({ queryKey: ['record'] });
    },
  });
  return (
    <div>
      <h3 className="text-ink-muted text-sm">{agent}, given on</h3>
      <div className="flex flex-wrap items-center gap-x-3 gap-y-1">
        <p>{days.map(formatDay).join(' · ')}</p>
        {mayEnter && next <= today && (
          <Button tone="quiet" disabled={enter.isPending} onClick={() => enter.mutate()}>
            <span className="sr-only">{agent} </span>also given on {formatDay(next)}
          </Button>
        )}
      </div>
      <WriteFault error={enter.error} />
    </div>
  );
}
