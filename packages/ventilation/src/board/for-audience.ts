import type { Bed, Flag } from '../contract/board.ts';
import type { Audience } from '../contract/live.ts';
import { shownBed } from './shown-bed.ts';

/**
 * A bed cut to what a room may hear: withdrawn values are taken out, and on displays everything
 * that says who the patient is, or what others wrote about them.
 */
export function bedForAudience({ bed, audience, now }: { bed: Bed; audience: Audience; now: string }): Bed {
  const { bed: shown } = shownBed({ bed, now, keepsComing: true });
  if (audience === 'staff') return shown;
  const assignments = shown.assignments.map((one) => ({ ...one, displayName: one.initials }));
  if (!shown.stay) return { ...shown, assignments };
  const { away, flags } = shown.stay;
  return {
    ...shown,
    assignments,
    stay: {
      ...shown.stay,
      patient: null,
      precautions: null,
      careLimits: null,
      away: away && { ...away, to: null },
      flags: flags.map(withoutNote),
    },
  };
}

function withoutNote(flag: Flag): Flag {
  return flag.acknowledged ? { ...flag, acknowledged: { ...flag.acknowledged, note: null } } : flag;
}
