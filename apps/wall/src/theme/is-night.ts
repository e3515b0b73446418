import { minuteOfDay } from '@windrow/ventilation/format/clock';

/** Whether it is a unit's night, in its own zone. A night usually passes midnight; equal ends mean no night. */
export function isNight({
  now,
  timeZone,
  nightFrom,
  nightTo,
}: {
  now: number;
  timeZone: string;
  nightFrom: string;
  nightTo: string;
}): boolean {
  const minute = minuteOfDay(now, timeZone);
  const from = minutesOf(nightFrom);
  const to = minutesOf(nightTo);
  return from <= to ? minute >= from && minute < to : minute >= from || minute < to;
}

function minutesOf(time: string): number {
  const [hours = 0, minutes = 0] = time.split(':').map(Number);
  return hours * 60 + minutes;
}
