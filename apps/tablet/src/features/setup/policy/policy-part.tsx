import { useQuery } from '@tanstack/react-query';
import { policyQuery } from '@windrow/client/board/policy-query';
import { Reading } from '@windrow/ui/controls/reading';
import { EmptyState } from '@windrow/ui/controls/states';
import type { Unit } from '@windrow/ventilation/contract/board';
import { useSearchParams } from 'react-router-dom';
import { UnitChoice } from '../unit-choice.tsx';
import { PolicyForm } from './policy-form.tsx';

/** What each unit has decided: how old is too old, what is worth a flag, what a task takes. */
export function PolicyPart({ units }: { units: readonly Unit[] }) {
  const [params, setParams] = useSearchParams();
  const unit = units.find(({ unitId }) => unitId === params.get('unit')) ?? units[0] ?? null;
  if (!unit) return <EmptyState title="A policy belongs to a unit, and there is none yet" />;
  return (
    <section aria-label="Policy" className="flex flex-col gap-4">
      <UnitChoice
        units={units}
        unitId={unit.unitId}
        onChoose={(unitId) => setParams({ part: 'policy', unit: unitId }, { replace: true })}
      />
      <PolicyOf key={unit.unitId} unit={unit} />
    </section>
  );
}

function PolicyOf({ unit }: { unit: Unit }) {
  const policy = useQuery(policyQuery(unit.unitId));
  return (
    <Reading asked={policy} what="the policy">
      {(latest) => <PolicyForm unit={unit} latest={latest} />}
    </Reading>
  );
}
