import { Button, buttonClass } from '@windrow/ui/controls/button';
import { Notice } from '@windrow/ui/controls/notice';
import type { Bed, BedStay, Board } from '@windrow/ventilation/contract/board';
import { Link } from 'react-router-dom';
import { patientInWords } from './patient-in-words.ts';

/**
 * A bed can lose its patient, or get another one, while somebody is typing at it. Then nothing goes on by
 * itself: the page stops until the person has read who lies there now.
 */
export function PatientGone({
  opened,
  bed,
  board,
  onRead,
}: {
  /** The stay that the page was opened for. */
  opened: BedStay;
  bed: Bed;
  board: Board;
  onRead: () => void;
}) {
  const now = board.beds.find((one) => one.stay?.stayId === opened.stayId);
  return (
    <div className="mx-auto w-full max-w-3xl">
      <Notice tone="attention" isNews title={`The patient in bed ${bed.label} has changed`}>
        <p>You opened this page for {patientInWords(opened.patient)}, who is not in this bed any more.</p>
        <p className="font-bold">
          Bed {bed.label} now: {bed.stay ? patientInWords(bed.stay.patient) : 'empty'}
        </p>
        <p>What you typed and did not record waits with the patient that it is about.</p>
        <div className="flex flex-wrap gap-3">
          {now && (
            <Link to={`/beds/${now.unitId}/${now.bedId}/now`} className={buttonClass('main')}>
              Follow the patient to bed {now.label}
            </Link>
          )}
          <Button onClick={onRead}>Show bed {bed.label} as it is now</Button>
        </div>
      </Notice>
    </div>
  );
}
