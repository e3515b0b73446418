import type { Flag } from '../contract/board.ts';
import type { Acknowledgement } from '../contract/observations.ts';
import type { Stamped, StayFacts } from './facts.ts';

/**
 * The flags with who has acknowledged them. An acknowledgement is of one fingerprint, and lasts only while each
 * fact recorded since then says the same: values that changed and came back are raised again, since what was
 * looked at is not what is there now.
 *
 * @param input.flagsOf the flags that the same stay would have with an earlier fact as its newest.
 */
export function acknowledgedFlags({
  flags,
  facts,
  flagsOf,
}: {
  flags: readonly Flag[];
  facts: StayFacts;
  flagsOf: (earlier: StayFacts) => readonly Flag[];
}): Flag[] {
  return flags.map((flag) => {
    const given = facts.acknowledgements.find(({ body }) => body.flagId === flag.id);
    if (!given || given.body.fingerprint !== flag.fingerprint) return flag;
    const hasStood = statesSince({ flag, given, facts }).every((earlier) =>
      flagsOf(earlier).some(({ fingerprint }) => fingerprint === flag.fingerprint),
    );
    if (!hasStood) return flag;
    const { recordedByInitials: by, observedAt: at, body } = given;
    return { ...flag, acknowledged: { by, at, note: body.note } };
  });
}

/** The stay as it stood after each fact that came in since, back to the one that was acknowledged. */
function statesSince({
  flag,
  given,
  facts,
}: {
  flag: Flag;
  given: Stamped<Acknowledgement>;
  facts: StayFacts;
}): StayFacts[] {
  const { checks, gases, airwayChecks } = facts.sinceAcknowledged;
  return flag.from.flatMap((group) => {
    if (group === 'check')
      return since(checks, given).map((_, index) => ({ ...facts, checks: checks.slice(index) }));
    if (group === 'gas') return since(gases, given).map((gas) => ({ ...facts, gas }));
    return since(airwayChecks, given).map((check) => ({
      ...facts,
      airwayChecks: from(check, facts.airwayChecks),
    }));
  });
}

/** The checks as they stood when this one was the newest: cuff and depth may come from those before it. */
function from<Body>(newest: Stamped<Body>, list: readonly Stamped<Body>[]): Stamped<Body>[] {
  const index = list.findIndex(({ observationId }) => observationId === newest.observationId);
  return index === -1 ? [newest] : list.slice(index);
}

/** Newest first, until one that was already known when the flag was acknowledged. */
function since<Body>(list: readonly Stamped<Body>[], given: Stamped<Acknowledgement>): Stamped<Body>[] {
  const known = list.findIndex(({ recordedAt }) => recordedAt <= given.recordedAt);
  return list.slice(0, known === -1 ? list.length : known);
}
