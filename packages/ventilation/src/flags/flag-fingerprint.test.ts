import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { flagFingerprint } from './flag-fingerprint.ts';

const input = (label: string, value: number) => ({ label, value, unit: 'cmH2O', decimals: 0 });
const plateau = (value: number, limit = 30) => ({
  id: 'plateau-high',
  inputs: [input('Plateau', value), input('Limit', limit)],
});

describe('flagFingerprint', () => {
  it('is the same for the same rule and values', () => {
    expect(flagFingerprint(plateau(33))).toBe(flagFingerprint(plateau(33)));
  });

  it('differs where a value, the limit, the rule or a fact that is no number differs', () => {
    const all = [
      flagFingerprint(plateau(33)),
      flagFingerprint(plateau(34)),
      flagFingerprint(plateau(33, 28)),
      flagFingerprint({ ...plateau(33), id: 'driving-pressure-high' }),
      flagFingerprint({ ...plateau(33), facts: ['ac-pc'] }),
      flagFingerprint({ ...plateau(33), facts: ['psv'] }),
    ];
    expect(new Set(all).size).toBe(all.length);
  });

  it('leaves out what only the rounding of a computer adds', () => {
    expect(flagFingerprint(plateau(0.1 + 0.2))).toBe(flagFingerprint(plateau(0.3)));
  });

  it('tells any two values apart that can be entered', () => {
    const entered = fc.integer({ min: -7000, max: 7000 }).map((hundredths) => hundredths / 100);
    fc.assert(
      fc.property(entered, entered, (one, other) => {
        expect(flagFingerprint(plateau(one)) === flagFingerprint(plateau(other))).toBe(one === other);
      }),
    );
  });
});
