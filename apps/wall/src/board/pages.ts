import type { Bed } from '@windrow/ventilation/contract/board';

export const PAGE_EVERY_MS = 20_000;

/** The beds in the order of the floor plan: row by row, as somebody walks. */
export function inPlanOrder(beds: readonly Bed[]): Bed[] {
  return beds.toSorted((a, b) => a.row - b.row || a.column - b.column || a.label.localeCompare(b.label));
}

export type Page<T> = { items: readonly T[]; number: number; of: number };

/** The page whose turn it is. It goes by the server's clock, so walls of one unit turn together. */
export function pageAt<T>({
  all,
  perPage,
  now,
}: {
  all: readonly T[];
  perPage: number;
  now: number;
}): Page<T> {
  const of = Math.max(1, Math.ceil(all.length / perPage));
  const index = Math.floor(now / PAGE_EVERY_MS) % of;
  return { items: all.slice(index * perPage, (index + 1) * perPage), number: index + 1, of };
}
