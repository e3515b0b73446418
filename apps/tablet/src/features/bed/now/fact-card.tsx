import { AgeMark } from '@windrow/ui/controls/age-mark';
import type { ShownGroup } from '@windrow/ventilation/board/shown-bed';
import { formatMoment } from '@windrow/ventilation/format/clock';
import { type ReactNode, useId } from 'react';

const STATE_WORDS = {
  current: '',
  due: 'due',
  overdue: 'overdue',
  withdrawn: 'withdrawn',
  never: '',
} as const;
/** Wide rake lines over what is overdue, dense ones over what is withdrawn; the words stand on plates. */
const RAKES = { current: '', due: '', overdue: 'rake-wide', withdrawn: 'rake-dense', never: '' } as const;

/** One group of facts: its name, how old it is, and what it says; past its end only that it is past. */
export function FactCard({
  title,
  group,
  stamp,
  now,
  timeZone,
  children,
}: {
  title: string;
  group: ShownGroup;
  stamp: { observedAt: string; recordedByInitials: string; changedSinceAt: string | null } | null;
  now: number;
  timeZone: string;
  children: ReactNode;
}) {
  const id = useId();
  const { state, observedAt, ageMinutes } = group;
  return (
    <section aria-labelledby={id} className={`overflow-hidden rounded-xl bg-tile ${RAKES[state]}`}>
      <div className="flex flex-wrap items-center gap-x-3 gap-y-1 bg-tile px-4 pt-3 pb-2">
        <h2 id={id} className="font-bold text-lg">
          {title}
        </h2>
        {stamp && (
          <p className="text-ink-muted text-sm">
            {formatMoment(stamp.observedAt, now, timeZone)} · {stamp.recordedByInitials}
          </p>
        )}
        {stamp?.changedSinceAt && (
          <p className="rounded-md border-2 border-ink px-2 font-bold text-sm">
            before change {formatMoment(stamp.changedSinceAt, now, timeZone)}
          </p>
        )}
        {ageMinutes !== null && (
          <p className="ml-auto flex items-center gap-2">
            <span className="text-ink-muted text-sm" aria-hidden="true">
              {STATE_WORDS[state]}
            </span>
            <AgeMark state={state} ageMinutes={ageMinutes} />
          </p>
        )}
      </div>
      {state === 'withdrawn' ? (
        <p className="p-4">
          <span className="rounded-sm bg-tile px-2 py-1 font-bold">
            no current {title.toLowerCase()}
            {observedAt && (
              <span className="font-normal text-ink-muted">
                , last {formatMoment(observedAt, now, timeZone)}
              </span>
            )}
          </span>
        </p>
      ) : (
        <div className={state === 'overdue' ? 'm-3 rounded-lg bg-tile p-2' : 'px-4 pb-3'}>
          {state === 'never' ? <p className="text-ink-muted">no {title.toLowerCase()} yet</p> : children}
        </div>
      )}
    </section>
  );
}
