import type { BedStay } from '@windrow/ventilation/contract/board';
import { formatAge } from '@windrow/ventilation/format/age';
import { formatMoment } from '@windrow/ventilation/format/clock';
import type { Policy } from '@windrow/ventilation/policy/policy';
import { type DueToday, dueToday } from '@windrow/ventilation/readiness/due-today';
import type { Screening } from '@windrow/ventilation/readiness/screening';
import { Plate } from './plate.tsx';

type DueLineProps = {
  stay: BedStay;
  screening: Screening | null;
  thresholds: Policy['thresholds'];
  now: number;
  timeZone: string;
};

const WHY_NOTHING = {
  'no-tube': 'Nothing: the patient breathes without a ventilator through a tube.',
  'not-ready':
    'Nothing: the screen stands, and not every needed item is met. Screen again when that changes.',
  passed: 'The last trial was passed. What follows is for people to decide.',
} as const;

/** What comes next on the way off the ventilator, in one sentence. */
export function DueLine({ stay, screening, thresholds, now, timeZone }: DueLineProps) {
  const due = dueToday({ stay, screening, thresholds, at: now });
  return (
    <Plate title="Due today">
      <p className="text-lg">{inWords({ due, thresholds, now, timeZone })}</p>
    </Plate>
  );
}

function inWords({
  due,
  thresholds,
  now,
  timeZone,
}: { due: DueToday } & Pick<DueLineProps, 'thresholds' | 'now' | 'timeZone'>): string {
  const at = (instant: string) => formatMoment(instant, now, timeZone);
  const past = (instant: string) => formatAge((now - Date.parse(instant)) / 60_000);
  const isPast = (instant: string) => Date.parse(instant) <= now;
  switch (due.what) {
    case 'screen':
      return `The readiness screen: none stands now (a screen stands for ${thresholds.screenHoldsHours} h).`;
    case 'trial':
      return isPast(due.at)
        ? `A breathing trial, since ${at(due.at)} (${past(due.at)}).`
        : `A breathing trial, by ${at(due.at)}.`;
    case 'end-of-trial':
      if (due.at === null) return 'The end of the trial that runs; no length was planned.';
      return isPast(due.at)
        ? `The end of the trial: its planned time was over at ${at(due.at)}.`
        : `The end of the trial, planned for ${at(due.at)}.`;
    case 'screen-again':
      return `The next screen, from ${at(due.at)}: one trial in ${thresholds.trialAgainHours} h.`;
    case 'nothing':
      return WHY_NOTHING[due.why];
  }
}
