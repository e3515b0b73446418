import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { cmH2OFromMmHg } from './cmh2o-from-mmhg.ts';
import { hPaFromCmH2O } from './hpa-from-cmh2o.ts';
import { kpaFromMmHg } from './kpa-from-mmhg.ts';
import { mmHgFromKpa } from './mmhg-from-kpa.ts';

const pressure = fc.double({ min: 0, max: 2000, noNaN: true });

describe('pressure conversions', () => {
  it('come back to where they started', () => {
    fc.assert(
      fc.property(pressure, (value) => {
        expect(mmHgFromKpa(kpaFromMmHg(value))).toBeCloseTo(value, 9);
        expect(kpaFromMmHg(mmHgFromKpa(value))).toBeCloseTo(value, 9);
      }),
    );
  });

  it('agree round the triangle: mmHg to cmH2O to hPa is mmHg to kPa, ten times', () => {
    fc.assert(
      fc.property(pressure, (value) => {
        expect(hPaFromCmH2O(cmH2OFromMmHg(value))).toBeCloseTo(kpaFromMmHg(value) * 10, 9);
      }),
    );
  });

  it('keep zero, and one atmosphere', () => {
    expect([mmHgFromKpa, kpaFromMmHg, cmH2OFromMmHg, hPaFromCmH2O].map((convert) => convert(0))).toEqual([
      0, 0, 0, 0,
    ]);
    expect(kpaFromMmHg(760)).toBeCloseTo(101.325, 4);
  });
});
