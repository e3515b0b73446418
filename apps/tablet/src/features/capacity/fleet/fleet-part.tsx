import { useQuery } from '@tanstack/react-query';
import { Button } from '@windrow/ui/controls/button';
import { Reading } from '@windrow/ui/controls/reading';
import { EmptyState } from '@windrow/ui/controls/states';
import type { Ventilator } from '@windrow/ventilation/contract/fleet';
import { type Grant, mayAnywhere } from '@windrow/ventilation/permissions/permissions';
import { useState } from 'react';
import { useSearchParams } from 'react-router-dom';
import { fleetQuery } from '../capacity-queries.ts';
import { AddMachine } from '../machine/add-machine.tsx';
import { MachineDialog } from '../machine/machine-dialog.tsx';
import type { UnitNames } from '../machine/place-words.ts';
import { type FleetFilter, filterFleet, isWhole, WHOLE_FLEET } from './filter-fleet.ts';
import { asClass, asState, FleetFilters } from './fleet-filters.tsx';
import { FleetList } from './fleet-list.tsx';

type Part = { grants: readonly Grant[]; units: UnitNames; now: number; timeZone: string };

/** Every machine: where it is, since when, and where it goes next. */
export function FleetPart(part: Part) {
  const fleet = useQuery(fleetQuery());
  return (
    <Reading asked={fleet} what="the fleet">
      {(machines) => <Fleet {...part} machines={machines} />}
    </Reading>
  );
}

function Fleet({ grants, units, now, timeZone, machines }: Part & { machines: readonly Ventilator[] }) {
  const [filter, setFilter] = useFilterInAddress();
  const [openId, setOpenId] = useState<string | null>(null);
  const [adding, setAdding] = useState(false);
  const shown = filterFleet(machines, filter);
  const open = machines.find(({ ventilatorId }) => ventilatorId === openId) ?? null;

  return (
    <section aria-labelledby="fleet" className="flex flex-col gap-3">
      <div className="flex flex-wrap items-center justify-between gap-3">
        <div className="flex flex-wrap items-center gap-3">
          <h2 id="fleet" className="font-bold text-xl">
            {shown.length} of {machines.length} machines
          </h2>
          {!isWhole(filter) && (
            <Button tone="quiet" onClick={() => setFilter(WHOLE_FLEET)}>
              Show all
            </Button>
          )}
        </div>
        {mayAnywhere(grants, 'manage-fleet') && (
          <Button onClick={() => setAdding(true)}>Add a machine</Button>
        )}
      </div>
      <FleetFilters filter={filter} units={units} onChange={setFilter} />
      {shown.length > 0 && <FleetList machines={shown} units={units} now={now} onOpen={setOpenId} />}
      {shown.length === 0 && machines.length > 0 && <EmptyState title="No machine is like that" />}
      {machines.length === 0 && (
        <EmptyState title="The fleet has no machines yet">
          <p>Capacity can be answered once the house’s ventilators are in it.</p>
        </EmptyState>
      )}
      {open && (
        <MachineDialog
          machine={open}
          grants={grants}
          units={units}
          now={now}
          timeZone={timeZone}
          onClose={() => setOpenId(null)}
        />
      )}
      {adding && <AddMachine units={units} onClose={() => setAdding(false)} />}
    </section>
  );
}

/** The filter is in the address, so that a row of marks can lead to it and a page can be sent on. */
function useFilterInAddress(): [FleetFilter, (filter: FleetFilter) => void] {
  const [params, setParams] = useSearchParams();
  const filter: FleetFilter = {
    search: params.get('search') ?? '',
    class: asClass(params.get('class')),
    state: asState(params.get('state')),
    unitId: params.get('unit'),
  };
  const set = (next: FleetFilter) => {
    const entries = {
      part: 'fleet',
      search: next.search,
      class: next.class,
      state: next.state,
      unit: next.unitId,
    };
    const kept = Object.entries(entries).flatMap(([key, value]) => (value ? [[key, value]] : []));
    setParams(Object.fromEntries(kept), { replace: true });
  };
  return [filter, set];
}
