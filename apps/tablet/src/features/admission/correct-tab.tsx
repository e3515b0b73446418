import { useQuery } from '@tanstack/react-query';
import { boardQuery } from '@windrow/client/board/board-queries';
import { sessionQuery } from '@windrow/client/session/session';
import { EmptyState } from '@windrow/ui/controls/states';
import { may } from '@windrow/ventilation/permissions/permissions';
import { useParams } from 'react-router-dom';
import { CorrectForm } from './correct-form.tsx';
import { detailsOf } from './correction.ts';

/** Who the patient is and what is ordered, put right. */
export function CorrectTab() {
  const { unitId = '', bedId = '' } = useParams();
  const { data: session } = useQuery(sessionQuery());
  const { data: board } = useQuery(boardQuery(unitId, 'staff'));
  const bed = board?.beds.find((one) => one.bedId === bedId);
  const details = bed?.stay ? detailsOf(bed.stay) : null;
  if (!session || !bed?.stay) return null;
  if (!details || !may(session.grants, 'place-stay', unitId))
    return <EmptyState title="Your roles do not allow corrections here" />;
  return (
    <CorrectForm
      key={bed.stay.stayId}
      bed={bed}
      stayId={bed.stay.stayId}
      version={bed.stay.version}
      details={details}
    />
  );
}
