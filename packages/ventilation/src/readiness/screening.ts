import { presentArterialGas, presentCheck } from '../board/present-facts.ts';
import type { BedStay } from '../contract/board.ts';
import { supportEntry } from '../support/catalogue.ts';
import type { ScreenFacts, ScreenItem } from './screen-item.ts';
import { SCREEN_ITEMS } from './screen-items.ts';

export type Screening = {
  items: readonly ScreenItem[];
  /** Every item that is needed is met. */
  isReady: boolean;
};

export type ScreenedStay = Pick<BedStay, 'check' | 'gas' | 'screen' | 'support' | 'withdrawn'>;

/**
 * The published readiness screen of one patient with a tube, item by item: met, not met, or not known. What
 * is withdrawn or from before a change is not known, and so is what nobody answered at the bed. It says
 * whether a breathing trial may be tried, and never that it should.
 *
 * @param input.stay as it may be shown at this moment.
 * @param input.phLow the unit's own limit of acidosis; the published list gives no number.
 * @returns null without invasive ventilation: there is nothing to be freed from.
 *
 * @source Boles JM et al., Eur Respir J 2007;29:1033–56, table 4, as modified in later cohorts.
 */
export function screening({ stay, phLow }: { stay: ScreenedStay; phLow: number }): Screening | null {
  if (stay.support === null || supportEntry(stay.support.id).kind !== 'invasive') return null;
  const facts: ScreenFacts = {
    check: presentCheck(stay),
    gas: presentArterialGas(stay),
    screen: stay.screen,
    phLow,
  };
  const items = SCREEN_ITEMS.map(({ id, label, judge }) => ({ id, label, ...judge(facts) }));
  return { items, isReady: items.every(({ state, isNeeded }) => state === 'met' || !isNeeded) };
}
