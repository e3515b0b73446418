import type { SupportId } from '../support/catalogue.ts';
import { instantMs } from '../units/instant.ts';
import { isThroughAirway, type Manner, mannerOf, type Stretch } from './ventilated-stretches.ts';

/** A charted setting, and how long it was held at the most. */
export type HeldSetting = { ms: number; at: string; value: number; until: string };

type Span = Pick<Stretch, 'fromMs' | 'toMs'>;
type Charting = { observedAt: string; mode: SupportId };

/**
 * What was charted of one setting while a patient was ventilated in a manner in which it counts, in order of time.
 * Each is held until another value is charted, also after midnight, and no longer than the time in such a manner
 * lasts: another mode, a mask or T-piece, the removal of the device and the end of the stay (or now) close it.
 *
 * @param input.counts the manners of ventilation in which the setting counts.
 * @param input.settingOf the setting in a check, `null` where it was not charted.
 */
export function heldSettings<Check extends Charting>({
  checks,
  stretches,
  counts,
  settingOf,
}: {
  checks: readonly Check[];
  stretches: readonly Stretch[];
  counts: readonly Manner[];
  settingOf: (check: Check) => number | null;
}): HeldSetting[] {
  const spans = joined(stretches.filter(({ mode }) => counts.includes(mannerOf(mode))));
  const charted = checks
    .flatMap((check, index) => {
      const value = settingOf(check);
      if (value === null || !isThroughAirway(check.mode) || !counts.includes(mannerOf(check.mode))) return [];
      return [
        { ms: instantMs(`checks[${index}].observedAt`, check.observedAt), at: check.observedAt, value },
      ];
    })
    .sort((a, b) => a.ms - b.ms || a.value - b.value);

  let next = { ms: Number.POSITIVE_INFINITY, value: Number.NaN, untilMs: Number.NaN };
  return charted
    .reverse()
    .map((setting) => {
      const changedMs = next.value === setting.value ? next.untilMs : next.ms;
      const endMs = spans.findLast(({ fromMs }) => fromMs <= setting.ms)?.toMs ?? setting.ms;
      next = { ...setting, untilMs: Math.max(setting.ms, Math.min(changedMs, endMs)) };
      return { ...setting, until: new Date(next.untilMs).toISOString() };
    })
    .reverse();
}

/** Stretches that follow each other without a gap are one span. */
function joined(stretches: readonly Stretch[]): Span[] {
  const spans: Span[] = [];
  for (const { fromMs, toMs } of stretches) {
    const span = spans.at(-1);
    if (span?.toMs === fromMs) span.toMs = toMs;
    else spans.push({ fromMs, toMs });
  }
  return spans;
}
