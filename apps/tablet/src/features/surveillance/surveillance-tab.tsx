import { useQuery } from '@tanstack/react-query';
import { boardQuery } from '@windrow/client/board/board-queries';
import { sessionQuery } from '@windrow/client/session/session';
import { may } from '@windrow/ventilation/permissions/permissions';
import { useParams } from 'react-router-dom';
import { StaySurveillance } from './stay-surveillance.tsx';

/** The surveillance of the stay in this bed. */
export function SurveillanceTab() {
  const { unitId = '', bedId = '' } = useParams();
  const { data: session } = useQuery(sessionQuery());
  const { data: board } = useQuery(boardQuery(unitId, 'staff'));
  const bed = board?.beds.find((one) => one.bedId === bedId);
  if (!session || !bed?.stay) return null;
  const mayEnter = may(session.grants, 'record', unitId);
  return (
    <StaySurveillance
      key={bed.stay.stayId}
      stayId={bed.stay.stayId}
      revision={bed.revision}
      enterPath={mayEnter ? `/beds/${unitId}/${bedId}/surveillance/enter` : null}
    />
  );
}
