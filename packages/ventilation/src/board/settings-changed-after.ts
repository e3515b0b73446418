import type { Check } from '../contract/observations.ts';
import type { StayFacts } from './facts.ts';

/**
 * When the settings or the support were first changed after an instant; null while they are as they
 * were then. A gas drawn before that was true of other settings, and is marked so.
 *
 * What was set at the instant is what the last check before it says. Where there was none, the first
 * check after it stands in for it: a change can then only be seen from the second on.
 */
export function settingsChangedAfter(
  { checks, happenings }: Pick<StayFacts, 'checks' | 'happenings'>,
  instant: string,
): string | null {
  const later = checks.filter((check) => check.observedAt > instant).reverse();
  const standing = checks.find((check) => check.observedAt <= instant) ?? later[0];
  const changed = standing ? later.find((check) => !sameSettings(check.body, standing.body)) : undefined;
  const support = [...happenings]
    .reverse()
    .find((fact) => fact.body.toSupport !== undefined && fact.observedAt > instant);
  const times = [changed?.observedAt, support?.observedAt].filter((time) => time !== undefined);
  return times.sort()[0] ?? null;
}

function sameSettings(
  one: Pick<Check, 'mode' | 'settings'>,
  other: Pick<Check, 'mode' | 'settings'>,
): boolean {
  if (one.mode !== other.mode) return false;
  const keys = new Set([...Object.keys(one.settings), ...Object.keys(other.settings)]);
  const settings: Record<string, number | undefined>[] = [one.settings, other.settings];
  // A setting that only one of the two checks recorded is not a change that anybody saw.
  return [...keys].every((key) => {
    const [first, second] = settings.map((values) => values[key]);
    return first === undefined || second === undefined || first === second;
  });
}
