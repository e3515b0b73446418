import type { KeypadKey } from '@windrow/ui/controls/keypad';
import { formatDay, formatTime } from '@windrow/ventilation/format/clock';
import { dayIn, instantIn } from '@windrow/ventilation/format/zoned-time';

/** When it was observed: `null` means now; else a day and up to four digits of a clock. */
export type TimeDraft = { day: string; digits: string } | null;

export type JudgedTime =
  | { state: 'now' }
  | { state: 'refused'; message: string }
  | { state: 'set'; at: number };

/** How far ahead of the server's clock a fact may lie: two clocks never agree to the second. */
const AHEAD_MS = 120_000;
/** Recorded later than this, an entry says both times. */
const LATE_AFTER_MS = 15 * 60_000;

export function judgeTime({
  time,
  now,
  timeZone,
}: {
  time: TimeDraft;
  now: number;
  timeZone: string;
}): JudgedTime {
  if (time === null) return { state: 'now' };
  const clock = clockOf(time.digits);
  if (clock === null)
    return { state: 'refused', message: 'The time is four digits of a 24-hour clock, such as 09:40' };
  const at = instantIn({ day: time.day, time: clock, timeZone, notAfter: now + AHEAD_MS });
  if (at === null)
    return {
      state: 'refused',
      message: `No clock here showed ${clock} on ${formatDay(time.day)}: the hour was left out`,
    };
  if (at > now + AHEAD_MS) {
    return {
      state: 'refused',
      message: `${clock} is ahead of the clock, which shows ${formatTime(now, timeZone)}`,
    };
  }
  return { state: 'set', at };
}

/** The digits as a clock shows them while they are typed: `09:4`. */
export function shownDigits(digits: string): string {
  return digits.length > 2 ? `${digits.slice(0, 2)}:${digits.slice(2)}` : digits;
}

export function timeFrom(at: number, timeZone: string): NonNullable<TimeDraft> {
  return { day: dayIn(at, timeZone), digits: formatTime(at, timeZone).replace(':', '') };
}

export function isSameTime(a: TimeDraft, b: TimeDraft): boolean {
  return a?.day === b?.day && a?.digits === b?.digits;
}

export function isLate({ observedAt, recordedAt }: { observedAt: number; recordedAt: number }): boolean {
  return recordedAt - observedAt > LATE_AFTER_MS;
}

function clockOf(digits: string): string | null {
  const [, hour, minute] = /^(\d{2})(\d{2})$/.exec(digits) ?? [];
  return hour !== undefined && minute !== undefined && Number(hour) < 24 && Number(minute) < 60
    ? `${hour}:${minute}`
    : null;
}

const STEP_MINUTES = 5;
const DAY_MINUTES = 1440;

/** The digits of a clock after one key of the keypad. Steps stay within the day. */
export function pressTime(digits: string, key: KeypadKey): string {
  switch (key) {
    case 'clear':
      return '';
    case 'erase':
      return digits.slice(0, -1);
    case 'plus':
      return timeMoved(digits, STEP_MINUTES);
    case 'minus':
      return timeMoved(digits, -STEP_MINUTES);
    case 'point':
    case 'sign':
      return digits;
    default:
      return digits.length < 4 ? digits + key : digits;
  }
}

function timeMoved(digits: string, by: number): string {
  const clock = clockOf(digits);
  if (clock === null) return digits;
  const minutes = Number(digits.slice(0, 2)) * 60 + Number(digits.slice(2)) + by;
  const kept = Math.min(DAY_MINUTES - 1, Math.max(0, minutes));
  return String(Math.floor(kept / 60)).padStart(2, '0') + String(kept % 60).padStart(2, '0');
}
