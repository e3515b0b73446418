import { type BedMinutes, bedMinutes } from '@windrow/ventilation/assignment/bed-minutes';
import { runningAssignment } from '@windrow/ventilation/board/shown-bed';
import type { Bed } from '@windrow/ventilation/contract/board';
import type { Policy } from '@windrow/ventilation/policy/policy';

/** A bed as it is moved about: what it asks for, and why. */
export type BedWork = {
  bedId: string;
  label: string;
  /** What the patient breathes with, in short; null: nothing recorded yet. */
  support: string | null;
  minutes: BedMinutes;
  /** Who has it in another shift that runs now. */
  nowWith: { personId: string; displayName: string } | null;
};

export type EmptyBed = { bedId: string; label: string; isOpen: boolean };

/** Beds with a patient as work, those without apart; both in the order in which people count them. */
export function workOf(input: {
  beds: readonly Bed[];
  policy: Policy;
  shiftMinutes: number;
  shiftId: string;
  now: number;
}) {
  const { policy, shiftMinutes } = input;
  const beds = [...input.beds].sort((a, b) => a.label.localeCompare(b.label, 'en', { numeric: true }));
  const work = beds
    .filter(({ stay }) => stay !== null)
    .map((bed): BedWork => {
      const running = runningAssignment(bed.assignments, input.now);
      return {
        bedId: bed.bedId,
        label: bed.label,
        support: bed.stay?.support?.shortName ?? null,
        minutes: bedMinutes({ bed, policy, shiftMinutes }),
        nowWith: running && running.shiftId !== input.shiftId ? running : null,
      };
    });
  const empty = beds
    .filter(({ stay }) => stay === null)
    .map(({ bedId, label, isOpen }): EmptyBed => ({ bedId, label, isOpen }));
  return { work, empty };
}
