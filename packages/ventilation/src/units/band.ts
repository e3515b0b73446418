/** A band that ends at a value and includes it. */
export type UpTo<T> = { readonly upTo: number; readonly is: T };
/** A band that ends at a value and leaves it to the next band. */
export type Below<T> = { readonly below: number; readonly is: T };

/** The first band, in ascending order, whose end the value does not pass. */
export function bandUpTo<T>(bands: readonly UpTo<T>[], value: number): T {
  return found(
    bands.find((band) => settled(value) <= band.upTo),
    value,
  );
}

/** The first band, in ascending order, whose end the value does not reach. */
export function bandBelow<T>(bands: readonly Below<T>[], value: number): T {
  return found(
    bands.find((band) => settled(value) < band.below),
    value,
  );
}

/**
 * Quotients miss their exact value by a few parts in 10^16 (114 ÷ 0.57 gives 200.00000000000003), which must not put a
 * patient on the other side of an edge; a billionth is far below anything that can be measured.
 */
function settled(value: number): number {
  return Math.round(value * 1e9) / 1e9;
}

function found<T>(band: { readonly is: T } | undefined, value: number): T {
  if (band) return band.is;
  throw new RangeError(`no band holds ${value}`);
}
