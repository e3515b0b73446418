/** Numbers that look random and are the same each time. */
export type Random = {
  /** From 0 up to, not including, 1. */
  next: () => number;
  /** A whole number from low to high, both included. */
  whole: (low: number, high: number) => number;
  /** A number within plus or minus `spread`. */
  around: (spread: number) => number;
  pick: <Item>(items: readonly [Item, ...Item[]]) => Item;
};

/**
 * A generator of its own for each key, so that a change in one stay leaves all others as they were.
 *
 * @source mulberry32 (public domain), seeded by FNV-1a of the key.
 */
export function randomOf(key: string): Random {
  let state = seedOf(key);
  const next = () => {
    state = (state + 0x6d2b79f5) | 0;
    let mixed = Math.imul(state ^ (state >>> 15), 1 | state);
    mixed = (mixed + Math.imul(mixed ^ (mixed >>> 7), 61 | mixed)) ^ mixed;
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4294967296;
  };
  const whole = (low: number, high: number) => low + Math.floor(next() * (high - low + 1));
  return {
    next,
    whole,
    around: (spread) => (next() * 2 - 1) * spread,
    pick: (items) => items[whole(0, items.length - 1)] ?? items[0],
  };
}

function seedOf(key: string): number {
  let hash = 0x811c9dc5;
  for (const letter of key) hash = Math.imul(hash ^ (letter.codePointAt(0) ?? 0), 0x01000193);
  return hash;
}
