import type { BedCheck, BedStay, Flag } from '../contract/board.ts';
import type { NumberField } from '../entry/fields.ts';
import { formatNumber, formatWithUnit } from '../format/number.ts';
import type { Policy } from '../policy/policy.ts';
import type { ReadyToTry } from '../readiness/ready-to-try.ts';

/** What every rule is asked about. `check` is null also where it no longer tells of the present support. */
export type FlagFacts = {
  check: BedCheck | null;
  device: BedStay['device'];
  airway: BedStay['airway'];
  gas: BedStay['gas'];
  thresholds: Policy['thresholds'];
  /** Null unless a breathing trial may be tried. */
  ready: ReadyToTry | null;
};

/** What a rule found: all of a flag but that which is the same each time. */
export type Finding = Pick<Flag, 'level' | 'short' | 'sentence' | 'inputs' | 'holds'> & {
  /** Where it rests on other groups from case to case. */
  from?: Flag['from'];
  /** What it rests on beside its inputs and is no number, such as the mode; part of its fingerprint only. */
  facts?: readonly string[];
};

/** One rule, as a row of a table. It finds nothing where a fact that it needs is missing. */
export type FlagRule = Pick<Flag, 'id' | 'source' | 'from'> & {
  find: (facts: FlagFacts) => Finding | null;
};

/** The most that a chip on the wall can hold. */
export const SHORT_LENGTH = 16;

type Shown = Pick<NumberField, 'decimals' | 'keepsZeros' | 'unit'>;

/** One input of a finding, named and with its unit. */
export function input(label: string, value: number, { unit, decimals }: Shown): Flag['inputs'][number] {
  return { label, value, unit, decimals };
}

/**
 * A value that is past a limit, in as many decimals as it takes to look so: 8.04 against a limit of 8
 * must not be told as "8, above 8".
 */
export function told(value: number, limit: number, field: Shown): string {
  const decimals = [field.decimals, field.decimals + 1, field.decimals + 2];
  const shown = decimals.map((count) => value.toFixed(count));
  const enough = shown.findIndex((text) => Number(text) !== limit);
  if (enough <= 0 || value === limit) return formatNumber(value, field);
  return shown[enough] ?? formatNumber(value, field);
}

/** As `told`, with its unit. */
export function toldWithUnit(value: number, limit: number, field: Shown): string {
  return field.unit ? `${told(value, limit, field)}\u00a0${field.unit}` : told(value, limit, field);
}

/** The limit itself, with its unit. */
export function limitInWords(limit: number, field: Shown): string {
  return formatWithUnit(limit, field);
}

/** The first wording that fits the chip; the last is cut where none does. */
export function chip(...wordings: [string, ...string[]]): string {
  const fits = wordings.find((words) => words.length <= SHORT_LENGTH);
  return fits ?? (wordings.at(-1) ?? wordings[0]).slice(0, SHORT_LENGTH);
}

/** Above a limit, leaving out what only the rounding of a computer adds. */
export function isAbove(value: number, limit: number): boolean {
  return value - limit > 1e-9;
}
