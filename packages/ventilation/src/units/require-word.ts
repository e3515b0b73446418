import { shown } from './require-number.ts';

/**
 * Refuses anything but one of the accepted words.
 *
 * @throws RangeError naming the key, the value and the accepted words.
 */
export function requireWord(key: string, value: unknown, words: readonly string[]): void {
  if (typeof value === 'string' && words.includes(value)) return;
  throw new RangeError(`${key} must be one of ${words.join(', ')}, not ${shown(value)}`);
}

/**
 * Refuses anything but `true` and `false`: a missing answer is not a no.
 *
 * @throws RangeError naming the key and the value.
 */
export function requireBoolean(key: string, value: unknown): void {
  if (typeof value === 'boolean') return;
  throw new RangeError(`${key} must be true or false, not ${shown(value)}`);
}

/**
 * Refuses anything but a list.
 *
 * @throws RangeError naming the key and the value.
 */
export function requireList(key: string, value: unknown): void {
  if (Array.isArray(value)) return;
  throw new RangeError(`${key} must be a list, not ${shown(value)}`);
}
