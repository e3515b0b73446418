import type { AssignmentPlace } from '../contract/shifts.ts';

/** A bed given to a person, or taken from whoever had it where `personId` is null. A cover stays, unless it is that person. */
export function giveBed(
  places: readonly AssignmentPlace[],
  bedId: string,
  personId: string | null,
): AssignmentPlace[] {
  const before = places.find((place) => place.bedId === bedId);
  if ((before?.personId ?? null) === personId) return [...places];
  const others = places.filter((place) => place.bedId !== bedId);
  if (personId === null) return others;
  const cover = before?.coverPersonId ?? null;
  return [...others, { bedId, personId, coverPersonId: cover === personId ? null : cover }];
}

/** The second name on a bed, for breaks; null takes it off. A bed that nobody has takes none. */
export function coverBed(
  places: readonly AssignmentPlace[],
  bedId: string,
  coverPersonId: string | null,
): AssignmentPlace[] {
  return places.map((place) =>
    place.bedId === bedId && place.personId !== coverPersonId ? { ...place, coverPersonId } : place,
  );
}

/** Who has a bed; null: nobody. */
export function holderOf(places: readonly AssignmentPlace[], bedId: string): string | null {
  return places.find((place) => place.bedId === bedId)?.personId ?? null;
}

/** Whether two assignments say the same, in whatever order. */
export function samePlaces(a: readonly AssignmentPlace[], b: readonly AssignmentPlace[]): boolean {
  return differences({ theirs: a, mine: b }).length === 0;
}

/** One bed on which two assignments differ; null: nobody. */
export type Difference = { bedId: string; theirs: AssignmentPlace | null; mine: AssignmentPlace | null };

/** Bed by bed, where two assignments differ in person or cover. */
export function differences(input: {
  theirs: readonly AssignmentPlace[];
  mine: readonly AssignmentPlace[];
}): Difference[] {
  const theirs = byBed(input.theirs);
  const mine = byBed(input.mine);
  return [...new Set([...theirs.keys(), ...mine.keys()])]
    .map((bedId) => ({ bedId, theirs: theirs.get(bedId) ?? null, mine: mine.get(bedId) ?? null }))
    .filter((pair) => !samePlace(pair.theirs, pair.mine));
}

/**
 * My moves on top of theirs: beds that I moved since `base` stand as I left them, all others as they are now.
 * So neither hand's work on a bed that the other did not touch is lost.
 */
export function onTop(input: {
  base: readonly AssignmentPlace[];
  mine: readonly AssignmentPlace[];
  theirs: readonly AssignmentPlace[];
}): AssignmentPlace[] {
  const moved = differences({ theirs: input.base, mine: input.mine });
  const touched = new Set(moved.map(({ bedId }) => bedId));
  return [
    ...input.theirs.filter(({ bedId }) => !touched.has(bedId)),
    ...moved.flatMap(({ mine }) => (mine ? [mine] : [])),
  ];
}

function byBed(places: readonly AssignmentPlace[]): Map<string, AssignmentPlace> {
  return new Map(places.map((place) => [place.bedId, place]));
}

function samePlace(a: AssignmentPlace | null, b: AssignmentPlace | null): boolean {
  return a?.personId === b?.personId && (a?.coverPersonId ?? null) === (b?.coverPersonId ?? null);
}
