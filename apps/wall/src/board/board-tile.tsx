import { Tile, type TileShape } from '@windrow/ui/tile/tile';
import { type TileView, tileView } from '@windrow/ventilation/board/tile/tile-view';
import type { Bed } from '@windrow/ventilation/contract/board';
import { memo } from 'react';

/**
 * A tile that is looked at each second and drawn anew only when something on it reads differently: the
 * view is all words, so comparing it as text compares what is seen.
 */
export function BoardTile({
  bed,
  now,
  timeZone,
  shape,
}: {
  bed: Bed;
  now: number;
  timeZone: string;
  shape: TileShape;
}) {
  const view = tileView({ bed, reader: { now, timeZone } });
  return <SteadyTile view={view} look={JSON.stringify(view)} shape={shape} />;
}

const SteadyTile = memo(
  ({ view, shape }: { view: TileView; look: string; shape: TileShape }) => <Tile view={view} shape={shape} />,
  (before, after) => before.look === after.look && before.shape === after.shape,
);
