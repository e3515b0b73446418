import type { Grant, Role } from '@windrow/ventilation/permissions/permissions';
import { describe, expect, it } from 'vitest';
import { allowedMoves } from './allowed-moves.ts';

const as = (role: Role): Grant[] => [{ role, unitId: null }];

describe('allowedMoves', () => {
  it('lets the bedside take a ready machine and send it to be cleaned, and no more', () => {
    expect(allowedMoves({ grants: as('therapist'), from: 'ready' })).toEqual(['in-use']);
    expect(allowedMoves({ grants: as('charge'), from: 'in-use' })).toEqual(['cleaning']);
    expect(allowedMoves({ grants: as('therapist'), from: 'cleaning' })).toEqual([]);
  });

  it('lets the supervisor make every move that can follow', () => {
    expect(allowedMoves({ grants: as('supervisor'), from: 'ready' })).toEqual([
      'in-use',
      'held',
      'on-loan',
      'cleaning',
      'retired',
    ]);
    expect(allowedMoves({ grants: as('supervisor'), from: 'retired' })).toEqual([]);
  });

  it('offers biomedical staff, who see no beds, everything but in use', () => {
    expect(allowedMoves({ grants: as('biomedical'), from: 'ready' })).toEqual([
      'held',
      'on-loan',
      'cleaning',
      'retired',
    ]);
  });

  it('offers nothing to those who only look', () => {
    expect(allowedMoves({ grants: as('clinician'), from: 'ready' })).toEqual([]);
  });
});
