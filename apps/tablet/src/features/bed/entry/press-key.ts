import type { KeypadKey } from '@windrow/ui/controls/keypad';
import type { NumberField } from '@windrow/ventilation/entry/fields';
import { formatNumber } from '@windrow/ventilation/format/number';

const LONGEST = 6;
const DIGITS = ['0', '1', '2', '3', '4', '5', '6', '7', '8', '9'] as const satisfies readonly KeypadKey[];

/**
 * The text of a number field after one key. Slips that change a value tenfold are blocked here: a second
 * point, a leading zero, a point that stands alone. A point in a whole-number field is let in, so that
 * "7.5" is refused as such and never read as 75.
 *
 * @param from where − and + start when nothing is typed yet: the value before, if there is one to be seen.
 */
export function pressKey({
  text,
  key,
  field,
  from,
}: {
  text: string;
  key: KeypadKey;
  field: NumberField;
  from: number | null;
}): string {
  const typed = text === 'off' ? '' : text;
  switch (key) {
    case 'clear':
      return '';
    case 'erase':
      return text === 'off' ? '' : text.slice(0, -1);
    case 'plus':
      return stepped({ text: typed, by: 1, field, from });
    case 'minus':
      return stepped({ text: typed, by: -1, field, from });
    case 'sign':
      return typed.startsWith('-') ? typed.slice(1) : `-${typed}`;
    case 'point':
      return withPoint(typed);
    default:
      return withDigit({ text: typed, digit: key, field });
  }
}

function withPoint(text: string): string {
  if (text.includes('.')) return text;
  return /\d$/.test(text) ? `${text}.` : `${text}0.`;
}

function withDigit({ text, digit, field }: { text: string; digit: string; field: NumberField }): string {
  const decimals = text.split('.')[1];
  // A percentage of oxygen may also be given as a fraction, which has two decimals.
  const most = field.unit === '%' ? 2 : Math.max(1, field.decimals);
  if (decimals !== undefined && decimals.length >= most) return text;
  if (text === '0' || text === '-0') return text.slice(0, -1) + digit;
  return text.length < LONGEST ? text + digit : text;
}

function stepped({
  text,
  by,
  field,
  from,
}: {
  text: string;
  by: 1 | -1;
  field: NumberField;
  from: number | null;
}): string {
  const start = text === '' ? from : Number(text);
  if (start === null || !Number.isFinite(start)) return text;
  const [low, high] = field.hard;
  // Whole steps are counted, so that 0.1 + 0.2 stays 0.3.
  const moved = Math.round((start + by * field.step) / 10 ** -field.decimals) * 10 ** -field.decimals;
  return toText(Math.min(high, Math.max(low, moved)), field);
}

/** A value as it would have been typed. */
export function toText(value: number, field: NumberField): string {
  return formatNumber(value, field).replace('−', '-');
}

/** The keypad key that a key of a physical keyboard stands for; null: the field does not take it. */
export function keypadKeyOf(key: string, field: NumberField): KeypadKey | null {
  const digit = digitOf(key);
  if (digit !== null) return digit;
  switch (key) {
    case '.':
    case ',':
    case 'Decimal':
      return 'point';
    case 'ArrowUp':
    case '+':
      return 'plus';
    case 'ArrowDown':
      return 'minus';
    case '-':
      return field.hard[0] < 0 ? 'sign' : 'minus';
    case 'Backspace':
      return 'erase';
    case 'Delete':
      return 'clear';
    default:
      return null;
  }
}

/** Text that came in at once (pasted, scanned, filled) as if each key of it had been pressed. */
export function pressAll(text: string, field: NumberField): string {
  if (text.trim().toLowerCase() === 'off') return 'off';
  return [...text.trim()].reduce((typed, character) => {
    const key = keypadKeyOf(character, field);
    return key === null || key === 'plus' || key === 'minus'
      ? typed
      : pressKey({ text: typed, key, field, from: null });
  }, '');
}

/** As `keypadKeyOf`, for the four digits of a clock. */
export function timeKeyOf(key: string): KeypadKey | null {
  const others: Readonly<Record<string, KeypadKey>> = {
    ArrowUp: 'plus',
    ArrowDown: 'minus',
    Backspace: 'erase',
    Delete: 'clear',
  };
  return digitOf(key) ?? others[key] ?? null;
}

function digitOf(key: string): KeypadKey | null {
  return DIGITS.find((digit) => digit === key) ?? null;
}
