import { formatTime } from './clock.ts';

const MINUTE_MS = 60_000;
const DAY_MS = 86_400_000;

/** The calendar day, `yyyy-mm-dd`, that an instant falls on in a zone. */
export function dayIn(instant: number, timeZone: string): string {
  return new Intl.DateTimeFormat('en-CA', {
    timeZone,
    year: 'numeric',
    month: '2-digit',
    day: '2-digit',
  }).format(instant);
}

/** The day before or after; calendar days have no zone. */
export function dayMoved(day: string, by: number): string {
  return new Date(Date.parse(`${day}T00:00:00Z`) + by * DAY_MS).toISOString().slice(0, 10);
}

/**
 * The instant at which a clock on the wall of this zone shows `hh:mm` on that day. Null when no clock
 * showed it (the hour that is left out in spring). Of an hour that comes twice, the later is meant that
 * is not after `notAfter`: who writes down what was seen means a time that has been.
 */
export function instantIn({
  day,
  time,
  timeZone,
  notAfter = Number.POSITIVE_INFINITY,
}: {
  day: string;
  time: string;
  timeZone: string;
  notAfter?: number;
}): number | null {
  const asUtc = Date.parse(`${day}T${time}:00Z`);
  // A zone lies within 14 h of UTC, and changes its offset by at most one step around one moment.
  const candidates = [asUtc + DAY_MS / 2, asUtc, asUtc - DAY_MS / 2]
    .map((near) => asUtc - offsetAt(near, timeZone))
    .filter((instant) => dayIn(instant, timeZone) === day && formatTime(instant, timeZone) === time);
  if (candidates.length === 0) return null;
  const past = candidates.filter((instant) => instant <= notAfter);
  return past.length > 0 ? Math.max(...past) : Math.min(...candidates);
}

function offsetAt(instant: number, timeZone: string): number {
  const whole = Math.floor(instant / MINUTE_MS) * MINUTE_MS;
  return Date.parse(`${dayIn(whole, timeZone)}T${formatTime(whole, timeZone)}:00Z`) - whole;
}
