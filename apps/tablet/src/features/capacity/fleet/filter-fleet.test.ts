import type { Ventilator } from '@windrow/ventilation/contract/fleet';
import { describe, expect, it } from 'vitest';
import { filterFleet, WHOLE_FLEET } from './filter-fleet.ts';

function machine(assetNumber: string, change: Partial<Ventilator> = {}): Ventilator {
  return {
    ventilatorId: assetNumber,
    assetNumber,
    model: 'M',
    class: 'adult-icu',
    homeUnitId: 'u1',
    state: 'ready',
    sinceAt: '2026-03-05T07:00:00Z',
    version: 1,
    place: { unitId: null, bedId: null, bedLabel: null, words: null },
    ...change,
  };
}
const fleet = [
  machine('V-10'),
  machine('V-9'),
  machine('V-2', { state: 'in-use', place: { unitId: 'u2', bedId: 'b1', bedLabel: '01', words: null } }),
  machine('T-1', { class: 'transport' }),
  machine('V-1', { state: 'retired' }),
];
const numbers = (change: Partial<typeof WHOLE_FLEET>) =>
  filterFleet(fleet, { ...WHOLE_FLEET, ...change }).map(({ assetNumber }) => assetNumber);

describe('filterFleet', () => {
  it('shows the house by state and number, without what is retired', () => {
    expect(numbers({})).toEqual(['T-1', 'V-9', 'V-10', 'V-2']);
  });

  it('finds by part of an asset number, in any case, retired ones too', () => {
    expect(numbers({ search: ' v-1 ' })).toEqual(['V-10', 'V-1']);
  });

  it('filters by class, state and the unit where it stands, or its home where it stands in none', () => {
    expect(numbers({ class: 'transport' })).toEqual(['T-1']);
    expect(numbers({ state: 'retired' })).toEqual(['V-1']);
    expect(numbers({ unitId: 'u2' })).toEqual(['V-2']);
    expect(numbers({ unitId: 'u1' })).toEqual(['T-1', 'V-9', 'V-10']);
  });
});
