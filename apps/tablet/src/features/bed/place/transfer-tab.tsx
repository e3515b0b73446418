import { useQueries, useQuery } from '@tanstack/react-query';
import { boardQuery, unitsQuery } from '@windrow/client/board/board-queries';
import { EmptyState, LoadingState } from '@windrow/ui/controls/states';
import { may } from '@windrow/ventilation/permissions/permissions';
import { useCallback } from 'react';
import { useNavigate } from 'react-router-dom';
import { useBed } from '../bed-context.ts';
import { EntryForm } from '../entry/entry-form.tsx';
import { transferPlan } from '../entry/plans/stay-plans.ts';
import { nameInWords } from '../patient-in-words.ts';

type FreeBed = { value: string; label: string; unitId: string };

/** Open beds without a patient, in every unit where this person may place one. */
function useFreeBeds(): { beds: readonly FreeBed[]; isPending: boolean } {
  const { session } = useBed();
  const units = useQuery(unitsQuery());
  const placeable = (units.data?.items ?? []).filter(({ unitId }) =>
    may(session.grants, 'place-stay', unitId),
  );
  const boards = useQueries({ queries: placeable.map(({ unitId }) => boardQuery(unitId, 'staff')) });
  const beds = boards.flatMap(({ data }) =>
    (data?.beds ?? [])
      .filter((bed) => bed.isOpen && bed.stay === null)
      .map((bed) => ({ value: bed.bedId, label: `${data?.unit.name} · ${bed.label}`, unitId: bed.unitId })),
  );
  return { beds, isPending: units.isPending || boards.some((board) => board.isPending) };
}

export function TransferTab() {
  const { shown, stay, timeZone } = useBed();
  const { beds, isPending } = useFreeBeds();
  const navigate = useNavigate();
  const name = stay.patient ? nameInWords(stay.patient) : 'The patient';
  const machine = shown.bed.ventilator
    ? ` ${shown.bed.ventilator.assetNumber} goes along, unless a machine stands there already.`
    : '';
  const statement = `${name} moves with the whole record. Bed ${shown.bed.label} is empty from then on.${machine}`;
  const planOf = useCallback(() => transferPlan({ beds, statement }), [beds, statement]);

  if (isPending) return <LoadingState what="the free beds" />;
  if (beds.length === 0) {
    return (
      <EmptyState title="No free bed">
        <p>Every open bed of the units that you may place patients in is taken.</p>
      </EmptyState>
    );
  }
  return (
    <EntryForm
      draftKey={`${stay.stayId}/transfer`}
      planOf={planOf}
      initialValues={{}}
      latestId={null}
      stay={stay}
      bedLabel={shown.bed.label}
      timeZone={timeZone}
      thresholds={null}
      path={`/api/stays/${encodeURIComponent(stay.stayId)}/transfer`}
      verb="Transfer"
      doneWords="Transferred"
      onDone={({ bedId }) => {
        const to = beds.find((bed) => bed.value === bedId);
        if (to) void navigate(`/beds/${to.unitId}/${to.value}/now`, { replace: true });
      }}
    />
  );
}
