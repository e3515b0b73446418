import { dayNumber } from './calendar-day.ts';
import { shown } from './require-number.ts';

const INSTANT = /^(\d{4}-\d{2}-\d{2})T\d{2}:\d{2}(?::\d{2}(?:\.\d{1,9})?)?(?:Z|[+-]\d{2}:\d{2})$/;

/**
 * Milliseconds since 1970 of an ISO 8601 instant. The offset must be there: without it the same text means
 * another moment on another machine.
 *
 * @throws RangeError naming the key and the value unless it is a real instant with 'Z' or an offset.
 */
export function instantMs(key: string, value: unknown): number {
  const parts = typeof value === 'string' ? INSTANT.exec(value) : null;
  const ms = parts && isDay(parts[1]) ? Date.parse(parts[0]) : Number.NaN;
  if (Number.isFinite(ms)) return ms;
  throw new RangeError(`${key} must be an ISO 8601 instant with its offset, not ${shown(value)}`);
}

function isDay(text: string | undefined): boolean {
  try {
    dayNumber('day', text);
    return true;
  } catch {
    return false;
  }
}
