/** A time of day as it was typed, `7`, `715`, `7:15` or `7.15`, as `07:15`; what is no time stays as it is. */
export function asClockTime(typed: string): string {
  const [, hours, minutes = '00'] = /^\s*(\d{1,2})[:.]?(\d{2})?\s*$/.exec(typed) ?? [];
  const time = `${(hours ?? '').padStart(2, '0')}:${minutes}`;
  return hours !== undefined && isClockTime(time) ? time : typed;
}

/** Whether a text is a time of the 24-hour clock, `00:00` to `23:59`. */
export function isClockTime(text: string): boolean {
  return /^([01]\d|2[0-3]):[0-5]\d$/.test(text);
}
