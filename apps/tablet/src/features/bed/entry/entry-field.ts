import type { NumberField } from '@windrow/ventilation/entry/fields';
import { formatDay } from '@windrow/ventilation/format/clock';
import { formatNumber, formatWithUnit } from '@windrow/ventilation/format/number';

/** A value of a field: a number, `off` for an alarm limit, or the word of a choice. */
export type EntryValue = number | string;

/** The values of a form by row: only what can be recorded as it stands. */
export type EntryValues = Readonly<Record<string, EntryValue>>;

/** What stands in the record for a field. After withdrawal only the time is left: an old number is no help. */
export type Before =
  | { state: 'shown'; value: EntryValue; ageMinutes: number }
  | { state: 'withdrawn'; observedAt: string }
  | { state: 'none' };

export const NOTHING_BEFORE: Before = { state: 'none' };

export type Option = { value: string; label: string };

type Row = {
  /** Also its name in the body and in `confirmedUnusual`. */
  key: string;
  label: string;
  needed: boolean;
  before: Before;
};

export type NumberRow = Row & {
  kind: 'number';
  field: NumberField;
  mayBeOff: boolean;
  /** A value that one deliberate press takes over. Null: there is none that could still be true. */
  repeat: { label: 'as before' | 'as set'; value: number | 'off' } | null;
};
export type ChoiceRow = Row & {
  kind: 'choice';
  options: readonly Option[] /** As a list to open, where the options are many. */;
  asList?: boolean;
};
export type TextRow = Row & {
  kind: 'text';
  hint: string /** A calendar day, by the device's own calendar. */;
  isDay?: boolean;
};
export type EntryRow = NumberRow | ChoiceRow | TextRow;

export type EntrySection = {
  title: string;
  rows: readonly EntryRow[];
  /** One press may say of all its numbers that they are as before. */
  mayRepeat?: boolean;
};

/** A value in words, as it stands in a row, the review and the record. */
export function valueInWords(row: EntryRow, value: EntryValue): string {
  if (row.kind === 'choice')
    return row.options.find((option) => option.value === value)?.label ?? String(value);
  if (row.kind === 'text' && row.isDay) return formatDay(String(value));
  if (row.kind === 'text' || typeof value === 'string') return String(value);
  return formatWithUnit(value, row.field);
}

/** The same without its unit, for rows where the unit stands beside the label. */
export function valueAlone(row: EntryRow, value: EntryValue): string {
  return row.kind === 'number' && typeof value === 'number'
    ? formatNumber(value, row.field)
    : valueInWords(row, value);
}
