import type { Ventilator, VentilatorClass, VentilatorState } from '@windrow/ventilation/contract/fleet';

/** What of the fleet is looked at; null: all of it. Retired machines are out of the house until asked for. */
export type FleetFilter = {
  search: string;
  class: VentilatorClass | null;
  state: VentilatorState | null;
  unitId: string | null;
};
export const WHOLE_FLEET: FleetFilter = { search: '', class: null, state: null, unitId: null };

export function isWhole(filter: FleetFilter): boolean {
  return filter.search === '' && filter.class === null && filter.state === null && filter.unitId === null;
}

const STATE_ORDER: readonly VentilatorState[] = ['ready', 'in-use', 'cleaning', 'held', 'on-loan', 'retired'];

/** The machines that a filter leaves, ready ones first, then by asset number as people count. */
export function filterFleet(fleet: readonly Ventilator[], filter: FleetFilter): Ventilator[] {
  const wanted = filter.search.trim().toLowerCase();
  return fleet
    .filter((machine) => filter.class === null || machine.class === filter.class)
    .filter((machine) =>
      filter.state === null ? machine.state !== 'retired' || wanted !== '' : machine.state === filter.state,
    )
    .filter(
      (machine) => filter.unitId === null || (machine.place.unitId ?? machine.homeUnitId) === filter.unitId,
    )
    .filter((machine) => machine.assetNumber.toLowerCase().includes(wanted))
    .sort(
      (a, b) =>
        STATE_ORDER.indexOf(a.state) - STATE_ORDER.indexOf(b.state) ||
        a.assetNumber.localeCompare(b.assetNumber, 'en', { numeric: true }),
    );
}
