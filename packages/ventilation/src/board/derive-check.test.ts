import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { Check, pressureOrder } from '../contract/observations.ts';
import { READING_FIELDS, SETTING_FIELDS } from '../entry/fields.ts';
import { SUPPORT_CATALOGUE } from '../support/catalogue.ts';
import { type CheckToDerive, deriveCheck } from './derive-check.ts';

const VOLUME: CheckToDerive = {
  mode: 'ac-vc',
  settings: { vtSetMl: 450, rateSetPerMin: 18, peepCmH2O: 8, fio2Percent: 45 },
  readings: { vtExhaledMl: 440, rateTotalPerMin: 20, peakCmH2O: 28, plateauCmH2O: 22 },
  passive: true,
};

function derive(check: Partial<CheckToDerive>, predictedBodyWeightKg: number | null = 73) {
  return deriveCheck({ check: { ...VOLUME, ...check }, predictedBodyWeightKg });
}

function reading(readings: CheckToDerive['readings']) {
  return derive({ readings: { ...VOLUME.readings, ...readings } });
}

describe('deriveCheck', () => {
  it('judges the exhaled volume per kg of predicted body weight', () => {
    expect(derive({}).vtPerKgMl).toBeCloseTo(440 / 73, 10);
    expect(derive({}, null).vtPerKgMl).toBeNull();
  });

  it('lets the set volume stand in only where the ventilator fixes it', () => {
    expect(derive({ readings: {} }).vtPerKgMl).toBeCloseTo(450 / 73, 10);
    expect(derive({ mode: 'ac-vtpc', readings: {} }).vtPerKgMl).toBeNull();
  });

  it('judges the release volume in airway pressure release', () => {
    const settings = { pHighCmH2O: 26, pLowCmH2O: 0, tHighS: 5, tLowS: 0.5, fio2Percent: 55 };
    const aprv = derive({ mode: 'aprv', settings, readings: { vtReleaseMl: 480, vtExhaledMl: 300 } });
    expect(aprv.vtPerKgMl).toBeCloseTo(480 / 73, 10);
    expect(aprv.mechanicalPowerJMin).toBeNull();
  });

  it('takes total PEEP, set and intrinsic, from the plateau', () => {
    expect(derive({}).drivingPressureCmH2O).toBe(14);
    const trapped = reading({ vtExhaledMl: 480, plateauCmH2O: 29, peakCmH2O: 33, intrinsicPeepCmH2O: 6 });
    expect(trapped.drivingPressureCmH2O).toBe(15);
    expect(trapped.staticComplianceMlCmH2O).toBeCloseTo(32, 10);
  });

  it('has no mechanics of a breath with an effort in it, nor of a plateau that is not above total PEEP', () => {
    const effort = derive({ passive: false });
    expect(effort.drivingPressureCmH2O).toBeNull();
    expect(effort.staticComplianceMlCmH2O).toBeNull();
    expect(effort.mechanicalPowerJMin).toBeNull();
    // Where nobody recorded whether there was an effort, nothing is worked out either.
    expect(derive({ passive: null })).toEqual(effort);
    expect(reading({ intrinsicPeepCmH2O: 14 }).drivingPressureCmH2O).toBeNull();
  });

  it('has no compliance where plateau and PEEP are all but equal', () => {
    expect(reading({ vtExhaledMl: 440, plateauCmH2O: 8.8 }).staticComplianceMlCmH2O).toBeNull();
    expect(reading({ vtExhaledMl: 440, plateauCmH2O: 9 }).staticComplianceMlCmH2O).toBeCloseTo(440, 10);
  });

  it('reckons mechanical power by what the mode controls', () => {
    expect(derive({}).mechanicalPowerJMin).toBeCloseTo(0.098 * 20 * 0.44 * (28 - 7), 1);
    const settings = { pInspCmH2O: 16, rateSetPerMin: 18, peepCmH2O: 8, fio2Percent: 45 };
    expect(derive({ mode: 'ac-pc', settings }).mechanicalPowerJMin).toBeCloseTo(0.098 * 20 * 0.44 * 24, 1);
    expect(derive({ mode: 'ac-vtpc' }).mechanicalPowerJMin).toBeCloseTo(0.098 * 20 * 0.44 * 28, 1);
    expect(derive({ mode: 'simv-vc' }).mechanicalPowerJMin).toBeNull();
    expect(derive({ readings: { vtExhaledMl: 440, peakCmH2O: 28 } }).mechanicalPowerJMin).toBeNull();
  });

  it('prefers the minute volume that was read, and multiplies only breaths that are alike', () => {
    expect(derive({}).minuteVolumeLMin).toBeCloseTo(8.8, 10);
    expect(reading({ minuteVolumeLMin: 9.1 }).minuteVolumeLMin).toBe(9.1);
    expect(derive({ mode: 'simv-vc' }).minuteVolumeLMin).toBeNull();
    expect(derive({ readings: { rateTotalPerMin: 20 } }).minuteVolumeLMin).toBeNull();
  });

  it('reckons ROX only on high flow, and only from all its parts', () => {
    const settings = { flowLMin: 50, fio2Percent: 60 };
    const readings = { rateTotalPerMin: 24, spo2Percent: 93 };
    expect(derive({ mode: 'hfnc', settings, readings }).roxIndex).toBeCloseTo(93 / 0.6 / 24, 10);
    expect(derive({ mode: 'hfnc', settings, readings: { spo2Percent: 93 } }).roxIndex).toBeNull();
    expect(
      derive({ mode: 'hfnc', settings, readings: { ...readings, rateTotalPerMin: 0 } }).roxIndex,
    ).toBeNull();
    expect(derive({ mode: 'tpiece', settings: { fio2Percent: 60 }, readings }).roxIndex).toBeNull();
  });

  it('reckons rate over volume only where every breath is the patient’s own', () => {
    const readings = { rateTotalPerMin: 18, vtExhaledMl: 450 };
    const settings = { psCmH2O: 5, peepCmH2O: 5, fio2Percent: 30 };
    expect(derive({ mode: 'psv', settings, readings }).rsbiPerMinL).toBeCloseTo(40, 10);
    expect(derive({ mode: 'ac-vc', readings }).rsbiPerMinL).toBeNull();
    expect(
      derive({ mode: 'psv', settings, readings: { ...readings, rateTotalPerMin: 0 } }).rsbiPerMinL,
    ).toBeNull();
  });

  it('gives a finite number or null for every check that its schema lets through', () => {
    fc.assert(
      fc.property(anyCheck(), fc.option(fc.double({ min: 16, max: 122, noNaN: true })), (check, weight) => {
        fc.pre(pressureOrder(check).length === 0);
        const accepted = Check.safeParse({
          observedAt: '2026-03-05T10:00:00Z',
          ...check,
          passive: check.passive ?? undefined,
        });
        fc.pre(accepted.success);
        for (const value of Object.values(deriveCheck({ check, predictedBodyWeightKg: weight }))) {
          expect(value === null || (Number.isFinite(value) && value >= 0)).toBe(true);
        }
      }),
      { numRuns: 400 },
    );
  });
});

/** Any mode with its own settings and any readings, within the limits of entry and weighted to their ends. */
function anyCheck(): fc.Arbitrary<CheckToDerive> {
  return fc.constantFrom(...SUPPORT_CATALOGUE).chain((entry) =>
    fc.record({
      mode: fc.constant(entry.id),
      settings: numbersOf(SETTING_FIELDS, [...entry.required, ...entry.optional], [...entry.required]),
      readings: numbersOf(READING_FIELDS, Object.keys(READING_FIELDS), []),
      passive: fc.constantFrom(null, true, false),
    }),
  );
}

function numbersOf(
  fields: Record<string, { hard: readonly [number, number] }>,
  keys: readonly string[],
  required: readonly string[],
): fc.Arbitrary<Record<string, number>> {
  const arbitraries = Object.fromEntries(
    keys.map((key) => {
      const [low, high] = fields[key]?.hard ?? [0, 0];
      return [key, fc.oneof(fc.constantFrom(low, high), fc.double({ min: low, max: high, noNaN: true }))];
    }),
  );
  return fc.record(arbitraries, { requiredKeys: [...required] });
}
