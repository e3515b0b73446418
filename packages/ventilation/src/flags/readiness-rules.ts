import type { BedCheck } from '../contract/board.ts';
import { READING_FIELDS, SETTING_FIELDS } from '../entry/fields.ts';
import type { ReadyToTry } from '../readiness/ready-to-try.ts';
import { type Finding, type FlagRule, input } from './rule.ts';

const SOURCE =
  "screen: Boles JM et al., Eur Respir J 2007;29:1033–56, table 4, with the unit's own limit of pH; the hours are the unit's own";

/**
 * That a breathing trial may be tried, and that it is due. Both follow from the same screen; the row holds the
 * instants between which each is told, so that a screen needs only its clock to turn one into the other.
 */
export const READINESS_RULES: readonly FlagRule[] = [
  {
    id: 'ready-to-try',
    from: ['check'],
    source: SOURCE,
    find: ({ ready, check }) => {
      if (!ready) return null;
      return {
        level: 'note',
        short: 'Ready to try',
        sentence: 'Every item of the readiness screen is met, and no breathing trial was tried since.',
        ...restingOn(ready, check),
        holds: { from: null, until: earlier(ready.dueAt, ready.until) },
      };
    },
  },
  {
    id: 'trial-due',
    from: ['check'],
    source: SOURCE,
    find: ({ ready, check, thresholds }) => {
      if (!ready || ready.dueAt >= ready.until) return null;
      return {
        level: 'note',
        short: 'Trial due',
        sentence: `The readiness screen has been met for ${thresholds.trialDueHours}\u00a0h or more, and no breathing trial was tried since.`,
        ...restingOn(ready, check),
        holds: { from: ready.dueAt, until: ready.until },
      };
    },
  },
];

/** Settings that are turned down further ask anew, as a new screen does. */
function restingOn(
  { from, screenId }: ReadyToTry,
  check: BedCheck | null,
): Pick<Finding, 'from' | 'inputs' | 'facts'> {
  const { peepCmH2O, fio2Percent } = check?.settings ?? {};
  const rate = check?.readings.rateTotalPerMin;
  return {
    from: [...from],
    facts: [screenId],
    inputs: [
      ...(peepCmH2O === undefined ? [] : [input('PEEP', peepCmH2O, SETTING_FIELDS.peepCmH2O)]),
      ...(fio2Percent === undefined ? [] : [input('Oxygen', fio2Percent, SETTING_FIELDS.fio2Percent)]),
      ...(rate === undefined ? [] : [input('Rate', rate, READING_FIELDS.rateTotalPerMin)]),
    ],
  };
}

function earlier(one: string, other: string): string {
  return one < other ? one : other;
}
