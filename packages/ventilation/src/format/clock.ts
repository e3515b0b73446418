const MONTHS = ['Jan', 'Feb', 'Mar', 'Apr', 'May', 'Jun', 'Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec'] as const;

const formatters = new Map<string, Intl.DateTimeFormat>();

function partsIn(instant: string | number, timeZone: string): Record<string, string> {
  let formatter = formatters.get(timeZone);
  if (!formatter) {
    // Making one costs far more than using one, and every tile asks each minute.
    formatter = new Intl.DateTimeFormat('en-GB', {
      timeZone,
      hourCycle: 'h23',
      year: 'numeric',
      month: '2-digit',
      day: '2-digit',
      hour: '2-digit',
      minute: '2-digit',
      second: '2-digit',
    });
    formatters.set(timeZone, formatter);
  }
  return Object.fromEntries(
    formatter.formatToParts(new Date(instant)).map(({ type, value }) => [type, value]),
  );
}

/** The time of day in a unit's zone, 24-hour: `03:10`. */
export function formatTime(instant: string | number, timeZone: string): string {
  const { hour, minute } = partsIn(instant, timeZone);
  return `${hour}:${minute}`;
}

export function formatTimeWithSeconds(instant: string | number, timeZone: string): string {
  const { hour, minute, second } = partsIn(instant, timeZone);
  return `${hour}:${minute}:${second}`;
}

/** A date in words that no country reads otherwise: `05-Mar-2026`. @source NHS Common User Interface, date display. */
export function formatDate(instant: string | number, timeZone: string): string {
  const { day, month, year } = partsIn(instant, timeZone);
  return `${day}-${MONTHS[Number(month) - 1]}-${year}`;
}

/** A calendar day `yyyy-mm-dd` in the same form; it has no zone. */
export function formatDay(day: string): string {
  const [year, month, date] = day.split('-');
  return `${date}-${MONTHS[Number(month) - 1]}-${year}`;
}

/** The day and time, the day left out where it is the reader's today. */
export function formatMoment(instant: string | number, now: string | number, timeZone: string): string {
  const day = formatDate(instant, timeZone);
  const time = formatTime(instant, timeZone);
  return day === formatDate(now, timeZone) ? time : `${day} ${time}`;
}

/** Minutes since midnight in the zone; for hours of the day such as the night theme's. */
export function minuteOfDay(instant: string | number, timeZone: string): number {
  const { hour, minute } = partsIn(instant, timeZone);
  return Number(hour) * 60 + Number(minute);
}
