import type { DemoUnit } from './demo-types.ts';

/** Three units of three sizes: 8, 16 and 24 beds, two of them closed. */
export function demoUnits(timeZone: string): DemoUnit[] {
  return [
    { key: 'harbour', name: 'Harbour ICU', timeZone, beds: floorPlan({ rows: 4, columns: 4, closed: [] }) },
    { key: 'lantern', name: 'Lantern ICU', timeZone, beds: floorPlan({ rows: 2, columns: 4, closed: [] }) },
    {
      key: 'orchard',
      name: 'Orchard ICU',
      timeZone,
      beds: floorPlan({ rows: 4, columns: 6, closed: ['09', '18'] }),
    },
  ];
}

/** Beds numbered along the rows. */
function floorPlan({ rows, columns, closed }: { rows: number; columns: number; closed: string[] }) {
  return Array.from({ length: rows * columns }, (_, index) => {
    const label = String(index + 1).padStart(2, '0');
    const row = Math.floor(index / columns) + 1;
    return { label, row, column: (index % columns) + 1, isOpen: !closed.includes(label) };
  });
}
