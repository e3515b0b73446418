import type { AssignmentPlace, ShiftPerson } from '../contract/shifts.ts';

/** What one person carries in a shift. Exactly one of `over` and `left` can be above zero. */
export type Load = {
  person: ShiftPerson;
  bedIds: string[];
  minutes: number;
  /** Minutes past what the person has. */
  over: number;
  /** Minutes still free. */
  left: number;
};

/**
 * Each person's load, in the shift's order of people, with beds in the order of `minutesByBed`;
 * beds that are not in it (empty or gone) weigh nothing and are left out.
 */
export function loads(input: {
  people: readonly ShiftPerson[];
  places: readonly AssignmentPlace[];
  minutesByBed: ReadonlyMap<string, number>;
}): Load[] {
  const holder = new Map(input.places.map(({ bedId, personId }) => [bedId, personId]));
  return input.people.map((person) => {
    const beds = [...input.minutesByBed].filter(([bedId]) => holder.get(bedId) === person.personId);
    const minutes = beds.reduce((sum, [, each]) => sum + each, 0);
    const spare = person.minutesAvailable - minutes;
    return {
      person,
      bedIds: beds.map(([bedId]) => bedId),
      minutes,
      over: Math.max(0, -spare),
      left: Math.max(0, spare),
    };
  });
}

/** Beds of `minutesByBed` (those with a patient) that nobody on the shift has; one held by somebody not on it is one of them. */
export function nobodyHas(input: {
  people: readonly ShiftPerson[];
  places: readonly AssignmentPlace[];
  minutesByBed: ReadonlyMap<string, number>;
}): string[] {
  const onShift = new Set(input.people.map(({ personId }) => personId));
  const held = new Set(
    input.places.filter(({ personId }) => onShift.has(personId)).map(({ bedId }) => bedId),
  );
  return [...input.minutesByBed.keys()].filter((bedId) => !held.has(bedId));
}
