import { AgeMark } from '@windrow/ui/controls/age-mark';
import type { ShownBed } from '@windrow/ventilation/board/shown-bed';
import { formatMoment } from '@windrow/ventilation/format/clock';
import type { ScreenItem, ScreenSource } from '@windrow/ventilation/readiness/screen-item';
import type { Screening } from '@windrow/ventilation/readiness/screening';
import { Plate } from './plate.tsx';

type Clock = { now: number; timeZone: string; groups: ShownBed['groups'] };

const STATES = {
  met: { sign: '✓', words: 'met' },
  'not-met': { sign: '✕', words: 'not met' },
  'not-known': { sign: '?', words: 'not known' },
} as const;

/** Every item of the screen: met, not met or not known, from which fact, and how old that is. */
export function ScreeningList({ screening, clock }: { screening: Screening; clock: Clock }) {
  const { items, isReady } = screening;
  const open = items.filter(({ state, isNeeded }) => state !== 'met' && isNeeded);
  return (
    <Plate title="Readiness screen">
      <p className={isReady ? 'font-bold' : ''}>
        {isReady
          ? 'Every needed item is met. Whether to try is for people to decide.'
          : `${open.length} of ${items.filter(({ isNeeded }) => isNeeded).length} needed items are not met or not known.`}
      </p>
      <ul className="flex flex-col divide-y-2 divide-line">
        {items.map((item) => (
          <Item key={item.id} item={item} clock={clock} />
        ))}
      </ul>
      <p className="text-ink-muted text-sm">
        Source: Boles JM et al., Eur Respir J 2007;29:1033–56, table 4, as modified in later cohorts; the
        limit of pH is the unit’s own.
      </p>
    </Plate>
  );
}

function Item({ item, clock }: { item: ScreenItem; clock: Clock }) {
  const { label, state, found, source, why } = item;
  const { sign, words } = STATES[state];
  return (
    <li className="grid grid-cols-[6.5rem_minmax(0,1fr)] gap-x-3 py-2">
      <p className={state === 'met' ? 'text-ink-muted' : 'font-bold'}>
        <span aria-hidden="true" className="inline-block w-6">
          {sign}
        </span>
        {words}
      </p>
      <div>
        <p>{label}</p>
        <p className="flex flex-wrap items-baseline gap-x-3 text-ink-muted text-sm">
          {found && <span className="font-bold text-ink">{found}</span>}
          {source && <Source source={source} clock={clock} />}
          {why && <span>{why}</span>}
        </p>
      </div>
    </li>
  );
}

function Source({
  source: { group, observedAt },
  clock: { now, timeZone, groups },
}: {
  source: ScreenSource;
  clock: Clock;
}) {
  const ageMinutes = Math.max(0, (now - Date.parse(observedAt)) / 60_000);
  return (
    <span className="flex flex-wrap items-baseline gap-x-2">
      {group} of {formatMoment(observedAt, now, timeZone)}
      <AgeMark state={group === 'screen' ? 'current' : groups[group].state} ageMinutes={ageMinutes} />
    </span>
  );
}
