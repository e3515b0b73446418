import type { Check } from '../contract/observations.ts';
import type { StayFacts } from './facts.ts';

/**
 * When the settings or the support were first changed after a gas was drawn; null while they are as they
 * were then. A gas drawn before that was true of other settings, and is marked so.
 *
 * What was set at the draw is what the last check before it says, and before that what was written down
 * with the gas itself. Where there was no check, the first one after it stands in for it.
 */
export function settingsChangedAfter(
  { checks, happenings }: Pick<StayFacts, 'checks' | 'happenings'>,
  drawn: { observedAt: string; fio2Percent?: number | undefined; peepCmH2O?: number | undefined },
): string | null {
  const { observedAt: instant, fio2Percent, peepCmH2O } = drawn;
  const later = checks.filter((check) => check.observedAt > instant).reverse();
  const standing = (checks.find((check) => check.observedAt <= instant) ?? later[0])?.body;
  const atDraw = standing && {
    mode: standing.mode,
    settings: {
      ...standing.settings,
      ...(fio2Percent === undefined ? {} : { fio2Percent }),
      ...(peepCmH2O === undefined || standing.settings.peepCmH2O === undefined ? {} : { peepCmH2O }),
    },
  };
  const changed = atDraw ? later.find((check) => !sameSettings(check.body, atDraw)) : undefined;
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
