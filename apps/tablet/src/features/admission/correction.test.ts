import type { StayDetails } from '@windrow/ventilation/contract/stays';
import { describe, expect, it } from 'vitest';
import { correctionOf, differences } from './correction.ts';

const BEFORE: StayDetails = {
  patient: {
    hospitalNumber: 'H-1',
    familyName: 'Halloran',
    givenName: 'Peter',
    bornOn: '1961-03-04',
    sex: 'male',
    heightCm: 178,
  },
  difficultAirway: false,
  precautions: null,
  careLimits: 'no chest compressions',
  orders: { checkEveryMinutes: null, gasEveryMinutes: null },
};

describe('correctionOf', () => {
  it('sends only the parts that differ', () => {
    const after = { ...BEFORE, patient: { ...BEFORE.patient, heightCm: 175 }, careLimits: null };
    expect(correctionOf({ before: BEFORE, after })).toEqual({ patient: after.patient, careLimits: null });
  });

  it('is nothing when nothing differs', () => {
    expect(correctionOf({ before: BEFORE, after: structuredClone(BEFORE) })).toBeNull();
  });
});

describe('differences', () => {
  it('says what somebody else has changed', () => {
    const after = {
      ...BEFORE,
      precautions: 'contact',
      orders: { ...BEFORE.orders, checkEveryMinutes: 120 },
      difficultAirway: true,
    };
    expect(differences({ before: BEFORE, after })).toEqual([
      { label: 'Difficult airway', before: 'no', after: 'yes' },
      { label: 'Precautions', before: 'not recorded', after: 'contact' },
      { label: 'Check ordered, min', before: 'not recorded', after: '120' },
    ]);
  });
});
