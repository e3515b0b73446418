import type { Role } from '@windrow/ventilation/permissions/permissions';
import { describe, expect, it } from 'vitest';
import { stepsLeft } from './steps-left.ts';

const person = (role: Role, disabled = false) => ({ disabled, grants: [{ role, unitId: null }] });
const done = (units: { bedCount: number }[], people: ReturnType<typeof person>[]) =>
  stepsLeft({ units, people })
    .filter(({ isDone }) => isDone)
    .map(({ id }) => id);

describe('stepsLeft', () => {
  it('has everything to do in an empty house', () => {
    expect(done([], [person('administrator')])).toEqual([]);
  });

  it('counts beds done only when no unit is without', () => {
    expect(done([{ bedCount: 0 }], [])).toEqual(['unit']);
    expect(done([{ bedCount: 4 }, { bedCount: 0 }], [])).toEqual(['unit']);
    expect(done([{ bedCount: 4 }], [])).toEqual(['unit', 'beds']);
  });

  it('needs somebody who may assign, and somebody who may keep the fleet, who can sign in', () => {
    expect(done([], [person('therapist'), person('charge', true)])).toEqual([]);
    expect(done([], [person('charge'), person('biomedical')])).toEqual(['people', 'ventilators']);
  });
});
