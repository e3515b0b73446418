import type { KeypadKey } from '@windrow/ui/controls/keypad';
import type { NumberRow } from './entry-field.ts';
import { isSameTime, pressTime, type TimeDraft } from './entry-time.ts';
import { pressKey, toText } from './press-key.ts';

/** Everything that a person has put into one form, as it was put in. */
export type EntryDraft = {
  /** Texts by row; a row that was never touched is not in it. */
  values: Readonly<Record<string, string>>;
  /** The very text about which was asked and which was kept; another text is asked about again. */
  kept: Readonly<Record<string, string>>;
  /** Rows that were left once: from then on what is wrong with them is said. */
  left: readonly string[];
  /** The row that the keypad writes into. */
  active: string | null;
  /** The row that was typed into since the keypad came to it: from then on digits are added, before that they replace. */
  typing: string | null;
  time: TimeDraft;
  /** It was sent without an answer and stopped: the record may hold it as it was then. */
  mayStand: boolean;
  /** The fact that was the latest when this was begun; another since then is told. */
  startedFrom: string | null;
};

export type EntryAction =
  | { type: 'press'; row: NumberRow; key: KeypadKey }
  | { type: 'repeat'; row: NumberRow }
  | { type: 'repeat-all'; rows: readonly NumberRow[] }
  | { type: 'stopped' }
  | { type: 'set'; key: string; text: string }
  | { type: 'focus'; key: string | null }
  | { type: 'leave'; key: string }
  | { type: 'press-time'; key: KeypadKey }
  | { type: 'leave-all' }
  | { type: 'keep'; key: string }
  | { type: 'time'; time: TimeDraft };

/** The row of the observed time, which the keypad also writes into. */
export const TIME_KEY = 'observedAt';

export function reduceEntry(draft: EntryDraft, action: EntryAction): EntryDraft {
  switch (action.type) {
    case 'press':
      return {
        ...withText(draft, action.row.key, pressed(draft, action.row, action.key)),
        typing: action.row.key,
      };
    case 'repeat':
      return withRepeat(draft, action.row);
    case 'repeat-all':
      return action.rows.reduce(withRepeat, draft);
    case 'stopped':
      return { ...draft, mayStand: true };
    case 'set':
      return withText(draft, action.key, action.text);
    case 'focus':
      return draft.active === action.key
        ? draft
        : { ...draft, active: action.key, typing: null, left: leaving(draft, draft.active) };
    case 'leave':
      return { ...draft, left: leaving(draft, action.key) };
    case 'press-time':
      return draft.time === null
        ? draft
        : { ...draft, time: { ...draft.time, digits: pressTime(draft.time.digits, action.key) } };
    case 'leave-all':
      return {
        ...draft,
        active: null,
        left: [...new Set([...draft.left, ...Object.keys(draft.values), TIME_KEY])],
      };
    case 'keep':
      return { ...draft, kept: { ...draft.kept, [action.key]: draft.values[action.key] ?? '' } };
    case 'time':
      return { ...draft, time: action.time };
  }
}

/** Whether there is anything in it that would be missed. */
export function isUntouched(draft: EntryDraft, initial: EntryDraft): boolean {
  const keys = new Set([...Object.keys(draft.values), ...Object.keys(initial.values)]);
  const sameValues = [...keys].every((key) => (draft.values[key] ?? '') === (initial.values[key] ?? ''));
  return !draft.mayStand && sameValues && isSameTime(draft.time, initial.time);
}

const CHANGES_WHAT_STANDS: readonly KeypadKey[] = ['plus', 'minus', 'erase', 'sign'];

/** The first digit in a field that holds a number begins a new one: "33" over "39" is 33, never 3933. */
function pressed(draft: EntryDraft, row: NumberRow, key: KeypadKey): string {
  const begins = draft.typing !== row.key && !CHANGES_WHAT_STANDS.includes(key);
  const text = begins ? '' : (draft.values[row.key] ?? '');
  return pressKey({ text, key, field: row.field, from: stepStart(row) });
}

/** − and + start at the last value that may still be seen. */
function stepStart({ repeat, before }: NumberRow): number | null {
  if (typeof repeat?.value === 'number') return repeat.value;
  return before.state === 'shown' && typeof before.value === 'number' ? before.value : null;
}

function repeated({ repeat, field }: NumberRow): string | null {
  if (repeat === null) return null;
  return repeat.value === 'off' ? 'off' : toText(repeat.value, field);
}

function withRepeat(draft: EntryDraft, row: NumberRow): EntryDraft {
  return withText(draft, row.key, repeated(row) ?? draft.values[row.key] ?? '');
}

function withText(draft: EntryDraft, key: string, text: string): EntryDraft {
  return { ...draft, values: { ...draft.values, [key]: text } };
}

function leaving(draft: EntryDraft, key: string | null): readonly string[] {
  return key === null || draft.left.includes(key) ? draft.left : [...draft.left, key];
}
