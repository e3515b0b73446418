import type { Capacity } from '@windrow/ventilation/contract/fleet';
import { describe, expect, it } from 'vitest';
import { answerFrom } from './answer.ts';

function house({
  ready,
  free,
  without = 0,
}: {
  ready: number;
  free: number[];
  without?: number;
}): Pick<Capacity, 'classes' | 'units'> {
  const names = ['Harbour', 'Lantern', 'Orchard'];
  return {
    classes: [
      {
        class: 'transport',
        label: 'Transport',
        counts: { inUse: 0, ready: 9, cleaning: 0, held: 0, onLoan: 0 },
      },
      {
        class: 'adult-icu',
        label: 'Adult intensive care',
        counts: { inUse: 20, ready, cleaning: 1, held: 0, onLoan: 0 },
      },
    ],
    units: free.map((each, index) => ({
      unitId: `u${index}`,
      name: names[index] ?? '',
      beds: { open: 8, closed: 0, occupied: 8 - each, free: each },
      support: { invasive: 4, mask: 0, highFlow: 0, other: 0, unknown: 0 },
      unassigned: 0,
      checksOverdue: 0,
      ventilatorsReady: 0,
      withoutMachine: index === 0 ? without : 0,
      oldestCheckAt: null,
    })),
  };
}

describe('answerFrom', () => {
  it('says yes with machines and beds, and names only units that have one', () => {
    expect(answerFrom(house({ ready: 4, free: [1, 0, 2] }))).toEqual({
      can: 'yes',
      sentence: 'Yes. 4 adult ventilators are ready; 3 staffed beds are free: 1 in Harbour, 2 in Orchard.',
      cautions: [],
    });
  });

  it('says it in the singular', () => {
    expect(answerFrom(house({ ready: 1, free: [1] })).sentence).toBe(
      'Yes. 1 adult ventilator is ready; 1 staffed bed is free: 1 in Harbour.',
    );
  });

  it('says no without a ready adult machine, however many of another class there are', () => {
    expect(answerFrom(house({ ready: 0, free: [2] })).sentence).toBe(
      'No. No adult ventilator is ready; 2 staffed beds are free: 2 in Harbour.',
    );
    expect(answerFrom(house({ ready: 0, free: [0] })).sentence).toBe(
      'No. No adult ventilator is ready, and no staffed bed is free.',
    );
  });

  it('says no without a free staffed bed', () => {
    expect(answerFrom(house({ ready: 2, free: [0, 0] }))).toMatchObject({
      can: 'no',
      sentence: 'No. No staffed bed is free; 2 adult ventilators are ready.',
    });
  });

  it('keeps its yes while fewer machines are unaccounted for than are ready, and is unsure from equality on', () => {
    const answer = (without: number) => answerFrom(house({ ready: 2, free: [1], without }));
    expect(answer(1).can).toBe('yes');
    expect(answer(1).cautions).toHaveLength(1);
    expect(answer(2).can).toBe('unsure');
    expect(answer(2).sentence).toBe(
      'Unsure. By the record 2 adult ventilators are ready; 1 staffed bed is free: 1 in Harbour.',
    );
  });

  it('says no of a house without units or machines', () => {
    expect(answerFrom({ classes: [], units: [] }).can).toBe('no');
  });
});
