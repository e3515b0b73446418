import { shownBed } from '@windrow/ventilation/board/shown-bed';
import { presentSupport } from '@windrow/ventilation/board/tile/present-support';
import type { Bed } from '@windrow/ventilation/contract/board';
import { supportEntry } from '@windrow/ventilation/support/catalogue';

export type Census = {
  onVentilators: number;
  byMask: number;
  highFlow: number;
  bedsEmpty: number;
  checksOverdue: number;
  /** Beds with a patient of whom nobody may say any more what they breathe with. */
  notKnown: number;
};

/** The counts of a unit at one moment. They count what may be shown, so a withdrawn check counts as not known. */
export function census(beds: readonly Bed[], now: number): Census {
  const counts = { onVentilators: 0, byMask: 0, highFlow: 0, bedsEmpty: 0, checksOverdue: 0, notKnown: 0 };
  for (const bed of beds) {
    const shown = shownBed({ bed, now });
    if (!bed.stay) {
      if (bed.isOpen) counts.bedsEmpty += 1;
      continue;
    }
    const support = presentSupport({ shown, now });
    const kind = support && supportEntry(support.id).kind;
    if (kind === null) counts.notKnown += 1;
    if (kind === 'invasive' || kind === 'mask') counts.onVentilators += 1;
    if (kind === 'mask') counts.byMask += 1;
    if (kind === 'high-flow') counts.highFlow += 1;
    const { state } = shown.groups.check;
    if (state === 'overdue' || state === 'withdrawn') counts.checksOverdue += 1;
  }
  return counts;
}
