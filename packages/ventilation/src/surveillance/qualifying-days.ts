/** Days before a start on which the agent must not have been given for it to be new. */
const FREE_DAYS_BEFORE = 2;
/** Days in a row that a new antimicrobial, or several together, must qualify. */
export const QUALIFYING_DAYS_NEEDED = 4;

/**
 * Days that qualify, of all agents together and in order. An agent counts from its first new start in the window;
 * a single day left out between two of its days is filled.
 *
 * @source CDC NHSN, ventilator-associated event protocol.
 */
export function qualifyingDaysOf({
  window,
  courses,
}: {
  window: { first: number; last: number };
  courses: readonly ReadonlySet<number>[];
}): number[] {
  const qualifying = new Set(courses.flatMap((given) => daysOfAgent(given, window)));
  return [...qualifying].sort((a, b) => a - b);
}

function daysOfAgent(given: ReadonlySet<number>, { first, last }: { first: number; last: number }): number[] {
  const inOrder = [...given].sort((a, b) => a - b);
  const start = inOrder.find((day) => day >= first && day <= last && isNew(day, given));
  if (start === undefined) return [];
  return inOrder
    .filter((day) => day >= start)
    .flatMap((day) => (given.has(day + 1) || !given.has(day + 2) ? [day] : [day, day + 1]));
}

function isNew(day: number, given: ReadonlySet<number>): boolean {
  for (let before = 1; before <= FREE_DAYS_BEFORE; before += 1) if (given.has(day - before)) return false;
  return true;
}

/** The longest run of days in a row that begins within the window. */
export function runFromWindow(days: readonly number[], { last }: { last: number }): number {
  const given = new Set(days);
  const starts = days.filter((day) => day <= last && !given.has(day - 1));
  return starts.reduce((longest, start) => {
    let end = start;
    while (given.has(end)) end += 1;
    return Math.max(longest, end - start);
  }, 0);
}
