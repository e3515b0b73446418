import { useQuery } from '@tanstack/react-query';
import { unitsQuery } from '@windrow/client/board/board-queries';
import { useNow } from '@windrow/client/clock/use-now';
import { sessionQuery } from '@windrow/client/session/session';
import { Reading } from '@windrow/ui/controls/reading';
import { SegmentedTabs, segmentClass } from '@windrow/ui/controls/segmented-tabs';
import type { Capacity } from '@windrow/ventilation/contract/fleet';
import type { Grant } from '@windrow/ventilation/permissions/permissions';
import { Link, useSearchParams } from 'react-router-dom';
import { AnswerCard } from './answer/answer-card.tsx';
import { countState } from './answer/count-age.ts';
import { capacityQuery } from './capacity-queries.ts';
import { FleetPart } from './fleet/fleet-part.tsx';
import { HousePart } from './house/house-part.tsx';

const SECONDS_MS = 5_000;

/** Can the house take one more, with which machines and beds; and every machine behind the counts. */
export function CapacityPage() {
  const now = useNow(SECONDS_MS);
  const capacity = useQuery(capacityQuery());
  const session = useQuery(sessionQuery());
  const timeZone = useTimeZone();

  return (
    <div className="flex flex-col gap-4 py-1">
      <h1 className="sr-only">Capacity</h1>
      <Reading asked={capacity} what="the counts">
        {(counts) => (
          <>
            <AnswerCard capacity={counts} now={now} timeZone={timeZone} />
            {countState(counts, now) !== 'withdrawn' && (
              <Parts counts={counts} grants={session.data?.grants ?? []} now={now} timeZone={timeZone} />
            )}
          </>
        )}
      </Reading>
    </div>
  );
}

function Parts({
  counts,
  grants,
  now,
  timeZone,
}: {
  counts: Capacity;
  grants: readonly Grant[];
  now: number;
  timeZone: string;
}) {
  const [params] = useSearchParams();
  const isFleet = params.get('part') === 'fleet';
  return (
    <>
      <SegmentedTabs label="Parts of capacity">
        <Link to="?" aria-current={isFleet ? undefined : 'page'} className={segmentClass(!isFleet)}>
          House
        </Link>
        <Link to="?part=fleet" aria-current={isFleet ? 'page' : undefined} className={segmentClass(isFleet)}>
          Every machine
        </Link>
      </SegmentedTabs>
      {isFleet ? (
        <FleetPart
          grants={grants}
          units={new Map(counts.units.map(({ unitId, name }) => [unitId, name]))}
          now={now}
          timeZone={timeZone}
        />
      ) : (
        <HousePart capacity={counts} now={now} />
      )}
    </>
  );
}

/** The house's clock: a unit's, or this device's zone for those who may see no unit. */
function useTimeZone(): string {
  const units = useQuery(unitsQuery());
  return units.data?.items[0]?.timeZone ?? Intl.DateTimeFormat().resolvedOptions().timeZone;
}
