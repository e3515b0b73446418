import { describe, expect, it } from 'vitest';
import { navLinks } from './nav-links.ts';

const labels = (
  role: Parameters<typeof navLinks>[0]['grants'][number]['role'],
  unitId: string | null = 'a',
) => navLinks({ grants: [{ role, unitId: null }], unitId }).map(({ label }) => label);

describe('navLinks', () => {
  it('opens to each role what it may use', () => {
    expect(labels('therapist')).toEqual(['Round', 'Assignment', 'Capacity']);
    expect(labels('charge')).toEqual(['Round', 'Assignment', 'Capacity', 'Setup']);
    expect(labels('clinician')).toEqual(['Round', 'Assignment']);
    expect(labels('biomedical')).toEqual(['Capacity']);
    expect(labels('administrator')).toEqual(['Setup']);
    expect(labels('display')).toEqual([]);
  });

  it('leaves out what needs a unit when there is none', () => {
    expect(labels('charge', null)).toEqual(['Capacity', 'Setup']);
  });
});
