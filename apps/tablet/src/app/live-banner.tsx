import { useLive } from '@windrow/client/live/use-live';
import { Button } from '@windrow/ui/controls/button';
import { formatTimeWithSeconds } from '@windrow/ventilation/format/clock';

/** Over every page that shows the record: whether it still hears the server, and if not, since when. */
export function LiveBanner({ unitId, timeZone }: { unitId: string | undefined; timeZone: string | null }) {
  const { state, lastHeardAt, upgraded } = useLive(unitId);
  const isLost = state === 'not-live' || state === 'withdrawn';
  const since =
    lastHeardAt !== null && timeZone !== null ? ` since ${formatTimeWithSeconds(lastHeardAt, timeZone)}` : '';
  return (
    <div role="status" className="sticky top-0 z-20">
      {isLost && (
        <p className="border-ink border-y-2 bg-ink px-5 py-2 font-bold text-ground">
          Not live{since}.{' '}
          {state === 'withdrawn'
            ? 'Values are withdrawn until the server answers.'
            : 'What is shown was read before that; its ages go on.'}
        </p>
      )}
      {upgraded && !isLost && (
        <p className="flex flex-wrap items-center gap-3 border-note border-y-2 px-5 py-2">
          Windrow was renewed. Load it again when you have recorded what you are at.
          <Button onClick={() => window.location.reload()}>Load again</Button>
        </p>
      )}
    </div>
  );
}
