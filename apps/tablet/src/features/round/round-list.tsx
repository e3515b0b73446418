import { useUnfinished } from '@windrow/client/writes/drafts';
import type { ShownBed } from '@windrow/ventilation/board/shown-bed';
import type { Grant } from '@windrow/ventilation/permissions/permissions';
import { useId } from 'react';
import { BedRow } from './bed-row.tsx';
import { EmptyBedRow } from './empty-bed-row.tsx';

type RoundListProps = {
  title: string;
  beds: readonly ShownBed[];
  now: number;
  timeZone: string;
  grants: readonly Grant[];
  emptyWords?: string;
};

export function RoundList({ title, beds, now, timeZone, grants, emptyWords }: RoundListProps) {
  const id = useId();
  const unfinished = useUnfinished();
  if (beds.length === 0 && emptyWords === undefined) return null;
  return (
    <section aria-labelledby={id} className="flex flex-col gap-2">
      <h2 id={id} className="font-bold text-ink-muted">
        {title}
      </h2>
      {beds.length === 0 && <p className="text-ink-muted">{emptyWords}</p>}
      <ul className="flex flex-col gap-2">
        {beds.map((shown) => (
          <li key={shown.bed.bedId}>
            {shown.bed.stay ? (
              <BedRow
                shown={shown}
                stay={shown.bed.stay}
                now={now}
                timeZone={timeZone}
                isUnfinished={unfinished.some((key) => key.startsWith(`${shown.bed.stay?.stayId}/`))}
              />
            ) : (
              <EmptyBedRow bed={shown.bed} grants={grants} />
            )}
          </li>
        ))}
      </ul>
    </section>
  );
}
