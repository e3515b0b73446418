/** The spans that a shift is usually made with; a unit may make any other. */
export const SHIFT_PRESETS = {
  day: { name: 'Day', from: '07:00', to: '19:00' },
  night: { name: 'Night', from: '19:00', to: '07:00' },
} as const;
export type ShiftPreset = keyof typeof SHIFT_PRESETS;

export type ShiftSpan = { startsAt: string; endsAt: string };

const MINUTE_MS = 60_000;
const DAY_MS = 86_400_000;

/**
 * The preset shift that runs at `now` or is the next to start, by the clock on the unit's wall.
 * A night over a change of the clocks is an hour shorter or longer, as it is worked.
 *
 * @param input.now the server's clock, epoch milliseconds.
 */
export function presetSpan({
  preset,
  now,
  timeZone,
}: {
  preset: ShiftPreset;
  now: number;
  timeZone: string;
}): ShiftSpan {
  const { from, to } = SHIFT_PRESETS[preset];
  const today = localMoment(now, timeZone).slice(0, 10);
  const spans = [-1, 0, 1].map((days) => {
    const day = dayAfter(today, days);
    return spanFrom({ day, from, to, timeZone });
  });
  const span = spans.find(({ endsAt }) => Date.parse(endsAt) > now);
  if (!span)
    throw new RangeError(`no ${preset} shift found about ${new Date(now).toISOString()} in ${timeZone}`);
  return span;
}

/** The span that starts on a day of the wall's calendar; a `to` not after `from` is on the next day. */
export function spanFrom(input: { day: string; from: string; to: string; timeZone: string }): ShiftSpan {
  const endDay = input.to > input.from ? input.day : dayAfter(input.day, 1);
  return {
    startsAt: new Date(instantOf(`${input.day}T${input.from}`, input.timeZone)).toISOString(),
    endsAt: new Date(instantOf(`${endDay}T${input.to}`, input.timeZone)).toISOString(),
  };
}

/** What the wall's clock says at an instant, `yyyy-mm-ddThh:mm`. */
export function localMoment(instant: number, timeZone: string): string {
  return new Date(instant + offsetMs(instant, timeZone)).toISOString().slice(0, 16);
}

export function shiftMinutes({ startsAt, endsAt }: ShiftSpan): number {
  return (Date.parse(endsAt) - Date.parse(startsAt)) / MINUTE_MS;
}

/** The instant at which the wall's clock says `local`. In the hour that a spring change leaves out: as if it had not changed yet. */
function instantOf(local: string, timeZone: string): number {
  const asUtc = Date.parse(`${local}Z`);
  const guess = asUtc - offsetMs(asUtc, timeZone);
  // The first offset may be that of the other side of a change of the clocks; the second is right.
  const second = asUtc - offsetMs(guess, timeZone);
  return localMoment(second, timeZone) === local ? second : Math.max(guess, second);
}

/** The day of the calendar so many days later. */
export function dayAfter(day: string, days: number): string {
  return new Date(Date.parse(`${day}T00:00Z`) + days * DAY_MS).toISOString().slice(0, 10);
}

function offsetMs(instant: number, timeZone: string): number {
  const parts = new Intl.DateTimeFormat('en-GB', {
    timeZone,
    hourCycle: 'h23',
    year: 'numeric',
    month: '2-digit',
    day: '2-digit',
    hour: '2-digit',
    minute: '2-digit',
    second: '2-digit',
  }).formatToParts(new Date(instant));
  const part = (type: Intl.DateTimeFormatPartTypes) =>
    Number(parts.find((each) => each.type === type)?.value);
  const local = Date.UTC(
    part('year'),
    part('month') - 1,
    part('day'),
    part('hour'),
    part('minute'),
    part('second'),
  );
  return local - Math.floor(instant / 1000) * 1000;
}
