import { useNow } from '@windrow/client/clock/use-now';
import { useLive } from '@windrow/client/live/use-live';
import type { Board } from '@windrow/ventilation/contract/board';
import { useMemo } from 'react';
import { NotLiveBand } from '../live/not-live-band.tsx';
import { useReloadWhenUpgraded } from '../live/use-reload-when-upgraded.ts';
import { useTheme } from '../theme/use-theme.ts';
import { BoardFooter } from './board-footer.tsx';
import { BoardHeader } from './board-header.tsx';
import { boardLayout } from './board-layout.ts';
import { census } from './census.ts';
import { inPlanOrder, pageAt } from './pages.ts';
import { TileGrid } from './tile-grid.tsx';
import { useViewport } from './use-viewport.ts';

/** What the frame takes of the screen, in points of 1920 x 1080; the classes below say the same. */
const SIDES = 2 * 16;
const HEAD = 76;
const BAND = 128 + 8;
const FOOT = 44;
/** Values smaller than this many points of the screen itself are not drawn; the board has pages instead. */
const SMALLEST_UNIT = 0.55;

/** The board of one unit, aged each second by the server's clock. */
export function LiveBoard({ board, hasOtherUnits }: { board: Board; hasOtherUnits: boolean }) {
  const now = useNow();
  const { unit } = board;
  const { state, lastHeardAt, upgraded } = useLive(unit.unitId);
  const { width, height, scale } = useViewport();
  useTheme({ now, unit });
  useReloadWhenUpgraded(upgraded && state === 'live');

  const isSilent = state === 'not-live' || state === 'withdrawn';
  const beds = useMemo(() => inPlanOrder(board.beds), [board.beds]);
  const room = { width: width - SIDES, height: height - FOOT - (isSilent ? BAND : HEAD) };
  const layout = boardLayout({ beds: beds.length, ...room, smallestUnit: SMALLEST_UNIT / scale });
  const page = pageAt({ all: beds, perPage: layout.perPage, now });

  return (
    <div className="flex h-screen flex-col px-4" data-live={state}>
      {isSilent ? (
        <NotLiveBand unit={unit} now={now} lastHeardAt={lastHeardAt} isWithdrawn={state === 'withdrawn'} />
      ) : (
        <BoardHeader
          unit={unit}
          now={now}
          counts={census(beds, now)}
          ready={board.fleet.ready}
          page={page}
          isConnecting={state === 'connecting'}
          hasOtherUnits={hasOtherUnits}
        />
      )}
      <main className="relative flex min-h-0 flex-1">
        {beds.length === 0 ? (
          <p className="m-auto text-title text-ink-muted">This unit has no beds yet.</p>
        ) : (
          <TileGrid
            beds={page.items}
            layout={layout}
            now={now}
            timeZone={unit.timeZone}
            isWithdrawn={state === 'withdrawn'}
          />
        )}
        {isSilent && <div className="not-live-rake rake-wide" />}
      </main>
      <BoardFooter demonstration={board.demonstration} />
    </div>
  );
}
