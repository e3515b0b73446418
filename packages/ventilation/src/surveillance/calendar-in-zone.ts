import { shown } from '../units/require-number.ts';

/**
 * A reader of calendar days in a time zone, summer time included, whatever the machine's own zone.
 *
 * @throws RangeError naming the key and the value on an unknown zone.
 */
export function calendarInZone(key: string, timeZone: unknown): (instantMs: number) => string {
  const format = formatFor(key, timeZone);
  return (instantMs) => {
    const parts = new Map(format.formatToParts(instantMs).map(({ type, value }) => [type, value]));
    return `${parts.get('year')?.padStart(4, '0')}-${parts.get('month')}-${parts.get('day')}`;
  };
}

function formatFor(key: string, timeZone: unknown): Intl.DateTimeFormat {
  try {
    // Without a zone Intl would quietly take the machine's.
    if (typeof timeZone === 'string') {
      return new Intl.DateTimeFormat('en-GB', {
        timeZone,
        year: 'numeric',
        month: '2-digit',
        day: '2-digit',
      });
    }
  } catch {
    // Falls through to the message that names the key.
  }
  throw new RangeError(`${key} must be an IANA time zone such as Europe/Berlin, not ${shown(timeZone)}`);
}
