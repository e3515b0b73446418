import type { NoteResult } from '@windrow/ventilation/notes/note-result';

export type ResultLine = { label: string | null; value: string; unit: string };

const NO_VALUE = 'no value';

/** A result as it can be read, unrounded: one line, or one for each part of it. */
export function resultLines({ result, value }: { result: NoteResult; value: unknown }): ResultLine[] {
  if (Array.isArray(value)) {
    if (value.length === 0) return [{ label: null, value: 'none', unit: '' }];
    // A place in a list of numbers means something (how many of them come true); rows are only counted.
    const first = typeof value[0] === 'number' ? 0 : 1;
    return value.map((each, at) => ({ label: `${at + first}`, value: inWords(each), unit: '' }));
  }
  if (typeof value === 'object' && value !== null) {
    const parts = new Map(result.parts.map((part) => [part.key, part]));
    return Object.entries(value).map(([key, each]) => ({
      label: parts.get(key)?.label ?? key,
      value: inWords(each),
      unit: each === null ? '' : (parts.get(key)?.unit ?? ''),
    }));
  }
  return [{ label: null, value: inWords(value), unit: value === null ? '' : result.unit }];
}

/** All the digits that a computer's number holds for certain, without those that only its binary form adds. */
export function fullNumber(value: number): string {
  return String(Number(value.toPrecision(15))).replace(/^-/, '\u2212');
}

function inWords(value: unknown): string {
  if (value === null || value === undefined) return NO_VALUE;
  if (typeof value === 'number') return fullNumber(value);
  if (typeof value === 'boolean') return value ? 'yes' : 'no';
  if (Array.isArray(value)) return value.length > 0 ? value.map(inWords).join(', ') : 'none';
  if (typeof value === 'object') {
    return Object.entries(value)
      .map(([key, each]) => `${key} ${inWords(each)}`)
      .join(' · ');
  }
  return String(value);
}
