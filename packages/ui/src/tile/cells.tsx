import type { TileCell } from '@windrow/ventilation/board/tile-cells';

/** A row of values, each with what it is under it. */
export function Cells({ cells }: { cells: readonly TileCell[] }) {
  return (
    <span className="tile-cells">
      {cells.map(({ key, value, label, words }) => (
        <span className="tile-cell" key={key}>
          <span className="sr-only">{words}</span>
          <b aria-hidden="true">{value}</b>
          <small aria-hidden="true">{label}</small>
        </span>
      ))}
    </span>
  );
}
