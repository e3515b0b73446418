import type { Shift } from '@windrow/ventilation/contract/shifts';

/** Latest first, as the list is read. */
export function newestFirst(shifts: readonly Shift[]): Shift[] {
  return [...shifts].sort((a, b) => b.startsAt.localeCompare(a.startsAt));
}

/** The shift to open when none was asked for: the next to come from an hour before it starts, else the one that runs, else the next, else the last. */
export function shiftToOpen({ shifts, now }: { shifts: readonly Shift[]; now: number }): Shift | null {
  const oldestFirst = newestFirst(shifts).reverse();
  const soon = oldestFirst.find(
    ({ startsAt }) => Date.parse(startsAt) > now && Date.parse(startsAt) - now <= HOUR_MS,
  );
  const running = oldestFirst.find(
    ({ startsAt, endsAt }) => Date.parse(startsAt) <= now && now < Date.parse(endsAt),
  );
  const coming = oldestFirst.find(({ startsAt }) => Date.parse(startsAt) > now);
  return soon ?? running ?? coming ?? oldestFirst.at(-1) ?? null;
}

const HOUR_MS = 3_600_000;
