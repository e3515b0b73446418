import { useQuery } from '@tanstack/react-query';
import { unitsQuery } from '@windrow/client/board/board-queries';
import { sessionQuery } from '@windrow/client/session/session';
import { Reading } from '@windrow/ui/controls/reading';
import { SegmentedTabs, segmentClass } from '@windrow/ui/controls/segmented-tabs';
import { EmptyState } from '@windrow/ui/controls/states';
import type { Unit } from '@windrow/ventilation/contract/board';
import { type Grant, may, mayAnywhere } from '@windrow/ventilation/permissions/permissions';
import { Link, useSearchParams } from 'react-router-dom';
import { FirstSteps } from './first-run/first-steps.tsx';
import { PeoplePart } from './people/people-part.tsx';
import { PolicyPart } from './policy/policy-part.tsx';
import { UnitsPart } from './units/units-part.tsx';

const PARTS = [
  { part: 'units', label: 'Units and beds' },
  { part: 'people', label: 'People' },
  { part: 'policy', label: 'Policy' },
] as const;

/** Where a hospital is put into Windrow: its units and beds, its people, and what each unit has decided. */
export function SetupPage() {
  const units = useQuery(unitsQuery());
  const session = useQuery(sessionQuery());
  const grants = session.data?.grants ?? [];
  if (!mayAnywhere(grants, 'set-up') && !mayAnywhere(grants, 'set-policy')) {
    return (
      <EmptyState title="Setup is done by administrators; a unit’s policy by its charge therapists too" />
    );
  }
  return (
    <div className="flex flex-col gap-4 py-1">
      <h1 className="font-bold text-2xl">Setup</h1>
      <Reading asked={units} what="the units">
        {({ items }) => <Parts units={items} grants={grants} />}
      </Reading>
    </div>
  );
}

function Parts({ units, grants }: { units: readonly Unit[]; grants: readonly Grant[] }) {
  const [params] = useSearchParams();
  const setsUp = mayAnywhere(grants, 'set-up');
  const open = PARTS.filter(({ part }) => setsUp || part === 'policy');
  const part = open.find((each) => each.part === params.get('part'))?.part ?? open[0]?.part ?? 'policy';
  return (
    <>
      {setsUp && <FirstSteps units={units} />}
      {open.length > 1 && (
        <SegmentedTabs label="Parts of setup">
          {open.map((each) => (
            <Link
              key={each.part}
              to={`?part=${each.part}`}
              aria-current={each.part === part ? 'page' : undefined}
              className={segmentClass(each.part === part)}
            >
              {each.label}
            </Link>
          ))}
        </SegmentedTabs>
      )}
      {part === 'units' && <UnitsPart units={units} />}
      {part === 'people' && <PeoplePart units={units} />}
      {part === 'policy' && (
        <PolicyPart units={units.filter(({ unitId }) => may(grants, 'set-policy', unitId))} />
      )}
    </>
  );
}
