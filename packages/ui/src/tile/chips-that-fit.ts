import type { TileChip } from '@windrow/ventilation/board/tile/tile-view';

export type FittedChips = { chips: readonly TileChip[]; more: readonly TileChip[] };

/** What a chip takes beside its words, in the same measure: its mark, its edges and the gap. */
const EDGES = 4.5;
/** What "+2" takes. */
const MORE = 5;

/**
 * As many chips as fit whole, the first always; the rest are counted. Words are never cut, so the room is
 * reckoned in letters, and generously.
 */
export function chipsThatFit(chips: readonly TileChip[], letters: number): FittedChips {
  let used = 0;
  let count = 0;
  for (const { short } of chips) {
    const needed = used + short.length + EDGES + (count + 1 < chips.length ? MORE : 0);
    if (count > 0 && needed > letters) break;
    used += short.length + EDGES;
    count += 1;
  }
  return { chips: chips.slice(0, count), more: chips.slice(count) };
}

/** What these take, with their "+2" where there is one. */
export function lettersOf(chips: readonly TileChip[], hasMore: boolean): number {
  return chips.reduce((sum, { short }) => sum + short.length + EDGES, hasMore ? MORE : 0);
}
