import { describe, expect, it } from 'vitest';
import { DEFAULT_POLICY } from '../policy/policy.ts';
import { cuffBand } from './cuff-band.ts';
import { suctionCatheter } from './suction-catheter.ts';

describe('suctionCatheter', () => {
  it.each([
    [8, 50, 12],
    [8, 49, 10],
    [7.5, 50, 10],
    [8, 66.7, 16],
    [3, 50, null],
  ])('for a tube of %d mm filled to %d %% is %s Fr', (tubeInternalDiameterMm, atMostPercent, catheterFr) => {
    expect(suctionCatheter({ tubeInternalDiameterMm, atMostPercent }).catheterFr).toBe(catheterFr);
  });

  it('refuses a share that no rule has', () => {
    expect(() => suctionCatheter({ tubeInternalDiameterMm: 8, atMostPercent: 0.5 })).toThrow(
      /^atMostPercent must/,
    );
  });
});

describe('cuffBand', () => {
  it('has both ends of the band within it', () => {
    const { thresholds } = DEFAULT_POLICY;
    expect([19.9, 20, 30, 30.1].map((cuffCmH2O) => cuffBand({ cuffCmH2O, thresholds }))).toEqual([
      'below',
      'within',
      'within',
      'above',
    ]);
  });
});
