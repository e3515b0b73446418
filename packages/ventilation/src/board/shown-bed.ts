import type { Bed, BedAssignment, BedStay, FactGroup, Flag } from '../contract/board.ts';
import { type Freshness, freshness } from '../freshness/freshness.ts';

/** How one group of facts stands now: its rung of the age ladder and its age. */
export type ShownGroup = { state: Freshness; observedAt: string | null; ageMinutes: number | null };

/** A bed as it may be shown at one moment. Values past their withdrawal are not in it. */
export type ShownBed = {
  bed: Bed;
  groups: Record<FactGroup, ShownGroup>;
  /** Who looks after the bed in the shift that runs now; null: nobody, and shown so. */
  assignment: BedAssignment | null;
};

const GROUPS = ['check', 'airway', 'gas'] as const satisfies readonly FactGroup[];

/**
 * The only way from a stored board row to a screen: ages every group against the server's time
 * and takes out what is withdrawn, with the flags that rested on it.
 *
 * @param now server time, ISO or epoch milliseconds.
 * @param keepsComing leaves flags in that hold from a later instant only: for who sends a row on to be aged there.
 */
export function shownBed({
  bed,
  now,
  keepsComing = false,
}: {
  bed: Bed;
  now: string | number;
  keepsComing?: boolean;
}): ShownBed {
  const at = typeof now === 'number' ? now : Date.parse(now);
  const assignment = runningAssignment(bed.assignments, at);
  const { stay } = bed;
  if (!stay) {
    const never: ShownGroup = { state: 'never', observedAt: null, ageMinutes: null };
    return { bed, groups: { check: never, airway: never, gas: never }, assignment };
  }
  const groups = {
    check: aged(stay, 'check', at),
    airway: aged(stay, 'airway', at),
    gas: aged(stay, 'gas', at),
  };
  const gone = GROUPS.filter((group) => groups[group].state === 'withdrawn');
  const kept = timely({ stay: gone.length > 0 ? without(stay, gone) : stay, at, keepsComing });
  return { bed: kept === stay ? bed : { ...bed, stay: kept }, groups, assignment };
}

function aged(stay: BedStay, group: FactGroup, at: number): ShownGroup {
  const observedAt = stay[group]?.observedAt ?? stay.withdrawn[group];
  if (observedAt === null) return { state: 'never', observedAt, ageMinutes: null };
  // A group that the server has withdrawn holds no value any more, whatever this screen's ladder says.
  const state =
    stay[group] === null
      ? 'withdrawn'
      : freshness({ kind: group, observedAt, now: new Date(at).toISOString(), policy: stay.ladder });
  return { state, observedAt, ageMinutes: Math.max(0, (at - Date.parse(observedAt)) / 60_000) };
}

function without(stay: BedStay, gone: readonly FactGroup[]): BedStay {
  const kept = { ...stay, withdrawn: { ...stay.withdrawn } };
  for (const group of gone) {
    kept.withdrawn[group] = stay[group]?.observedAt ?? stay.withdrawn[group];
    kept[group] = null;
  }
  kept.flags = stay.flags.filter((flag) => !flag.from.some((group) => gone.includes(group)));
  return kept;
}

/** Takes out what holds by the clock alone and does not now: a screen whose day is over, a flag before or after its time. */
function timely({ stay, at, keepsComing }: { stay: BedStay; at: number; keepsComing: boolean }): BedStay {
  const isOver = stay.screen !== null && Date.parse(stay.screen.holdsUntil) <= at;
  const flags = stay.flags.every((flag) => holdsAt({ flag, at, keepsComing }))
    ? stay.flags
    : stay.flags.filter((flag) => holdsAt({ flag, at, keepsComing }));
  if (!isOver && flags === stay.flags) return stay;
  return { ...stay, flags, screen: isOver ? null : stay.screen };
}

/** Whether a flag holds at an instant, epoch milliseconds. */
export function holdsAt({
  flag: { holds },
  at,
  keepsComing = false,
}: {
  flag: Pick<Flag, 'holds'>;
  at: number;
  keepsComing?: boolean;
}): boolean {
  if (!holds) return true;
  const hasCome = keepsComing || holds.from === null || Date.parse(holds.from) <= at;
  return hasCome && (holds.until === null || at < Date.parse(holds.until));
}

/** The published assignment whose shift runs at this moment. */
export function runningAssignment(assignments: readonly BedAssignment[], at: number): BedAssignment | null {
  return (
    assignments.find(({ startsAt, endsAt }) => Date.parse(startsAt) <= at && at < Date.parse(endsAt)) ?? null
  );
}
