import { useQuery } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';
import { StaySurveillance } from './stay-surveillance.tsx';
import { surveillanceQuery } from './surveillance-query.ts';

/** The surveillance of any stay by its address, also of one that has ended; nothing is entered here. */
export function SurveillancePage() {
  const { stayId = '' } = useParams();
  const { data } = useQuery(surveillanceQuery(stayId));
  return (
    <div className="mx-auto flex w-full max-w-7xl grow flex-col gap-3">
      <h1 className="font-bold text-2xl">
        {data
          ? `Surveillance: ${data.patient.familyName}, ${data.patient.givenName}, No. ${data.patient.hospitalNumber}`
          : 'Surveillance'}
      </h1>
      <StaySurveillance key={stayId} stayId={stayId} revision={0} enterPath={null} />
    </div>
  );
}
