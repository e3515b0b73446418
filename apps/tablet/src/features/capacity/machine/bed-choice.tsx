import { useQuery } from '@tanstack/react-query';
import { boardQuery, unitsQuery } from '@windrow/client/board/board-queries';
import { Reading } from '@windrow/ui/controls/reading';
import { SelectField } from '@windrow/ui/controls/select-field';
import type { Unit } from '@windrow/ventilation/contract/board';
import { type Grant, may } from '@windrow/ventilation/permissions/permissions';
import { useState } from 'react';
import { bedsToChoose } from './beds-to-choose.ts';

/** At which bed a machine is put to use. Beds on a ventilator by the record that have no machine yet come first. */
export function BedChoice({
  grants,
  bedId,
  error,
  onChoose,
}: {
  grants: readonly Grant[];
  bedId: string;
  error: string | undefined;
  onChoose: (bedId: string) => void;
}) {
  const units = useQuery(unitsQuery());
  return (
    <Reading asked={units} what="the units">
      {({ items }) => (
        <UnitThenBed
          units={items.filter(({ unitId }) => may(grants, 'see-board', unitId))}
          bedId={bedId}
          error={error}
          onChoose={onChoose}
        />
      )}
    </Reading>
  );
}

function UnitThenBed({
  units,
  bedId,
  error,
  onChoose,
}: {
  units: readonly Unit[];
  bedId: string;
  error: string | undefined;
  onChoose: (bedId: string) => void;
}) {
  const [chosen, setChosen] = useState<string | null>(null);
  const unitId = chosen ?? units[0]?.unitId ?? null;
  if (unitId === null) return <p>You may see no unit’s beds.</p>;
  return (
    <div className="grid gap-4 sm:grid-cols-2">
      <SelectField
        label="Unit"
        options={units.map((unit) => ({ value: unit.unitId, label: unit.name }))}
        value={unitId}
        onChange={(event) => {
          setChosen(event.target.value);
          onChoose('');
        }}
      />
      <Beds unitId={unitId} bedId={bedId} error={error} onChoose={onChoose} />
    </div>
  );
}

function Beds({
  unitId,
  bedId,
  error,
  onChoose,
}: {
  unitId: string;
  bedId: string;
  error: string | undefined;
  onChoose: (bedId: string) => void;
}) {
  const board = useQuery(boardQuery(unitId, 'staff'));
  return (
    <Reading asked={board} what="the beds">
      {({ beds }) => (
        <SelectField
          label="Bed"
          empty="choose"
          options={bedsToChoose(beds)}
          value={bedId}
          error={error}
          onChange={(event) => onChoose(event.target.value)}
        />
      )}
    </Reading>
  );
}
