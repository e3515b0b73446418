import type { NoteArgument } from '@windrow/ventilation/notes/note-argument';
import type { MethodNote } from '@windrow/ventilation/notes/parse-docblock';
import type { Runnable } from './note-sources.ts';

/** What stands in each field, by the key of its argument; nothing where nothing was given. */
export type Texts = Readonly<Record<string, string>>;

export type Outcome =
  | { state: 'result'; value: unknown }
  /** Not everything is given yet. */
  | { state: 'wanting'; message: string }
  /** The calculation's own words, and the field that they are about. */
  | { state: 'refused'; key: string | null; message: string };

const NUMERIC = /^[+-]?(\d+\.?\d*|\.\d+)(e[+-]?\d+)?$/i;

/** Runs a calculation on what was typed. What it accepts is its own to say: nothing is judged here. */
export function runNote({
  note,
  calculation,
  texts,
}: Pick<Runnable, 'note' | 'calculation'> & { texts: Texts }): Outcome {
  const wanting = note.arguments.filter((argument) => isWanting(argument, texts));
  try {
    const input: Record<string, unknown> = {};
    for (const argument of note.arguments) {
      const text = texts[argument.key]?.trim() ?? '';
      if (text !== '') input[argument.key] = typedValue(argument, text);
    }
    return { state: 'result', value: calculation(note.isBare ? Object.values(input)[0] : input) };
  } catch (error) {
    if (!(error instanceof RangeError)) throw error;
    return refusalOf({ note, texts, wanting, message: error.message });
  }
}

function refusalOf({
  note,
  texts,
  wanting,
  message,
}: {
  note: MethodNote;
  texts: Texts;
  wanting: readonly NoteArgument[];
  message: string;
}): Outcome {
  const named = /^\w+/.exec(message)?.[0];
  const key = note.arguments.find((argument) => argument.key === named)?.key ?? null;
  // An empty field is not wrong yet; only what was typed into one can be.
  if (key !== null && (texts[key]?.trim() ?? '') !== '') return { state: 'refused', key, message };
  if (wanting.length > 0) {
    return { state: 'wanting', message: `Still wanting: ${wanting.map(({ label }) => label).join('; ')}.` };
  }
  return key === null ? { state: 'refused', key, message } : { state: 'wanting', message };
}

function isWanting({ key, unlessGiven }: NoteArgument, texts: Texts): boolean {
  return unlessGiven === undefined && (texts[key]?.trim() ?? '') === '';
}

/** A text that is no number stays a text, so that the refusal shows it as it was typed. */
function typedValue({ key, kind }: NoteArgument, text: string): unknown {
  switch (kind) {
    case 'number':
      return NUMERIC.test(text) ? Number(text) : text;
    case 'yes-no':
      return text === 'true';
    case 'json':
      return jsonOf(key, text);
    case 'choice':
    case 'text':
      return text === 'null' ? null : text;
  }
}

function jsonOf(key: string, text: string): unknown {
  try {
    return JSON.parse(text);
  } catch {
    throw new RangeError(`${key} must be written as JSON; this cannot be read as it`);
  }
}

/** What the form opens with: the numbers of the address, else the example where a field cannot be guessed. */
export function openingTexts({ note, query }: { note: MethodNote; query: URLSearchParams }): Texts {
  const isGiven = note.arguments.some(({ key }) => query.has(key));
  return Object.fromEntries(
    note.arguments.map((argument) => [
      argument.key,
      query.get(argument.key) ?? (isGiven ? null : exampleText(note, argument.key)) ?? defaultText(argument),
    ]),
  );
}

function exampleText({ example }: MethodNote, key: string): string | null {
  const value = example?.[key];
  if (value === undefined) return null;
  if (typeof value === 'string') return value;
  // A row of a list on a line of its own: so it can be read and typed.
  return Array.isArray(value) && value.length > 1
    ? `[\n${value.map((row) => `  ${JSON.stringify(row)}`).join(',\n')}\n]`
    : JSON.stringify(value);
}

/** A choice that need not be made stands as it counts; a number that need not be given stays empty. */
function defaultText({ kind, unlessGiven }: NoteArgument): string {
  return kind === 'choice' || kind === 'yes-no' ? (unlessGiven ?? '') : '';
}
