import { type Range, requireNumbers } from '../units/require-number.ts';
import { requireWord } from '../units/require-word.ts';

type Step = { readonly fio2: number; readonly peep: Range };

/** For each FiO2 the lowest and highest PEEP that the ladder pairs with it, cmH2O. */
const LADDERS = {
  lower: [
    { fio2: 0.3, peep: [5, 5] },
    { fio2: 0.4, peep: [5, 8] },
    { fio2: 0.5, peep: [8, 10] },
    { fio2: 0.6, peep: [10, 10] },
    { fio2: 0.7, peep: [10, 14] },
    { fio2: 0.8, peep: [14, 14] },
    { fio2: 0.9, peep: [14, 18] },
    { fio2: 1, peep: [18, 24] },
  ],
  higher: [
    { fio2: 0.3, peep: [5, 14] },
    { fio2: 0.4, peep: [14, 16] },
    { fio2: 0.5, peep: [16, 20] },
    { fio2: 0.6, peep: [20, 20] },
    { fio2: 0.7, peep: [20, 20] },
    { fio2: 0.8, peep: [20, 22] },
    { fio2: 0.9, peep: [22, 22] },
    { fio2: 1, peep: [22, 24] },
  ],
} as const satisfies Record<string, readonly Step[]>;

/** 0.1 + 0.2 is step 0.3 as well; a real setting is a whole percent. */
const SAME_FIO2 = 0.001;

/**
 * Where settings stand on a PEEP–FiO2 ladder of the ARDS Network.
 *
 * @title PEEP–FiO2 ladder
 * @formula on the ladder when the FiO2 is one of its steps (30, 40, … 100 %) and the PEEP lies within that
 *   step’s range, ends included.
 * @valid for the two ladders as printed; neither is an order.
 *
 * @param input.peepCmH2O set PEEP, cmH2O (0 to 120).
 * @param input.fio2 set oxygen, fraction (0.21 to 1), not a percentage.
 * @param input.ladder ladder: 'lower' or 'higher'; 'lower' has the lower PEEP at the higher FiO2.
 * @returns record: `onLadder` whether the pair is on the ladder; `peepRange` lowest and highest PEEP at this
 *   FiO2, cmH2O; `null` for the range means an FiO2 between steps.
 * @throws RangeError on missing, non-finite or impossible input.
 *
 * @source ARDS Network, N Engl J Med 2000;342:1301–8, and the protocol card (18–24 at 1.0), for the lower.
 * @source N Engl J Med 2004;351:327–36 (not compared with the print), for the higher.
 */
export function peepFio2Step({
  peepCmH2O,
  fio2,
  ladder,
}: {
  peepCmH2O: number;
  fio2: number;
  ladder: 'lower' | 'higher';
}): { onLadder: boolean; peepRange: [low: number, high: number] | null } {
  requireNumbers({ peepCmH2O, fio2 });
  requireWord('ladder', ladder, Object.keys(LADDERS));
  const step = LADDERS[ladder].find((each) => Math.abs(each.fio2 - fio2) < SAME_FIO2);
  if (!step) return { onLadder: false, peepRange: null };
  const [low, high] = step.peep;
  return { onLadder: peepCmH2O >= low && peepCmH2O <= high, peepRange: [low, high] };
}
