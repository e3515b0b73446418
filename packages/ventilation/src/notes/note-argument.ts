import type { Range } from '../units/require-number.ts';

/** One value that a calculation takes, as its `@param` tells it. */
export type NoteArgument = {
  key: string;
  /** What it is: "exhaled tidal volume". */
  label: string;
  /** What else is said of it; empty when nothing is. */
  words: string;
  /** Left out it counts as this, or, with `null`, as nothing. Not there: it must be given. */
  unlessGiven?: string | null;
} & (
  | { kind: 'number'; unit: string; range: Range }
  | { kind: 'choice'; options: readonly string[] }
  | { kind: 'yes-no' }
  | { kind: 'text' }
  | { kind: 'json' }
);

const NUMBER = /^(.+?)(?:, ([^,()]+(?:\([^)]*\))?))? \((-?[\d.e+-]+) to (-?[\d.e+-]+)\)(.*)$/;
const CHOICE = /^([^:']+): ('[^']+'(?:(?:, | or )'[^']+')*)(.*)$/;
const YES_NO = /^(whether [^;]+)(.*)$/;
const TEXT = /^(.+?), text\b(.*)$/;
const JSON_VALUE = /^((?:list|record) of [^,:;]+)(.*)$/;

/**
 * `label, unit (low to high)`, `label: 'a' or 'b'`, `whether …`, `label, text`, `list of …` or `record of …`; then what
 * else is to be said, with `; x unless given` or `may be left out` where it is so.
 *
 * @throws Error on any other form, naming the key.
 */
export function noteArgument(key: string, text: string): NoteArgument {
  const shape = shapeOf(text);
  if (shape === null) throw new Error(`@param ${key} has no kind that can be read: ${text}`);
  return { key, ...shape, ...leavingOut(text) };
}

type Shape = NoteArgument extends infer Each
  ? Each extends NoteArgument
    ? Omit<Each, 'key'>
    : never
  : never;

function shapeOf(text: string): Shape | null {
  const json = JSON_VALUE.exec(text);
  if (json) return { kind: 'json', label: endless(json[1]), words: rest(json[2]) };
  const choice = CHOICE.exec(text);
  if (choice)
    return { kind: 'choice', label: endless(choice[1]), options: quoted(choice[2]), words: rest(choice[3]) };
  const yesNo = YES_NO.exec(text);
  if (yesNo) return { kind: 'yes-no', label: endless(yesNo[1]), words: rest(yesNo[2]) };
  const number = NUMBER.exec(text);
  if (number) {
    const [, label, unit = '', low, high, more] = number;
    const range: Range = [Number(low), Number(high)];
    if (!range.every(Number.isFinite)) return null;
    return { kind: 'number', label: endless(label), unit, range, words: rest(more) };
  }
  const plain = TEXT.exec(text);
  return plain ? { kind: 'text', label: endless(plain[1]), words: rest(plain[2]) } : null;
}

function leavingOut(text: string): Pick<NoteArgument, 'unlessGiven'> {
  const unlessGiven = /; '?([^\s';]+)'? unless given/.exec(text)?.[1];
  if (unlessGiven !== undefined) return { unlessGiven };
  return text.includes('may be left out') ? { unlessGiven: null } : {};
}

function quoted(text = ''): string[] {
  return [...text.matchAll(/'([^']+)'/g)].map(([, word = '']) => word);
}

function rest(text = ''): string {
  return endless(text.replace(/^[\s,;.:]+/, ''));
}

function endless(text = ''): string {
  return text.trim().replace(/\.$/, '');
}
