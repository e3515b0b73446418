import { requireNumbers } from '../units/require-number.ts';
import { requireWord } from '../units/require-word.ts';
import { peepFio2Step } from './peep-fio2-step.ts';

/** One step of a ladder; oxygen in percent, as it is set. */
export type LadderStep = { fio2Percent: number; peepCmH2O: number };

type Pair = readonly [fio2Percent: number, peepCmH2O: number];

/** The steps as the protocol's table pairs them, from the least support up. */
const STEPS = {
  lower: [
    [30, 5],
    [40, 5],
    [40, 8],
    [50, 8],
    [50, 10],
    [60, 10],
    [70, 10],
    [70, 12],
    [70, 14],
    [80, 14],
    [90, 14],
    [90, 16],
    [90, 18],
    [100, 18],
    [100, 22],
    [100, 24],
  ],
  higher: [
    [30, 5],
    [30, 8],
    [30, 10],
    [30, 12],
    [30, 14],
    [40, 14],
    [40, 16],
    [50, 16],
    [50, 18],
    [50, 20],
    [60, 20],
    [70, 20],
    [80, 20],
    [80, 22],
    [90, 22],
    [100, 22],
    [100, 24],
  ],
} as const satisfies Record<string, readonly Pair[]>;

export type LadderName = keyof typeof STEPS;
export const LADDER_NAMES = Object.keys(STEPS) as readonly LadderName[];

export type LadderPosition = {
  onLadder: boolean;
  /** PEEP that the ladder pairs with this oxygen; null for an oxygen between its steps. */
  peepRangeCmH2O: readonly [low: number, high: number] | null;
  /** The nearest step that takes away neither PEEP nor oxygen, and the nearest that adds neither. */
  up: LadderStep | null;
  down: LadderStep | null;
};

/**
 * Where settings stand on a PEEP–FiO2 ladder of the ARDS Network, and its next steps up and down: the first
 * step with no less of either, and the last with no more of either, other than the settings themselves. From
 * settings beside the ladder these lead back onto it.
 *
 * @param input.peepCmH2O set PEEP, cmH2O (0 to 120).
 * @param input.fio2 set oxygen, fraction (0.21 to 1), not a percentage.
 * @param input.ladder 'lower' (lower PEEP, higher FiO2) or 'higher'.
 * @returns whether the pair is on the ladder, the PEEP range at this FiO2, and the steps; `null` past an end.
 * @throws RangeError on missing, non-finite or impossible input.
 *
 * @source lower: ARDS Network, N Engl J Med 2000;342:1301–8, and the protocol card (18–24 at 1.0);
 *   higher: N Engl J Med 2004;351:327–36 (from memory).
 */
export function ladderPosition({
  peepCmH2O,
  fio2,
  ladder,
}: {
  peepCmH2O: number;
  fio2: number;
  ladder: LadderName;
}): LadderPosition {
  requireNumbers({ peepCmH2O, fio2 });
  requireWord('ladder', ladder, LADDER_NAMES);
  const { onLadder, peepRange } = peepFio2Step({ peepCmH2O, fio2, ladder });
  // A fraction such as 0.55 becomes 55.00000000000001 %, which is no step above 55.
  const fio2Percent = Math.round(fio2 * 1e4) / 100;
  const others = STEPS[ladder]
    .map(([percent, peep]) => ({ fio2Percent: percent, peepCmH2O: peep }))
    .filter((step) => step.fio2Percent !== fio2Percent || step.peepCmH2O !== peepCmH2O);
  return {
    onLadder,
    peepRangeCmH2O: peepRange,
    up: others.find((step) => step.fio2Percent >= fio2Percent && step.peepCmH2O >= peepCmH2O) ?? null,
    down: others.findLast((step) => step.fio2Percent <= fio2Percent && step.peepCmH2O <= peepCmH2O) ?? null,
  };
}
