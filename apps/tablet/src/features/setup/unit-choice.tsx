import { SelectField } from '@windrow/ui/controls/select-field';
import type { Unit } from '@windrow/ventilation/contract/board';

/** Which unit is meant. */
export function UnitChoice({
  units,
  unitId,
  onChoose,
}: {
  units: readonly Unit[];
  unitId: string;
  onChoose: (unitId: string) => void;
}) {
  return (
    <div className="w-full max-w-xs">
      <SelectField
        label="Unit"
        options={units.map((unit) => ({ value: unit.unitId, label: unit.name }))}
        value={unitId}
        onChange={(event) => onChoose(event.target.value)}
      />
    </div>
  );
}
