import { describe, expect, it } from 'vitest';
import { deriveGas } from './derive-gas.ts';

const GAS = { site: 'arterial', pco2MmHg: 44, po2MmHg: 78, fio2Percent: 45 };

describe('deriveGas', () => {
  it('gives P/F and the ventilatory ratio of an arterial gas', () => {
    const derived = deriveGas({ gas: GAS, predictedBodyWeightKg: 73, minuteVolumeLMin: 8.8 });
    expect(derived.pfMmHg).toBeCloseTo(78 / 0.45, 10);
    expect(derived.ventilatoryRatio).toBeCloseTo((8800 * 44) / (73 * 100 * 37.5), 10);
  });

  it.each(['venous', 'capillary'])('gives neither of a %s gas', (site) => {
    expect(deriveGas({ gas: { ...GAS, site }, predictedBodyWeightKg: 73, minuteVolumeLMin: 8.8 })).toEqual({
      pfMmHg: null,
      ventilatoryRatio: null,
      minuteVolumeAtDrawLMin: null,
    });
  });

  it('gives no P/F without the oxygen at the draw, and no ratio without weight or minute volume', () => {
    const gas = { site: 'arterial', pco2MmHg: 44, po2MmHg: 78 };
    expect(deriveGas({ gas, predictedBodyWeightKg: 73, minuteVolumeLMin: 8.8 }).pfMmHg).toBeNull();
    expect(
      deriveGas({ gas, predictedBodyWeightKg: null, minuteVolumeLMin: 8.8 }).ventilatoryRatio,
    ).toBeNull();
    expect(deriveGas({ gas, predictedBodyWeightKg: 73, minuteVolumeLMin: null }).ventilatoryRatio).toBeNull();
  });
});
