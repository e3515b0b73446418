import { useQuery } from '@tanstack/react-query';
import { boardQuery } from '@windrow/client/board/board-queries';
import { buttonClass } from '@windrow/ui/controls/button';
import { ReadFault } from '@windrow/ui/controls/faults';
import { EmptyState, LoadingState } from '@windrow/ui/controls/states';
import { Link, useParams } from 'react-router-dom';
import { AdmitForm } from './admit-form.tsx';

/** A patient into an open, empty bed. */
export function AdmitPage() {
  const { unitId = '', bedId = '' } = useParams();
  const board = useQuery(boardQuery(unitId, 'staff'));
  if (board.isPending) return <LoadingState what="the bed" />;
  if (!board.data)
    return <ReadFault error={board.error} what="The bed" onRetry={() => void board.refetch()} />;
  const bed = board.data.beds.find((one) => one.bedId === bedId);
  if (!bed) return <EmptyState title={`${board.data.unit.name} has no such bed`} />;
  if (!bed.isOpen || bed.stay) {
    return (
      <EmptyState title={bed.isOpen ? `Bed ${bed.label} has a patient` : `Bed ${bed.label} is closed`}>
        <Link to={bed.isOpen ? `/beds/${unitId}/${bedId}/now` : `/round/${unitId}`} className={buttonClass()}>
          {bed.isOpen ? 'To the bed' : 'To the round'}
        </Link>
      </EmptyState>
    );
  }
  return <AdmitForm key={bedId} bed={bed} unit={board.data.unit} />;
}
