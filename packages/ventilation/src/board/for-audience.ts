import type { Bed } from '../contract/board.ts';
import type { Audience } from '../contract/live.ts';
import { shownBed } from './shown-bed.ts';

/**
 * A bed cut to what a room may hear: withdrawn values are taken out, and on displays everything
 * that says who the patient is, or what others wrote about them.
 */
export function bedForAudience({ bed, audience, now }: { bed: Bed; audience: Audience; now: string }): Bed {
  const { bed: shown } = shownBed({ bed, now });
  if (audience === 'staff') return shown;
  const assignments = shown.assignments.map((one) => ({ ...one, displayName: one.initials }));
  if (!shown.stay) return { ...shown, assignments };
  return {
    ...shown,
    assignments,
    stay: {
      ...shown.stay,
      patient: null,
      precautions: null,
      careLimits: null,
      away: shown.stay.away && { ...shown.stay.away, to: null },
    },
  };
}
