import type { TileShape } from '@windrow/ui/tile/tile';

export type BoardLayout = {
  columns: number;
  rows: number;
  shape: TileShape;
  /** The size of a tile's unit, in points of a 1920 x 1080 screen. */
  unit: number;
  perPage: number;
  pages: number;
};

/** More on one page cannot be read across a room. */
const MOST_ON_A_PAGE = 24;
export const GAP = 9;
/** What tile.css needs at one point a unit, and how large its values are then. */
const SHAPES: Record<TileShape, { width: number; height: number; value: number }> = {
  wide: { width: 452, height: 226, value: 33 },
  narrow: { width: 304, height: 232, value: 29 },
};
/** Few beds are not blown up without end. */
const LARGEST_UNIT = 2.2;

/**
 * Columns, rows and shape that give these beds the largest values in the room there is. Where even 24 beds
 * or fewer would be drawn smaller than `smallestUnit`, the board has pages.
 *
 * @param input.width, height of the room in points of a 1920 x 1080 screen.
 */
export function boardLayout(input: {
  beds: number;
  width: number;
  height: number;
  smallestUnit: number;
}): BoardLayout {
  const beds = Math.max(1, input.beds);
  for (let pages = Math.ceil(beds / MOST_ON_A_PAGE); ; pages += 1) {
    const perPage = Math.ceil(beds / pages);
    const best = largest(candidates(perPage, input));
    if (perPage === 1 || best.unit >= input.smallestUnit) return { ...best, perPage, pages };
  }
}

type Candidate = Pick<BoardLayout, 'columns' | 'rows' | 'shape' | 'unit'> & { score: number };

function candidates(beds: number, { width, height }: { width: number; height: number }): Candidate[] {
  const columnCounts = Array.from({ length: beds }, (_, index) => index + 1);
  return columnCounts.flatMap((columns) =>
    (['wide', 'narrow'] as const).map((shape) => {
      const rows = Math.ceil(beds / columns);
      const needed = SHAPES[shape];
      const fits = Math.min(
        (width - GAP * (columns - 1)) / columns / needed.width,
        (height - GAP * (rows - 1)) / rows / needed.height,
      );
      const unit = Math.min(LARGEST_UNIT, fits);
      // Among near equals, fewer vacant places: a gap in the plan looks like a bed that is missing.
      const vacant = columns * rows - beds;
      return { columns, rows, shape, unit, score: unit * needed.value - vacant * 2 };
    }),
  );
}

function largest(all: Candidate[]): Omit<Candidate, 'score'> {
  const { score: _score, ...best } = all.reduce((a, b) => (b.score > a.score ? b : a));
  return best;
}
