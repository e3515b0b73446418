import { useQuery } from '@tanstack/react-query';
import { ReadFault, WriteFault } from '@windrow/ui/controls/faults';
import { EmptyState, LoadingState } from '@windrow/ui/controls/states';
import type { Surveillance } from '@windrow/ventilation/contract/surveillance';
import { formatDate, formatDay } from '@windrow/ventilation/format/clock';
import { useEffect } from 'react';
import { DayTable } from './day-table.tsx';
import { EnteredSigns } from './entered-signs.tsx';
import { EventCard } from './event-card.tsx';
import { RuleNotice } from './rule-notice.tsx';
import { surveillanceQuery } from './surveillance-query.ts';
import { TryList } from './try-list.tsx';

/** Everything that surveillance knows of one stay, and the rule to be tried on a list. */
export function StaySurveillance({
  stayId,
  revision,
  enterPath,
}: {
  stayId: string;
  /** The bed's: a new fact can change any day. */
  revision: number;
  /** Where signs are entered; null where they cannot be. */
  enterPath: string | null;
}) {
  const surveillance = useQuery(surveillanceQuery(stayId));
  const { data, refetch } = surveillance;
  useEffect(() => void (revision && refetch()), [revision, refetch]);
  if (surveillance.isPending) return <LoadingState what="the day table" />;
  if (!data)
    return <ReadFault error={surveillance.error} what="The day table" onRetry={() => void refetch()} />;
  return (
    <div className="flex flex-col gap-3">
      {surveillance.isError && <WriteFault error={surveillance.error} />}
      <RuleNotice edition={data.edition} />
      <Events surveillance={data} />
      <Days surveillance={data} />
      <EnteredSigns surveillance={data} enterPath={enterPath} />
      <TryList />
    </div>
  );
}

function Events({ surveillance: { events, dayTable } }: { surveillance: Surveillance }) {
  if (dayTable.length === 0) return null;
  return (
    <section aria-label="Events" className="flex flex-col gap-3">
      {events.length === 0 && (
        <p className="rounded-xl bg-tile px-4 py-3">
          <strong>No event</strong> by this definition in {dayTable.length}{' '}
          {dayTable.length === 1 ? 'day' : 'days'} of ventilation.
        </p>
      )}
      {events.map((event) => (
        <EventCard key={event.onset} event={event} dayName={formatDay} />
      ))}
    </section>
  );
}

function Days({ surveillance }: { surveillance: Surveillance }) {
  const { dayTable, chartingIntervalMinutes, timeZone, leftAt } = surveillance;
  if (dayTable.length === 0)
    return (
      <EmptyState title="No day of ventilation through an artificial airway">
        <p>A check in a mode that needs a tube begins the first one. Mask ventilation does not count here.</p>
      </EmptyState>
    );
  return (
    <section aria-labelledby="day-table" className="rounded-xl bg-tile px-4 py-3">
      <h2 id="day-table" className="font-bold text-lg">
        Day by day
      </h2>
      <p className="text-ink-muted">
        Calendar days in {timeZone}. A minimum is the lowest setting held for more than an hour; the last of a
        day is taken to be held for the check interval, {chartingIntervalMinutes} min.
        {leftAt !== null && ` The stay ended on ${formatDate(leftAt, timeZone)}.`}
      </p>
      <DayTable caption="Days of ventilation" rows={dayTable} dayName={formatDay} />
    </section>
  );
}
