import { useInfiniteQuery, useQuery } from '@tanstack/react-query';
import { boardQuery } from '@windrow/client/board/board-queries';
import { useNow } from '@windrow/client/clock/use-now';
import { sessionQuery } from '@windrow/client/session/session';
import { Button } from '@windrow/ui/controls/button';
import { ReadFault, WriteFault } from '@windrow/ui/controls/faults';
import { EmptyState, LoadingState } from '@windrow/ui/controls/states';
import type { Session } from '@windrow/ventilation/contract/session';
import { useEffect } from 'react';
import { useParams } from 'react-router-dom';
import { amendedFrom } from './amended-from.ts';
import { RecordItem } from './record-item.tsx';
import { recordQuery } from './record-query.ts';

const MINUTE_MS = 60_000;

/** Everything that stands in the record of the stay in this bed. */
export function RecordTab() {
  const { unitId = '', bedId = '' } = useParams();
  const { data: session } = useQuery(sessionQuery());
  const { data: board } = useQuery(boardQuery(unitId, 'staff'));
  const bed = board?.beds.find((one) => one.bedId === bedId);
  if (!session || !board || !bed?.stay) return null;
  return (
    <StayRecord
      key={bed.stay.stayId}
      stayId={bed.stay.stayId}
      revision={bed.revision}
      session={session}
      unitId={unitId}
      amendPath={`/beds/${unitId}/${bedId}/record/amend`}
      timeZone={board.unit.timeZone}
    />
  );
}

type StayRecordProps = {
  stayId: string;
  revision: number;
  session: Session;
  unitId: string;
  amendPath: string;
  timeZone: string;
};

function StayRecord({ stayId, revision, session, unitId, amendPath, timeZone }: StayRecordProps) {
  const now = useNow(MINUTE_MS);
  const record = useInfiniteQuery(recordQuery(stayId));
  const { refetch } = record;
  // The live link tells of a new fact by the bed's revision; the list is read again with it.
  useEffect(() => void (revision && refetch()), [revision, refetch]);

  if (record.isPending) return <LoadingState what="the record" />;
  if (!record.data)
    return <ReadFault error={record.error} what="The record" onRetry={() => void refetch()} />;
  const entries = record.data.pages.flatMap((page) => page.items);
  if (entries.length === 0) return <EmptyState title="Nothing is recorded in this stay yet" />;
  const amendedBy = amendedFrom(entries);

  return (
    <section aria-label="Record" className="mx-auto flex w-full max-w-4xl flex-col gap-3">
      {record.isError && <WriteFault error={record.error} />}
      <ol className="flex flex-col gap-2">
        {entries.map((entry) => (
          <li key={entry.observationId}>
            <RecordItem
              entry={entry}
              stayId={stayId}
              amendment={entry.amendedBy === null ? null : (amendedBy.get(entry.observationId) ?? 'not-read')}
              session={session}
              unitId={unitId}
              amendPath={amendPath}
              now={now}
              timeZone={timeZone}
            />
          </li>
        ))}
      </ol>
      {record.hasNextPage ? (
        <Button disabled={record.isFetchingNextPage} onClick={() => void record.fetchNextPage()}>
          {record.isFetchingNextPage ? 'Reading older entries …' : 'Older entries'}
        </Button>
      ) : (
        <p className="text-center text-ink-muted">The stay begins here.</p>
      )}
    </section>
  );
}
