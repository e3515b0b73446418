import { Mark } from '@windrow/ui/mark';
import type { Bed, Unit } from '@windrow/ventilation/contract/board';
import { formatDate, formatTime } from '@windrow/ventilation/format/clock';
import { LiveMark } from '../live/live-mark.tsx';
import { showUnit } from '../unit/address.ts';
import type { Census } from './census.ts';
import { Count } from './count.tsx';
import type { Page } from './pages.ts';

/** The unit, its counts, the time at the place, and whether this screen hears the server. */
export function BoardHeader({
  unit,
  now,
  counts,
  ready,
  page,
  isConnecting,
  hasOtherUnits,
}: {
  unit: Unit;
  now: number;
  counts: Census;
  ready: number;
  page: Page<Bed>;
  isConnecting: boolean;
  hasOtherUnits: boolean;
}) {
  return (
    <header className="flex h-19 shrink-0 items-center gap-7">
      <Mark className="size-11 shrink-0" />
      <UnitName name={unit.name} canChange={hasOtherUnits} />
      <div className="flex flex-1 items-center gap-7">
        <Count count={counts.onVentilators} words={['on', 'ventilators']} />
        <Count count={counts.byMask} words={['of them', 'by mask']} />
        <Count count={counts.highFlow} words={['high', 'flow']} />
        {counts.notKnown > 0 && <Count count={counts.notKnown} words={['support', 'not known']} />}
        <Count count={counts.bedsEmpty} words={['beds', 'empty']} />
        <Count count={ready} words={['ventilators', 'ready']} />
        <Count count={counts.checksOverdue} words={['checks', 'overdue']} />
      </div>
      {page.of > 1 && <PageMark page={page} />}
      <div className="text-right leading-none">
        <time className="block text-clock leading-none font-bold">{formatTime(now, unit.timeZone)}</time>
        <span className="block text-label text-ink-muted">{formatDate(now, unit.timeZone)}</span>
      </div>
      <LiveMark isConnecting={isConnecting} />
    </header>
  );
}

function UnitName({ name, canChange }: { name: string; canChange: boolean }) {
  const size = name.length > 16 ? 'text-body' : 'text-title';
  return (
    <h1 className={`${size} max-w-[22rem] leading-tight font-bold`}>
      {canChange ? (
        <button type="button" className="text-left" onClick={() => showUnit(null)}>
          {name}
          <span className="sr-only">, choose another unit</span>
        </button>
      ) : (
        name
      )}
    </h1>
  );
}

function PageMark({ page: { number, of, items } }: { page: Page<Bed> }) {
  return (
    <p className="rounded-lg border-2 border-line-strong px-3 py-1 text-center text-label leading-tight font-bold">
      page {number} of {of}
      <br />
      beds {items[0]?.label}–{items.at(-1)?.label}
    </p>
  );
}
