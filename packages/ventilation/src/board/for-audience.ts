import type { Bed } from '../contract/board.ts';
import type { Audience } from '../contract/live.ts';
import { shownBed } from './shown-bed.ts';

/**
 * A bed cut to what a room may hear: withdrawn values are taken out, and on displays everything
 * that says who the patient is, or what others wrote about them.
 */
export function bedForAudience({ bed, audience, now }: { bed: Bed; audience: Audience; now: string }): Bed {
  const { bed: shown } = shownBed({ bed, now });
  if (audience === 'staff' || !shown.stay) return shown;
  return { ...shown, stay: { ...shown.stay, patient: null, precautions: null, careLimits: null } };
}
