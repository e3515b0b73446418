import type { TileChip } from '@windrow/ventilation/board/tile/tile-view';
import { Chip } from './chip.tsx';
import { chipsThatFit } from './chips-that-fit.ts';

/** The flags of a bed in the room that there is; those without room are counted, and said to who listens. */
export function ChipRow({ chips, letters }: { chips: readonly TileChip[]; letters: number }) {
  const { chips: shown, more } = chipsThatFit(chips, letters);
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
    </span>
  );
}
