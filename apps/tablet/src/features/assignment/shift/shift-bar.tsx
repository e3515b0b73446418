import { Button } from '@windrow/ui/controls/button';
import { FIELD_CLASS } from '@windrow/ui/controls/text-field';
import type { Shift } from '@windrow/ventilation/contract/shifts';
import { spanOf } from '../words.ts';

/** Which shift is looked at, and a way to make another. */
export function ShiftBar({
  shifts,
  chosen,
  timeZone,
  mayMake,
  onChoose,
  onMake,
}: {
  shifts: readonly Shift[];
  chosen: Shift;
  timeZone: string;
  mayMake: boolean;
  onChoose: (shiftId: string) => void;
  onMake: () => void;
}) {
  return (
    <div className="flex min-w-0 flex-wrap items-center gap-3">
      <label className="min-w-0 max-w-full">
        <span className="sr-only">Shift</span>
        <select
          className={`${FIELD_CLASS} font-bold`}
          value={chosen.shiftId}
          onChange={(event) => onChoose(event.target.value)}
        >
          {shifts.map((shift) => (
            <option key={shift.shiftId} value={shift.shiftId}>
              {`${shift.name} · ${spanOf(shift, timeZone)}${shift.publishedVersion === null ? ' · not published' : ''}`}
            </option>
          ))}
        </select>
      </label>
      {mayMake && <Button onClick={onMake}>New shift</Button>}
    </div>
  );
}
