import { useQuery } from '@tanstack/react-query';
import { Button } from '@windrow/ui/controls/button';
import { Reading } from '@windrow/ui/controls/reading';
import { EmptyState } from '@windrow/ui/controls/states';
import type { Unit } from '@windrow/ventilation/contract/board';
import { useState } from 'react';
import { useSearchParams } from 'react-router-dom';
import { bedsQuery } from '../setup-queries.ts';
import { UnitChoice } from '../unit-choice.tsx';
import { NewUnitDialog } from './new-unit-dialog.tsx';
import { UnitPlan } from './unit-plan.tsx';

/** Units, and the floor plan of one. */
export function UnitsPart({ units }: { units: readonly Unit[] }) {
  const [params, setParams] = useSearchParams();
  const [adding, setAdding] = useState(false);
  const unit = units.find(({ unitId }) => unitId === params.get('unit')) ?? units[0] ?? null;
  const choose = (unitId: string) => setParams({ part: 'units', unit: unitId }, { replace: true });
  return (
    <section aria-label="Units and beds" className="flex flex-col gap-4">
      <div className="flex flex-wrap items-end gap-3">
        {unit && <UnitChoice units={units} unitId={unit.unitId} onChoose={choose} />}
        <Button tone={unit ? 'plain' : 'main'} onClick={() => setAdding(true)}>
          Add a unit
        </Button>
      </div>
      {unit ? (
        <BedsOf key={unit.unitId} unit={unit} />
      ) : (
        <EmptyState title="There is no unit yet">
          <p>A unit is one intensive-care unit with its own beds, people and policy.</p>
        </EmptyState>
      )}
      {adding && (
        <NewUnitDialog
          onClose={() => setAdding(false)}
          onAdded={({ unitId }) => {
            setAdding(false);
            choose(unitId);
          }}
        />
      )}
    </section>
  );
}

function BedsOf({ unit }: { unit: Unit }) {
  const beds = useQuery(bedsQuery(unit.unitId));
  return (
    <Reading asked={beds} what="the beds">
      {({ items }) => <UnitPlan unit={unit} beds={items} />}
    </Reading>
  );
}
