import { useQuery } from '@tanstack/react-query';
import { unitsQuery } from '@windrow/client/board/board-queries';
import { sessionQuery } from '@windrow/client/session/session';
import { ReadFault } from '@windrow/ui/controls/faults';
import { EmptyState, LoadingState } from '@windrow/ui/controls/states';
import { Navigate } from 'react-router-dom';
import { lastUnitId } from './current-unit.ts';
import { homePath } from './home-path.ts';

/** Sends each person to where their work begins. */
export function Home() {
  const { data: session } = useQuery(sessionQuery());
  const units = useQuery(unitsQuery());
  if (!session) return null;
  if (units.isPending) return <LoadingState what="your units" />;
  if (!units.data)
    return <ReadFault error={units.error} what="Your units" onRetry={() => void units.refetch()} />;

  const unitIds = units.data.items.map(({ unitId }) => unitId);
  const path = homePath({ grants: session.grants, unitIds, lastUnitId: lastUnitId() });
  if (path !== null) return <Navigate to={path} replace />;
  return (
    <EmptyState title="This sign-in has no work on a tablet">
      <p>
        It holds no role in a unit. A wall display opens <a href="/wall">the wall</a>; a person asks the
        administrator for a role.
      </p>
    </EmptyState>
  );
}
