import { Mark } from '@windrow/ui/mark';
import type { Unit } from '@windrow/ventilation/contract/board';
import { formatTime, formatTimeWithSeconds } from '@windrow/ventilation/format/clock';

/** In place of the header, whose counts would be untrue: since when this screen has heard nothing. */
export function NotLiveBand({
  unit,
  now,
  lastHeardAt,
  isWithdrawn,
}: {
  unit: Unit;
  now: number;
  lastHeardAt: number | null;
  isWithdrawn: boolean;
}) {
  const since =
    lastHeardAt === null
      ? 'Not live: the server is not heard'
      : `Not live since ${formatTimeWithSeconds(lastHeardAt, unit.timeZone)}`;
  return (
    <header className="not-live-band flex h-32 shrink-0 items-center gap-8">
      <Mark className="size-16 shrink-0" />
      <div className="flex-1" role="alert">
        <h1 className="text-band leading-none font-extrabold">{since}</h1>
        <p className="pt-1 text-body leading-tight">
          {isWithdrawn
            ? 'Nothing is shown that may no longer be true. Go by the bedside.'
            : 'Below is what was last heard. Go by the bedside.'}
        </p>
      </div>
      <div className="text-right">
        <p className="text-body font-bold">{unit.name}</p>
        <p className="text-body">now about {formatTime(now, unit.timeZone)}</p>
      </div>
    </header>
  );
}
