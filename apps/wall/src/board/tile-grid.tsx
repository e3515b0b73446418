import { NotLiveTile } from '@windrow/ui/tile/not-live-tile';
import type { Bed } from '@windrow/ventilation/contract/board';
import { type BoardLayout, GAP } from './board-layout.ts';
import { BoardTile } from './board-tile.tsx';

/** The beds of a page, filled row by row. Once the screen has been silent too long only their labels are left. */
export function TileGrid({
  beds,
  layout: { columns, rows, shape, unit },
  now,
  timeZone,
  isWithdrawn,
}: {
  beds: readonly Bed[];
  layout: BoardLayout;
  now: number;
  timeZone: string;
  isWithdrawn: boolean;
}) {
  const style = {
    '--tile-unit': `${unit / 16}rem`,
    gap: `${GAP / 16}rem`,
    gridTemplateColumns: `repeat(${columns}, minmax(0, 1fr))`,
    gridTemplateRows: `repeat(${rows}, minmax(0, 1fr))`,
  };
  return (
    <div className="grid min-h-0 flex-1" style={style}>
      {beds.map((bed) =>
        isWithdrawn ? (
          <NotLiveTile key={bed.bedId} label={bed.label} shape={shape} />
        ) : (
          <BoardTile key={bed.bedId} bed={bed} now={now} timeZone={timeZone} shape={shape} />
        ),
      )}
    </div>
  );
}
