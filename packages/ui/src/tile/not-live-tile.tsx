import { BedLabel } from './bed-label.tsx';
import type { TileShape } from './tile.tsx';

/** A bed on a screen that has been silent too long: that it is there is all that may still be said. */
export function NotLiveTile({ label, shape }: { label: string; shape: TileShape }) {
  return (
    <article className="tile tile-empty" data-shape={shape} aria-label={`Bed ${label}, not live`}>
      <BedLabel label={label} />
      <p className="tile-nobody">not live</p>
    </article>
  );
}
