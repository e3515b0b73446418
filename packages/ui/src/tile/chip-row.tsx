import type { TileChip } from '@windrow/ventilation/board/tile/tile-view';
import { Chip } from './chip.tsx';
import { chipsThatFit, lettersOf } from './chips-that-fit.ts';

/** What "2 seen" takes, in the measure of letters. */
const SEEN_LETTERS = 8;

/**
 * The flags of a bed in the room that there is; those without room are counted, and said to who listens. Those
 * that somebody has acknowledged are counted apart and quietly, in words.
 */
export function ChipRow({
  chips,
  seen,
  letters,
}: {
  chips: readonly TileChip[];
  seen: number;
  letters: number;
}) {
  const { chips: shown, more } = chipsThatFit(chips, seen > 0 ? letters - SEEN_LETTERS : letters);
  return (
    <span className="tile-chips">
      {shown.map(({ id, level, short }) => (
        <Chip key={id} level={level}>
          {short}
        </Chip>
      ))}
      {more.length > 0 && (
        <span className="chip chip-more" data-level={more[0]?.level}>
          <span aria-hidden="true">+{more.length}</span>
          <span className="sr-only">and {more.map(({ short }) => short).join(', ')}</span>
        </span>
      )}
      {seen > 0 && (
        <span className={hasRoom(shown, more.length > 0, letters) ? 'tile-seen' : 'sr-only'}>
          {seen} seen<span className="sr-only">: acknowledged flags</span>
        </span>
      )}
    </span>
  );
}

/** A single long chip is shown whatever the room; then the count is only said. */
function hasRoom(shown: readonly TileChip[], hasMore: boolean, letters: number): boolean {
  return lettersOf(shown, hasMore) + SEEN_LETTERS <= letters;
}
