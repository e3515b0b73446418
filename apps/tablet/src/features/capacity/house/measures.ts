import type { Capacity } from '@windrow/ventilation/contract/fleet';

type UnitCounts = Capacity['units'][number];
export type Measure = { words: string; of: (unit: UnitCounts) => number };

/** What is counted in every unit, in the order in which a supervisor asks. Each can be summed over the house. */
export const MEASURES: readonly { heading: string; rows: readonly Measure[] }[] = [
  {
    heading: 'Beds',
    rows: [
      { words: 'staffed and free', of: ({ beds }) => beds.free },
      { words: 'open', of: ({ beds }) => beds.open },
      { words: 'occupied', of: ({ beds }) => beds.occupied },
      { words: 'closed', of: ({ beds }) => beds.closed },
    ],
  },
  {
    heading: 'Patients breathing with',
    rows: [
      { words: 'invasive ventilation', of: ({ support }) => support.invasive },
      { words: 'mask ventilation', of: ({ support }) => support.mask },
      { words: 'high flow', of: ({ support }) => support.highFlow },
      { words: 'oxygen or room air', of: ({ support }) => support.other },
      { words: 'not recorded', of: ({ support }) => support.unknown },
    ],
  },
  {
    heading: 'Ventilators',
    rows: [
      { words: 'ready here', of: (unit) => unit.ventilatorsReady },
      { words: 'patients on one not of the fleet', of: (unit) => unit.withoutMachine },
    ],
  },
  {
    heading: 'Work',
    rows: [
      { words: 'patients whom nobody has', of: (unit) => unit.unassigned },
      { words: 'checks overdue', of: (unit) => unit.checksOverdue },
    ],
  },
];

/** The oldest check of some units; null where there is none. */
export function oldestCheck(units: readonly UnitCounts[]): number | null {
  const times = units.flatMap(({ oldestCheckAt }) => (oldestCheckAt ? [Date.parse(oldestCheckAt)] : []));
  return times.length > 0 ? Math.min(...times) : null;
}
