import type { Capacity } from '@windrow/ventilation/contract/fleet';

/** What can be said on the telephone, and what must be said with it. */
export type Answer = {
  can: 'yes' | 'no' | 'unsure';
  sentence: string;
  /** What would make the answer wrong or short; empty where nothing is known to. */
  cautions: string[];
};

/**
 * Whether the house can take one more ventilated adult, from present counts alone: a ready machine of the
 * adult class and a free staffed bed. Patients who by the record are on a ventilator that the fleet does not
 * know of may be on machines still counted as ready, so they are told, and can turn a yes into "unsure".
 */
export function answerFrom(capacity: Pick<Capacity, 'classes' | 'units'>): Answer {
  const ready = capacity.classes.find((each) => each.class === 'adult-icu')?.counts.ready ?? 0;
  const free = sum(capacity.units.map(({ beds }) => beds.free));
  const unknown = sum(capacity.units.map(({ withoutMachine }) => withoutMachine));
  if (ready === 0)
    return {
      can: 'no',
      sentence: `No. No adult ventilator is ready${freeButNoMachine(capacity, free)}.`,
      cautions: [],
    };
  if (free === 0)
    return { can: 'no', sentence: `No. No staffed bed is free; ${adults(ready)} ready.`, cautions: [] };
  const cautions = unknown > 0 ? [withoutMachine({ unknown, ready })] : [];
  const counted = `${adults(ready)} ready; ${staffedBeds(free)} free: ${where(capacity)}.`;
  if (unknown >= ready) return { can: 'unsure', sentence: `Unsure. By the record ${counted}`, cautions };
  return { can: 'yes', sentence: `Yes. ${counted.charAt(0).toUpperCase()}${counted.slice(1)}`, cautions };
}

function freeButNoMachine(capacity: Pick<Capacity, 'units'>, free: number): string {
  return free > 0 ? `; ${staffedBeds(free)} free: ${where(capacity)}` : ', and no staffed bed is free';
}

function withoutMachine({ unknown, ready }: { unknown: number; ready: number }): string {
  const who = unknown === 1 ? '1 patient is on a ventilator' : `${unknown} patients are on ventilators`;
  const doubtful = Math.min(unknown, ready);
  const which =
    doubtful === ready
      ? 'any machine counted as ready'
      : `up to ${doubtful} of the machines counted as ready`;
  return `${who} that the fleet does not show at the bed, so ${which} may be in use.`;
}

function adults(count: number): string {
  return count === 1 ? '1 adult ventilator is' : `${count} adult ventilators are`;
}

function staffedBeds(count: number): string {
  return count === 1 ? '1 staffed bed is' : `${count} staffed beds are`;
}

/** Only units that have one: a list of noughts hides the one that counts. */
function where({ units }: Pick<Capacity, 'units'>): string {
  return units
    .filter(({ beds }) => beds.free > 0)
    .map(({ name, beds }) => `${beds.free} in ${name}`)
    .join(', ');
}

function sum(numbers: readonly number[]): number {
  return numbers.reduce((total, each) => total + each, 0);
}
