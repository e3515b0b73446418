import type { Load } from '@windrow/ventilation/assignment/loads';
import type { Assignment, Shift } from '@windrow/ventilation/contract/shifts';
import { formatDate, formatMoment, formatTime } from '@windrow/ventilation/format/clock';

/** Minutes as they are shown; tasks may be priced in halves. */
export function inMinutes(minutes: number): string {
  return `${Math.round(minutes)} min`;
}

/** "625 of 690 min", and how far past it. */
export function sumOf({ minutes, person, over }: Pick<Load, 'minutes' | 'person' | 'over'>): string {
  const sum = `${Math.round(minutes)} of ${inMinutes(person.minutesAvailable)}`;
  return over > 0 ? `${sum}, ${Math.round(over)} over` : sum;
}

/** "05-Mar-2026 07:00–19:00". */
export function spanOf({ startsAt, endsAt }: Pick<Shift, 'startsAt' | 'endsAt'>, timeZone: string): string {
  return `${formatDate(startsAt, timeZone)} ${formatTime(startsAt, timeZone)}–${formatTime(endsAt, timeZone)}`;
}

/** What becomes of an assignment that nobody is changing: a draft, or on every screen, by whom and when. */
export function standingOf({
  assignment,
  now,
  timeZone,
}: {
  assignment: Assignment;
  now: number;
  timeZone: string;
}): string {
  const standing = standingOnServer({ assignment, now, timeZone });
  return Date.parse(assignment.shift.endsAt) <= now ? `shift has ended; ${standing}` : standing;
}

function standingOnServer({
  assignment,
  now,
  timeZone,
}: {
  assignment: Assignment;
  now: number;
  timeZone: string;
}): string {
  const { version, publishedVersion, changedBy, changedAt } = assignment;
  if (!changedBy || !changedAt) return publishedVersion === null ? 'draft, not published' : 'published';
  const who = `by ${changedBy} at ${formatMoment(changedAt, now, timeZone)}`;
  if (publishedVersion === version) return `published ${who}`;
  return publishedVersion === null
    ? `draft saved ${who}, not published`
    : `draft saved ${who}; screens show the one before`;
}

/** "1 bed", "3 beds". */
export function beds(count: number): string {
  return count === 1 ? '1 bed' : `${count} beds`;
}
