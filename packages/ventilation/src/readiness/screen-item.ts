import type { Present } from '../board/present-facts.ts';
import type { BedCheck, BedGas, BedStay } from '../contract/board.ts';

/** What one item was judged from. */
export type ScreenSource = { group: 'check' | 'gas' | 'screen'; observedAt: string };

export type ScreenItem = {
  id: string;
  label: string;
  state: 'met' | 'not-met' | 'not-known';
  /** The values: "SpO2 96 %, oxygen 35 %". Null where none is known. */
  found: string | null;
  source: ScreenSource | null;
  /** Why it is not known. */
  why: string | null;
  /** False where the present mode can never tell; then it does not stand in the way of a trial. */
  isNeeded: boolean;
};

/** What the items are judged from. */
export type ScreenFacts = {
  check: Present<BedCheck>;
  gas: Present<BedGas>;
  screen: BedStay['screen'];
  phLow: number;
};
