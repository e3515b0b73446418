import { describe, expect, it } from 'vitest';
import type { BedStay } from '../contract/board.ts';
import { AT, airway, check, EMPTY, gas, PSV, VC } from '../flags/example-stays.ts';
import { DEFAULT_POLICY } from '../policy/policy.ts';
import { acidBaseAid } from './acid-base-aid.ts';
import { ardsAid } from './ards-aid.ts';
import { ladderAid } from './ladder-aid.ts';
import { rateAid } from './rate-aid.ts';
import { hacorAid, murrayAid, sofaAid } from './score-aids.ts';
import { tubeAid } from './tube-aid.ts';

type Bare = Omit<BedStay, 'flags'>;
const stayOf = (...parts: Partial<Bare>[]): BedStay => ({ ...Object.assign({}, EMPTY, ...parts), flags: [] });
const drawn = (values: Parameters<typeof gas>[0], more?: Parameters<typeof gas>[1]) => ({
  gas: gas(values, more).gas,
});
const GAS = { ph: 7.3, pco2MmHg: 60, po2MmHg: 80, fio2Percent: 50 };
const controlled = (more: Partial<Parameters<typeof check>[0]> = {}) =>
  check({ settings: VC, readings: { rateTotalPerMin: 18, spo2Percent: 94 }, ...more });
const GONE = { check: null, gas: null, withdrawn: { check: AT, airway: AT, gas: AT } };
const thresholds = DEFAULT_POLICY.thresholds;

describe('every aid', () => {
  it('reckons nothing from what is withdrawn, and says what is missing', () => {
    const stay = stayOf(controlled(), GONE);
    const aids = [
      ladderAid(stay),
      rateAid({ stay, targetPaco2MmHg: 40 }),
      acidBaseAid(stay),
      ardsAid(stay),
      murrayAid({ stay, quadrants: 2 }),
      sofaAid(stay),
      hacorAid({ stay, heartRatePerMin: 90, glasgowComaScale: 15 }),
    ];
    for (const { result, inputs, missing } of aids) {
      expect(result).toBeNull();
      expect(inputs).toEqual([]);
      expect(missing.join()).toMatch(/no current (check|gas)/);
    }
  });

  it('reckons nothing but the blood itself from before a change', () => {
    const stay = stayOf(controlled(), drawn(GAS, { changedSinceAt: AT }));
    const before = 'the gas is from before a change';
    expect(rateAid({ stay, targetPaco2MmHg: 40 }).missing).toEqual([before]);
    expect(sofaAid(stay).missing).toEqual([`no P/F: ${before}`]);
    expect(ardsAid(stay).result?.berlin).toEqual({ is: null, why: 'it asks for a P/F' });
    const blood = acidBaseAid(stay);
    expect(blood.result?.primary).toEqual(['respiratory acidosis']);
    expect(blood.inputs[0]).toMatchObject({ label: 'pH', changedSinceAt: AT });
  });
});

describe('ladderAid', () => {
  it('stands on both ladders, from the settings of the check', () => {
    const { result, inputs } = ladderAid(stayOf(controlled()));
    expect(result?.map(({ ladder, position }) => [ladder, position.onLadder])).toEqual([
      ['lower', true],
      ['higher', false],
    ]);
    expect(inputs.map(({ words }) => words)).toEqual(['5\u00a0cmH2O', '40\u00a0%']);
  });

  it('has no place on them without a PEEP through a tube', () => {
    const mask = check({ mode: 'niv-cpap', settings: { cpapCmH2O: 8, fio2Percent: 40 } });
    expect(ladderAid(stayOf(mask)).missing).toEqual(['Mask CPAP has no PEEP through a tube']);
    expect(ladderAid(stayOf(check({ mode: 'aprv', settings: { fio2Percent: 40 } }))).missing).toEqual([
      'APRV has no PEEP of the ladder',
    ]);
  });
});

describe('rateAid', () => {
  it('gives a rate, and leaves the time to breathe out open where nothing tells it', () => {
    const { result } = rateAid({ stay: stayOf(controlled(), drawn(GAS)), targetPaco2MmHg: 45 });
    expect(result).toMatchObject({ setPerMin: 24, expiration: null });
  });

  it('judges the time to breathe out from a passive plateau with its flow', () => {
    const stay = stayOf(
      check({
        settings: { ...VC, vtSetMl: 500, inspiratoryFlowLMin: 60, inspiratoryTimeS: 0.5 },
        readings: { vtExhaledMl: 500, plateauCmH2O: 15, peakCmH2O: 25, rateTotalPerMin: 20 },
        passive: true,
      }),
      drawn(GAS),
    );
    const { result, inputs } = rateAid({ stay, targetPaco2MmHg: 40 });
    expect(result).toMatchObject({
      setPerMin: 30,
      expiration: { givenS: 1.5, isShort: false },
      highestPerMin: 30,
    });
    expect(inputs.map(({ label }) => label)).toContain('Three time constants');
  });

  it('gives none where the patient sets the rate', () => {
    const stay = stayOf(check({ mode: 'psv', settings: PSV, readings: { rateTotalPerMin: 20 } }), drawn(GAS));
    expect(rateAid({ stay, targetPaco2MmHg: 40 })).toMatchObject({
      result: null,
      missing: ['PSV sets no rate'],
    });
  });
});

describe('ardsAid', () => {
  it('grades a tube by both definitions from P/F and PEEP', () => {
    expect(ardsAid(stayOf(controlled(), drawn(GAS))).result).toEqual({
      berlin: { is: 'moderate', why: null },
      global: { is: 'moderate', why: null },
    });
  });

  it('grades by saturation only by the newer definition, and not above 97 %', () => {
    const { result, missing } = ardsAid(stayOf(controlled()));
    expect(result).toMatchObject({ berlin: { is: null }, global: { is: 'moderate' } });
    expect(missing).toEqual(['no P/F: no gas yet']);
    const high = stayOf(controlled({ readings: { spo2Percent: 98 } }));
    expect(ardsAid(high).result?.global.why).toContain('above 97 %');
  });

  it('gives no grade below a PEEP of 5, and none for weak support', () => {
    const low = stayOf(controlled({ settings: { ...VC, peepCmH2O: 4 } }), drawn(GAS));
    expect(ardsAid(low).result?.berlin).toEqual({ is: null, why: 'PEEP is below 5 cmH2O' });
    const flow = stayOf(
      check({ mode: 'hfnc', settings: { flowLMin: 50, fio2Percent: 50 }, readings: { spo2Percent: 92 } }),
    );
    expect(ardsAid(flow).result?.global.is).toBe('non-intubated');
    const weak = stayOf(
      check({ mode: 'hfnc', settings: { flowLMin: 20, fio2Percent: 50 }, readings: { spo2Percent: 92 } }),
    );
    expect(ardsAid(weak).result?.global.why).toContain('weaker');
  });
});

describe('tubeAid', () => {
  const patient = {
    hospitalNumber: '1',
    familyName: 'A',
    givenName: 'B',
    bornOn: '1960-01-01',
    sex: 'female',
    heightCm: 168,
  } as const;

  it('tells depth by height, the catheter by the rule of the unit, and the cuff by its band', () => {
    const stay = stayOf(airway({ depthCm: 22, cuffCmH2O: 32 }, { sizeMm: 8 }), { patient });
    expect(tubeAid({ stay, thresholds }).result).toEqual({
      expectedDepthCm: 21.5,
      depthCm: 22,
      suction: { atMostFr: 12, catheterFr: 12, atMostPercent: 50 },
      cuff: { low: 20, high: 30, nowCmH2O: 32, state: 'above' },
    });
    const strict = { ...thresholds, suctionMaxPercent: 49 };
    expect(tubeAid({ stay, thresholds: strict }).result?.suction.catheterFr).toBe(10);
  });

  it('expects no depth without a height, or of another device', () => {
    const stay = stayOf(airway({}, {}));
    expect(tubeAid({ stay, thresholds })).toMatchObject({
      result: { expectedDepthCm: null },
      missing: ['no height, so no expected depth'],
    });
    const trach = stayOf(airway({}, { kind: 'tracheostomy' }), { patient });
    expect(tubeAid({ stay: trach, thresholds })).toMatchObject({
      result: { expectedDepthCm: null },
      missing: [],
    });
    expect(tubeAid({ stay: stayOf(), thresholds })).toMatchObject({
      result: null,
      missing: ['no tube is in the airway'],
    });
  });
});

describe('the scores', () => {
  const stay = stayOf(controlled(), drawn(GAS));

  it('are reckoned from the present check and gas, and ask for what no record holds', () => {
    expect(murrayAid({ stay, quadrants: 4 }).result?.points).toBeCloseTo((4 + 3 + 0) / 3, 9);
    expect(murrayAid({ stay, quadrants: null }).missing).toEqual([
      'the quadrants of the film: choose them here',
    ]);
    expect(sofaAid(stay).result?.points).toBe(3);
  });

  it('give HACOR on a mask only', () => {
    const mask = stayOf(
      check({ mode: 'niv-st', settings: { ipapCmH2O: 14, epapCmH2O: 6 }, readings: { rateTotalPerMin: 32 } }),
      drawn(GAS),
    );
    // pH 7.30: 2, P/F 160: 3, rate 32: 1.
    expect(hacorAid({ stay: mask, heartRatePerMin: 100, glasgowComaScale: 15 }).result?.points).toBe(6);
    expect(hacorAid({ stay: mask, heartRatePerMin: null, glasgowComaScale: null }).missing).toEqual([
      'heart rate: enter it here',
      'coma scale: enter it here',
    ]);
    expect(hacorAid({ stay, heartRatePerMin: 100, glasgowComaScale: 15 }).missing[0]).toContain(
      'mask ventilation',
    );
  });
});
