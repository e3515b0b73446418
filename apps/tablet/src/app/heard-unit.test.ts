import { describe, expect, it } from 'vitest';
import { heardUnit } from './heard-unit.ts';

describe('heardUnit', () => {
  it('is the shown unit for whoever may see its board', () => {
    expect(heardUnit({ grants: [{ role: 'therapist', unitId: 'u1' }], unitId: 'u1' })).toBe('u1');
  });

  it('is none for whoever hears nothing of it, and while no unit is shown', () => {
    expect(heardUnit({ grants: [{ role: 'administrator', unitId: null }], unitId: 'u1' })).toBeUndefined();
    expect(heardUnit({ grants: [{ role: 'therapist', unitId: 'u2' }], unitId: 'u1' })).toBeUndefined();
    expect(heardUnit({ grants: [{ role: 'therapist', unitId: 'u1' }], unitId: null })).toBeUndefined();
  });
});
