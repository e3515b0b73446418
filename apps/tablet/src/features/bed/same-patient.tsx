import { Button } from '@windrow/ui/controls/button';
import { Notice } from '@windrow/ui/controls/notice';
import type { BedStay } from '@windrow/ventilation/contract/board';
import { type ReactNode, useState } from 'react';
import { patientInWords } from './patient-in-words.ts';

/**
 * A bed can get another patient while somebody is typing at it. Then nothing goes on by itself: the page
 * stops until the person has read who lies there now.
 */
export function SamePatient({
  stay,
  bedLabel,
  children,
}: {
  stay: BedStay;
  bedLabel: string;
  children: ReactNode;
}) {
  const [first, setFirst] = useState(stay);
  if (first.stayId === stay.stayId)
    return (
      <div key={stay.stayId} className="contents">
        {children}
      </div>
    );
  return (
    <Notice tone="attention" isNews title={`The patient in bed ${bedLabel} has changed`}>
      <p>You opened this page for {patientInWords(first.patient)}, who is not in this bed any more.</p>
      <p className="font-bold">Now: {patientInWords(stay.patient)}</p>
      <p>What you typed was not recorded. It waits with the patient it is about.</p>
      <div>
        <Button tone="main" onClick={() => setFirst(stay)}>
          I have read who it is
        </Button>
      </div>
    </Notice>
  );
}
