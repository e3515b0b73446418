import type { Capacity } from '@windrow/ventilation/contract/fleet';
import { MachinesByClass } from './machines-by-class.tsx';
import { UnitsTable } from './units-table.tsx';

/** The house in counts: machines as marks, and what each unit has and needs. */
export function HousePart({ capacity, now }: { capacity: Capacity; now: number }) {
  return (
    <div className="grid grid-cols-1 items-start gap-4 lg:grid-cols-[minmax(0,1fr)_22rem]">
      <section aria-labelledby="units" className="flex flex-col gap-3">
        <h2 id="units" className="font-bold text-xl">
          Units
        </h2>
        {capacity.units.length === 0 && <p>No unit has been set up yet.</p>}
        {capacity.units.length > 0 && <UnitsTable units={capacity.units} now={now} />}
      </section>
      <section aria-labelledby="machines" className="flex flex-col gap-3">
        <h2 id="machines" className="font-bold text-xl">
          Ventilators
        </h2>
        <div className="rounded-xl bg-tile p-4">
          <MachinesByClass classes={capacity.classes} />
        </div>
      </section>
    </div>
  );
}
