import type { NumberField } from '@windrow/ventilation/entry/fields';
import type { Before, ChoiceRow, NumberRow, Option, TextRow } from './entry-field.ts';

/** What was recorded last, by the key of the row. */
export type Earlier = (key: string) => Before;

/** A row for a number whose last value may be said again by one press. */
export function numberRow({
  key,
  field,
  earlier,
  needed = false,
  mayBeOff = false,
}: {
  key: string;
  field: NumberField;
  earlier: Earlier;
  needed?: boolean;
  mayBeOff?: boolean;
}): NumberRow {
  const before = earlier(key);
  return {
    kind: 'number',
    key,
    label: field.label,
    field,
    needed,
    mayBeOff,
    before,
    repeat: repeatOf(before),
  };
}

function repeatOf(before: Before): NumberRow['repeat'] {
  if (before.state !== 'shown') return null;
  if (typeof before.value === 'number') return { label: 'as before', value: before.value };
  return before.value === 'off' ? { label: 'as before', value: 'off' } : null;
}

/** A number that is measured anew each time: the last one may be seen, and never taken over. */
export function measuredRow(row: Parameters<typeof numberRow>[0]): NumberRow {
  return { ...numberRow(row), repeat: null };
}

export function choiceRow({
  key,
  label,
  options,
  earlier,
  needed = false,
  asList = false,
}: {
  key: string;
  label: string;
  options: readonly Option[];
  earlier: Earlier;
  needed?: boolean;
  asList?: boolean;
}): ChoiceRow {
  return { kind: 'choice', key, label, options, needed, asList, before: earlier(key) };
}

export const YES_NO: readonly Option[] = [
  { value: 'yes', label: 'Yes' },
  { value: 'no', label: 'No' },
];

export function textRow({
  key,
  label,
  hint = '',
  needed = false,
  isDay = false,
}: {
  key: string;
  label: string;
  hint?: string;
  needed?: boolean;
  isDay?: boolean;
}): TextRow {
  return { kind: 'text', key, label, hint, needed, isDay, before: { state: 'none' } };
}

export const NOTE_SECTION = { title: 'Note', rows: [textRow({ key: 'note', label: 'Note' })] } as const;

/** The options of a list of words, each said as a person says it. */
export function optionsOf<Word extends string>(
  words: readonly Word[],
  labels: Readonly<Record<Word, string>>,
): Option[] {
  return words.map((value) => ({ value, label: labels[value] }));
}
