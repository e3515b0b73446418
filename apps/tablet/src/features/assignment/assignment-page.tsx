import { useQuery } from '@tanstack/react-query';
import { boardQuery, unitsQuery } from '@windrow/client/board/board-queries';
import { policyQuery } from '@windrow/client/board/policy-query';
import { useNow } from '@windrow/client/clock/use-now';
import { sessionQuery } from '@windrow/client/session/session';
import { Reading } from '@windrow/ui/controls/reading';
import { EmptyState, ErrorState } from '@windrow/ui/controls/states';
import type { Unit } from '@windrow/ventilation/contract/board';
import type { Shift } from '@windrow/ventilation/contract/shifts';
import { may } from '@windrow/ventilation/permissions/permissions';
import { useParams, useSearchParams } from 'react-router-dom';
import { AssignmentDesk } from './assignment-desk.tsx';
import { newestFirst, shiftToOpen } from './shift/pick-shift.ts';
import { ShiftBar } from './shift/shift-bar.tsx';
import { ShiftForm } from './shift/shift-form.tsx';
import { assignmentQuery, shiftsQuery } from './shift-queries.ts';

/** Who has which bed in a shift: divided by the charge therapist, seen by all who work with it. */
export function AssignmentPage() {
  const { unitId = '' } = useParams();
  const units = useQuery(unitsQuery());
  return (
    <div className="flex flex-col gap-3 py-1">
      <Reading asked={units} what="the units">
        {({ items }) => {
          const unit = items.find((each) => each.unitId === unitId);
          // Another unit is another page: no draft or choice of one goes over to the next.
          return unit ? (
            <UnitShifts key={unitId} unit={unit} />
          ) : (
            <ErrorState title="This unit is not one of yours" />
          );
        }}
      </Reading>
    </div>
  );
}

function UnitShifts({ unit }: { unit: Unit }) {
  const [params, setParams] = useSearchParams();
  const now = useNow(60_000);
  const session = useQuery(sessionQuery());
  const shifts = useQuery(shiftsQuery(unit.unitId));
  const mayMove = may(session.data?.grants ?? [], 'assign', unit.unitId);
  const open = (shiftId: string | null) => setParams(shiftId === null ? {} : { shift: shiftId });
  const asked = params.get('shift');

  return (
    <Reading asked={shifts} what="the shifts">
      {({ items }) => {
        const isMaking = mayMove && (asked === 'new' || items.length === 0);
        const shift = items.find(({ shiftId }) => shiftId === asked) ?? shiftToOpen({ shifts: items, now });
        return (
          <>
            <div className="flex flex-wrap items-center justify-between gap-x-6 gap-y-3">
              <h1 className="font-bold text-2xl">{unit.name} · assignment</h1>
              {shift && !isMaking && (
                <ShiftBar
                  shifts={newestFirst(items)}
                  chosen={shift}
                  timeZone={unit.timeZone}
                  mayMake={mayMove}
                  onChoose={open}
                  onMake={() => open('new')}
                />
              )}
            </div>
            {isMaking && (
              <ShiftForm
                unit={unit}
                onMade={({ shiftId }) => open(shiftId)}
                onCancel={items.length > 0 ? () => open(null) : null}
              />
            )}
            {!isMaking && !shift && <EmptyState title="No shift has been made for this unit yet" />}
            {!isMaking && shift && (
              <OneShift key={shift.shiftId} unit={unit} shift={shift} mayMove={mayMove} />
            )}
          </>
        );
      }}
    </Reading>
  );
}

function OneShift({ unit, shift, mayMove }: { unit: Unit; shift: Shift; mayMove: boolean }) {
  const assignment = useQuery(assignmentQuery({ unitId: unit.unitId, shiftId: shift.shiftId }));
  const board = useQuery(boardQuery(unit.unitId, 'staff'));
  const policy = useQuery(policyQuery(unit.unitId));
  return (
    <Reading asked={assignment} what="the assignment">
      {(read) => (
        <Reading asked={board} what="the beds">
          {({ beds }) => (
            <Reading asked={policy} what="the unit’s task minutes">
              {(version) => (
                <AssignmentDesk
                  unit={unit}
                  assignment={read}
                  beds={beds}
                  policy={version.policy}
                  mayMove={mayMove}
                />
              )}
            </Reading>
          )}
        </Reading>
      )}
    </Reading>
  );
}
