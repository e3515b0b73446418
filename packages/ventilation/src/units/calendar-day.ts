import { shown } from './require-number.ts';

const DAY_MS = 86_400_000;
const DAY = /^(\d{4})-(\d{2})-(\d{2})$/;

/**
 * The number of a calendar day, so that days can be counted: 1 apart is the next day, whatever the
 * machine's time zone and whether the clocks change that night.
 *
 * @throws RangeError naming the key and the value unless it is a real day as 'YYYY-MM-DD'.
 */
export function dayNumber(key: string, value: unknown): number {
  const parts = typeof value === 'string' ? DAY.exec(value) : null;
  if (parts) {
    const [year, month, date] = [Number(parts[1]), Number(parts[2]) - 1, Number(parts[3])];
    const day = new Date(Date.UTC(year, month, date));
    // A day that no calendar has rolls over into another. Compared by number: every tile asks each second.
    const isReal = day.getUTCFullYear() === year && day.getUTCMonth() === month && day.getUTCDate() === date;
    if (isReal) return day.getTime() / DAY_MS;
  }
  throw new RangeError(`${key} must be a calendar day as YYYY-MM-DD, not ${shown(value)}`);
}

/** The calendar day, as 'YYYY-MM-DD', of a number from `dayNumber`. */
export function dayFromNumber(number: number): string {
  return new Date(number * DAY_MS).toISOString().slice(0, 10);
}
