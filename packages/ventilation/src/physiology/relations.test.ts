import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { bicarbonate } from '../acid-base/bicarbonate.ts';
import { gasConsistency } from '../acid-base/gas-consistency.ts';
import { hydrogenIon } from '../acid-base/hydrogen-ion.ts';
import { blendedFio2 } from '../supply/blended-fio2.ts';
import { cylinderDuration } from '../supply/cylinder-duration.ts';
import { oxygenFlow } from '../supply/oxygen-flow.ts';
import { deadSpaceFraction } from './dead-space-fraction.ts';
import { minuteVentilation } from './minute-ventilation.ts';
import { predictedBodyWeight } from './predicted-body-weight.ts';
import { rapidShallowBreathingIndex } from './rapid-shallow-breathing-index.ts';
import { rateForTargetPaco2 } from './rate-for-target-paco2.ts';
import { tidalVolumePerKg } from './tidal-volume-per-kg.ts';
import { ventilatoryRatio } from './ventilatory-ratio.ts';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });

describe('predictedBodyWeight', () => {
  it('adds 2.3 kg an inch, and 4.5 kg for a man of the same height', () => {
    fc.assert(
      fc.property(between(106, 247), (heightCm) => {
        const woman = predictedBodyWeight({ sex: 'female', heightCm });
        expect(woman).toBeGreaterThan(0);
        expect(predictedBodyWeight({ sex: 'male', heightCm }) - woman).toBeCloseTo(4.5, 9);
        expect(predictedBodyWeight({ sex: 'female', heightCm: heightCm + 2.54 }) - woman).toBeCloseTo(2.3, 9);
      }),
    );
  });

  it('refuses a height in inches or in metres', () => {
    for (const heightCm of [70, 1.78]) {
      expect(() => predictedBodyWeight({ sex: 'male', heightCm })).toThrow(
        /^heightCm must be a number from 100 to 250/,
      );
    }
  });
});

describe('ventilation', () => {
  it('over rate is the volume, and per kg times weight is it too', () => {
    fc.assert(
      fc.property(between(1, 60), between(50, 1500), between(20, 120), (ratePerMin, tidalVolumeMl, kg) => {
        const litres = minuteVentilation({ ratePerMin, tidalVolumeMl });
        expect((litres / ratePerMin) * 1000).toBeCloseTo(tidalVolumeMl, 6);
        expect(tidalVolumePerKg({ tidalVolumeMl, predictedBodyWeightKg: kg }) * kg).toBeCloseTo(
          tidalVolumeMl,
          6,
        );
        const index = rapidShallowBreathingIndex({ ratePerMin, tidalVolumeMl });
        expect((index * tidalVolumeMl) / 1000).toBeCloseTo(ratePerMin, 6);
      }),
    );
  });

  it('ratio is one at 100 mL/kg and a CO2 of 37.5 mmHg', () => {
    const input = { minuteVentilationLMin: 7, paco2MmHg: 37.5, predictedBodyWeightKg: 70 };
    expect(ventilatoryRatio(input)).toBe(1);
  });

  it('ratio stays the same at the rate for the target', () => {
    fc.assert(
      fc.property(
        between(5, 40),
        between(20, 120),
        between(20, 120),
        (ratePerMin, paco2MmHg, targetPaco2MmHg) => {
          const rate = rateForTargetPaco2({ ratePerMin, paco2MmHg, targetPaco2MmHg });
          expect(rate * targetPaco2MmHg).toBeCloseTo(ratePerMin * paco2MmHg, 6);
        },
      ),
    );
  });

  it('is all dead space when nothing expired holds CO2, and none when all is like arterial', () => {
    expect(deadSpaceFraction({ paco2MmHg: 40, mixedExpiredPco2MmHg: 0 })).toBe(1);
    expect(deadSpaceFraction({ paco2MmHg: 40, mixedExpiredPco2MmHg: 40 })).toBe(0);
  });
});

describe('acid and base', () => {
  it('of one sample always agree, and a pH moved by more than 0.04 does not', () => {
    fc.assert(
      fc.property(between(6.9, 7.7), between(15, 110), fc.constantFrom(-1, 1), (ph, paco2MmHg, sign) => {
        const bicarbonateMmolL = bicarbonate({ ph, paco2MmHg });
        fc.pre(bicarbonateMmolL >= 1 && bicarbonateMmolL <= 100);
        const judged = (shift: number) => gasConsistency({ ph: ph + shift, paco2MmHg, bicarbonateMmolL });
        expect(judged(0).expectedPh).toBeCloseTo(ph, 9);
        expect(judged(0.0399 * sign).consistent).toBe(true);
        expect(judged(0.0401 * sign).consistent).toBe(false);
        expect(judged(0.1 * sign).difference).toBeCloseTo(0.1 * sign, 9);
      }),
    );
  });

  it('allows the other published constant and the rounding of printed values', () => {
    const printed = { ph: 7.39, paco2MmHg: 40, bicarbonateMmolL: 24 };
    expect(gasConsistency(printed).consistent).toBe(true);
  });

  it('is ten times the hydrogen ion for a pH one lower', () => {
    fc.assert(
      fc.property(between(6.5, 7), (ph) => {
        expect(hydrogenIon({ ph }) / hydrogenIon({ ph: ph + 1 })).toBeCloseTo(10, 9);
      }),
    );
  });
});

describe('oxygen supply', () => {
  it('blends back to the fraction that was asked for', () => {
    fc.assert(
      fc.property(between(1, 100), between(0.21, 1), (totalFlowLMin, fio2) => {
        const oxygenLMin = oxygenFlow({ totalFlowLMin, fio2 });
        const airLMin = Math.max(0, totalFlowLMin - oxygenLMin);
        expect(blendedFio2({ airLMin, oxygenLMin })).toBeCloseTo(fio2, 9);
      }),
    );
  });

  it('is empty, not negative, at and below the reserve, which is 200 psi unless told', () => {
    const minutes = (pressurePsi: number) => cylinderDuration({ cylinder: 'E', pressurePsi, flowLMin: 10 });
    expect([minutes(0), minutes(200)]).toEqual([0, 0]);
    expect(minutes(2000)).toBeCloseTo(50.4, 9);
  });
});
