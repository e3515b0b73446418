import { useCallback } from 'react';
import { useNavigate } from 'react-router-dom';
import { useBed } from '../bed-context.ts';
import { EntryForm } from '../entry/entry-form.tsx';
import { endPlan } from '../entry/plans/stay-plans.ts';
import { nameInWords } from '../patient-in-words.ts';

export function EndTab() {
  const { board, shown, stay, timeZone } = useBed();
  const navigate = useNavigate();
  const name = stay.patient ? nameInWords(stay.patient) : 'The patient';
  const machine = shown.bed.ventilator ? ` ${shown.bed.ventilator.assetNumber} goes to cleaning.` : '';
  const statement = `The stay of ${name} ends and takes no more entries. Bed ${shown.bed.label} is empty from then on.${machine}`;
  const planOf = useCallback(() => endPlan({ statement }), [statement]);
  return (
    <EntryForm
      draftKey={`${stay.stayId}/end`}
      planOf={planOf}
      initialValues={{}}
      latestId={null}
      stay={stay}
      bedLabel={shown.bed.label}
      timeZone={timeZone}
      thresholds={null}
      path={`/api/stays/${encodeURIComponent(stay.stayId)}/discharge`}
      verb="End the stay"
      doneWords="Stay ended"
      onDone={() => void navigate(`/round/${board.unit.unitId}`, { replace: true })}
    />
  );
}
