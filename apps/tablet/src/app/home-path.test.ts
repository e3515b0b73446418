import type { Role } from '@windrow/ventilation/permissions/permissions';
import { describe, expect, it } from 'vitest';
import { homePath } from './home-path.ts';

const unitIds = ['a', 'b'];
const grant = (role: Role, unitId: string | null = null) => ({ role, unitId });

describe('homePath', () => {
  it.each([
    [[grant('therapist', 'b')], '/round/b'],
    [[grant('charge')], '/round/a'],
    [[grant('clinician', 'a')], '/round/a'],
    [[grant('supervisor')], '/capacity'],
    [[grant('biomedical')], '/capacity'],
    [[grant('administrator')], '/setup'],
    [[grant('supervisor'), grant('therapist', 'b')], '/round/a'],
    [[grant('display', 'a')], null],
    [[], null],
  ])('takes %j to %s', (grants, path) => {
    expect(homePath({ grants, unitIds, lastUnitId: null })).toBe(path);
  });

  it('goes back to the unit used last, where it is still one of theirs', () => {
    expect(homePath({ grants: [grant('charge')], unitIds, lastUnitId: 'b' })).toBe('/round/b');
    expect(homePath({ grants: [grant('therapist', 'a')], unitIds, lastUnitId: 'b' })).toBe('/round/a');
  });
});
