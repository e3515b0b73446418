import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { airwayResistance } from './airway-resistance.ts';
import { breathTiming } from './breath-timing.ts';
import { drivingPressure } from './driving-pressure.ts';
import { dynamicCompliance } from './dynamic-compliance.ts';
import { mechanicalPowerPressureControl } from './mechanical-power-pressure-control.ts';
import { mechanicalPowerVolumeControl } from './mechanical-power-volume-control.ts';
import { mechanicalPowerWithoutPlateau } from './mechanical-power-without-plateau.ts';
import { staticCompliance } from './static-compliance.ts';
import { timeConstant } from './time-constant.ts';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });

/** A breath as a machine gives it: PEEP, then above it the plateau, then above that the peak. */
const breaths = fc
  .record({
    ratePerMin: between(1, 60),
    tidalVolumeMl: between(50, 1500),
    peepCmH2O: between(0, 25),
    stretch: between(1, 40),
    resistive: between(0, 30),
  })
  .map(({ stretch, resistive, ...breath }) => ({
    ...breath,
    plateauCmH2O: breath.peepCmH2O + stretch,
    peakCmH2O: breath.peepCmH2O + stretch + resistive,
  }));

describe('compliance', () => {
  it('times driving pressure is the volume', () => {
    fc.assert(
      fc.property(breaths, ({ tidalVolumeMl, plateauCmH2O, peepCmH2O }) => {
        const passive = { plateauCmH2O, totalPeepCmH2O: peepCmH2O };
        const product =
          Number(staticCompliance({ tidalVolumeMl, ...passive })) * Number(drivingPressure(passive));
        expect(product).toBeCloseTo(tidalVolumeMl, 6);
      }),
    );
  });

  it('is never higher with flow than without', () => {
    fc.assert(
      fc.property(breaths, ({ tidalVolumeMl, peakCmH2O, plateauCmH2O, peepCmH2O }) => {
        const still = Number(staticCompliance({ tidalVolumeMl, plateauCmH2O, totalPeepCmH2O: peepCmH2O }));
        expect(Number(dynamicCompliance({ tidalVolumeMl, peakCmH2O, peepCmH2O }))).toBeLessThanOrEqual(still);
      }),
    );
  });

  it('does not exist unless the pressure rises above PEEP', () => {
    for (const totalPeepCmH2O of [20, 21]) {
      expect(drivingPressure({ plateauCmH2O: 20, totalPeepCmH2O })).toBeNull();
      expect(staticCompliance({ tidalVolumeMl: 400, plateauCmH2O: 20, totalPeepCmH2O })).toBeNull();
      expect(dynamicCompliance({ tidalVolumeMl: 400, peakCmH2O: 20, peepCmH2O: totalPeepCmH2O })).toBeNull();
    }
  });
});

describe('resistance and time', () => {
  it('reads the textbook example: 30 over 20 at 60 L/min is 10', () => {
    expect(airwayResistance({ peakCmH2O: 30, plateauCmH2O: 20, inspiratoryFlowLMin: 60 })).toBe(10);
  });

  it('halves when the same pressure drives twice the flow', () => {
    fc.assert(
      fc.property(breaths, between(5, 150), ({ peakCmH2O, plateauCmH2O }, inspiratoryFlowLMin) => {
        const at = (flow: number) => airwayResistance({ peakCmH2O, plateauCmH2O, inspiratoryFlowLMin: flow });
        expect(at(2 * inspiratoryFlowLMin)).toBeCloseTo(at(inspiratoryFlowLMin) / 2, 9);
      }),
    );
  });

  it('constant is in proportion to both compliance and resistance', () => {
    fc.assert(
      fc.property(between(1, 200), between(1, 100), (complianceMlCmH2O, resistanceCmH2OPerLS) => {
        const base = timeConstant({ complianceMlCmH2O, resistanceCmH2OPerLS });
        expect(timeConstant({ complianceMlCmH2O: 2 * complianceMlCmH2O, resistanceCmH2OPerLS })).toBeCloseTo(
          2 * base,
          9,
        );
        expect(
          timeConstant({ complianceMlCmH2O, resistanceCmH2OPerLS: 2 * resistanceCmH2OPerLS }),
        ).toBeCloseTo(2 * base, 9);
      }),
    );
  });

  it('in and out fill the cycle', () => {
    fc.assert(
      fc.property(between(1, 60), between(0.06, 0.94), (ratePerMin, share) => {
        const inspiratoryTimeS = Math.max(0.05, (60 / ratePerMin) * share);
        const { cycleS, expiratoryTimeS, expiratoryPerInspiratory } = breathTiming({
          ratePerMin,
          inspiratoryTimeS,
        });
        expect(inspiratoryTimeS + expiratoryTimeS).toBeCloseTo(cycleS, 9);
        expect(expiratoryPerInspiratory * inspiratoryTimeS).toBeCloseTo(expiratoryTimeS, 9);
      }),
    );
  });
});

describe('mechanical power', () => {
  it('in volume control is in proportion to rate, and grows with peak, PEEP and volume', () => {
    fc.assert(
      fc.property(breaths, (breath) => {
        const base = mechanicalPowerVolumeControl(breath);
        const more = (change: Partial<typeof breath>) =>
          mechanicalPowerVolumeControl({ ...breath, ...change });
        expect(more({ ratePerMin: breath.ratePerMin * 2 })).toBeCloseTo(base * 2, 6);
        expect(more({ tidalVolumeMl: breath.tidalVolumeMl * 2 })).toBeCloseTo(base * 2, 6);
        expect(more({ peakCmH2O: breath.peakCmH2O + 1 })).toBeGreaterThan(base);
        expect(more({ peepCmH2O: breath.peepCmH2O + 0.5 })).toBeGreaterThan(base);
      }),
    );
  });

  it('in pressure control is never below volume control with the same plateau and no resistance', () => {
    fc.assert(
      fc.property(breaths, ({ ratePerMin, tidalVolumeMl, plateauCmH2O, peepCmH2O }) => {
        const volume = mechanicalPowerVolumeControl({
          ratePerMin,
          tidalVolumeMl,
          peakCmH2O: plateauCmH2O,
          plateauCmH2O,
          peepCmH2O,
        });
        const pressure = mechanicalPowerPressureControl({
          ratePerMin,
          tidalVolumeMl,
          inspiratoryPressureCmH2O: plateauCmH2O - peepCmH2O,
          peepCmH2O,
        });
        expect(pressure).toBeGreaterThanOrEqual(volume);
      }),
    );
  });

  it('without a plateau stays within a tenth of the form with one, for a resistance of 10', () => {
    // The form without a plateau takes a resistance of 10 for granted: flow ÷ 6 is then peak less plateau.
    fc.assert(
      fc.property(breaths, between(15, 90), (breath, inspiratoryFlowLMin) => {
        const peakCmH2O = breath.plateauCmH2O + inspiratoryFlowLMin / 6;
        const minuteVentilationLMin = (breath.ratePerMin * breath.tidalVolumeMl) / 1000;
        const withPlateau = mechanicalPowerVolumeControl({ ...breath, peakCmH2O });
        const without = mechanicalPowerWithoutPlateau({
          minuteVentilationLMin,
          peakCmH2O,
          peepCmH2O: breath.peepCmH2O,
          inspiratoryFlowLMin,
        });
        expect(Math.abs(without / withPlateau - 1)).toBeLessThan(0.1);
      }),
    );
  });
});
