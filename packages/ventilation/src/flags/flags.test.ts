import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { deriveCheck } from '../board/derive-check.ts';
import { deriveGas } from '../board/derive-gas.ts';
import type { BedAirway, BedCheck, BedGas, BedStay, Flag } from '../contract/board.ts';
import { AIRWAY_FIELDS, GAS_FIELDS, LIMIT_FIELDS, READING_FIELDS, SETTING_FIELDS } from '../entry/fields.ts';
import { DEFAULT_POLICY } from '../policy/policy.ts';
import { SUPPORT_CATALOGUE, type SupportId, supportEntry } from '../support/catalogue.ts';
import { bedFlags, FLAG_RULES } from './bed-flags.ts';
import { SHORT_LENGTH } from './rule.ts';

const AT = '2026-03-05T10:00:00Z';
const STAMP = {
  observationId: 'o1',
  observedAt: AT,
  recordedAt: AT,
  recordedByInitials: 'AO',
  changedSinceAt: null,
};
/** A hundred, so that a volume in mL is a hundred times its volume per kg. */
const WEIGHT_KG = 100;

const EMPTY: Omit<BedStay, 'flags'> = {
  stayId: 's1',
  version: 1,
  admittedAt: AT,
  patient: null,
  predictedBodyWeightKg: WEIGHT_KG,
  difficultAirway: false,
  precautions: null,
  careLimits: null,
  orders: { checkEveryMinutes: null, gasEveryMinutes: null },
  support: null,
  proneSinceAt: null,
  away: null,
  trial: null,
  check: null,
  device: null,
  airway: null,
  gas: null,
  ladder: DEFAULT_POLICY.freshness,
  plateauLimitCmH2O: 30,
  withdrawn: { check: null, airway: null, gas: null },
};

type CheckParts = Partial<
  Pick<BedCheck, 'mode' | 'settings' | 'readings' | 'limits' | 'passive' | 'changedSinceAt'>
>;

const QUIET_LIMITS: BedCheck['limits'] = {
  highPressureCmH2O: 120,
  lowVtMl: 5,
  lowMinuteVolumeLMin: 0.1,
  highRatePerMin: 150,
  apnoeaS: 20,
};

function check(parts: CheckParts): Omit<BedStay, 'flags'> {
  const mode = parts.mode ?? 'ac-vc';
  const core = {
    mode,
    settings: parts.settings ?? {},
    readings: parts.readings ?? {},
    passive: parts.passive ?? null,
  };
  return {
    ...EMPTY,
    support: { id: mode, shortName: supportEntry(mode).shortName, sinceAt: AT },
    check: {
      ...STAMP,
      changedSinceAt: parts.changedSinceAt ?? null,
      ...core,
      limits: parts.limits ?? QUIET_LIMITS,
      interface: null,
      derived: deriveCheck({ check: core, predictedBodyWeightKg: WEIGHT_KG }),
    },
  };
}

function gas(values: BedGas['values'], { site = 'arterial', changedSinceAt = null as string | null } = {}) {
  const { pco2MmHg = 40, po2MmHg = 200, fio2Percent } = values;
  const derived = deriveGas({
    gas: { site, pco2MmHg, po2MmHg, fio2Percent },
    predictedBodyWeightKg: null,
    minuteVolumeLMin: null,
  });
  return { ...EMPTY, gas: { ...STAMP, changedSinceAt, site, values, ...derived } };
}

function airway(found: Partial<BedAirway>, device: Partial<NonNullable<BedStay['device']>> = {}) {
  return {
    ...EMPTY,
    device: {
      observationId: 'd1',
      placedAt: AT,
      kind: 'oral-tube',
      sizeMm: 7.5,
      depthCm: 22,
      depthMark: 'lip',
      cuffed: true,
      subglotticPort: null,
      ...device,
    },
    airway: {
      ...STAMP,
      depthCm: null,
      cuffCmH2O: null,
      cuffMethod: null,
      position: null,
      secured: null,
      ...found,
    },
  };
}

function flagsOf(stay: Omit<BedStay, 'flags'>): Flag[] {
  return bedFlags({ stay, thresholds: DEFAULT_POLICY.thresholds });
}

function ids(stay: Omit<BedStay, 'flags'>): string[] {
  return flagsOf(stay).map(({ id }) => id);
}

const VC = { vtSetMl: 450, rateSetPerMin: 18, peepCmH2O: 5, fio2Percent: 40 };
const PSV = { psCmH2O: 8, peepCmH2O: 5, fio2Percent: 40 };

function vt(vtExhaledMl: number, mode: SupportId = 'ac-vc') {
  return check({ mode, settings: mode === 'psv' ? PSV : VC, readings: { vtExhaledMl } });
}
function pause(plateauCmH2O: number, more: CheckParts = {}) {
  return check({ settings: { ...VC, peepCmH2O: 20 }, readings: { plateauCmH2O, vtExhaledMl: 400 }, ...more });
}
/** Power is 0.098 × rate × volume × 25 cmH2O here. */
function power(ratePerMin: number) {
  return check({
    mode: 'ac-pc',
    settings: { pInspCmH2O: 15, peepCmH2O: 10, fio2Percent: 40, rateSetPerMin: 18 },
    readings: { vtExhaledMl: 400, rateTotalPerMin: ratePerMin },
  });
}
function readings(values: BedCheck['readings'], more: CheckParts = {}) {
  return check({ settings: VC, readings: values, ...more });
}
function limited(limits: BedCheck['limits'], values: BedCheck['readings'] = {}, more: CheckParts = {}) {
  return check({ settings: VC, readings: values, limits: { ...QUIET_LIMITS, ...limits }, ...more });
}
/** Resistance 10, compliance 50: a time constant of half a second, so 1.5 s are needed; 0.5 s to breathe in. */
function emptying(ratePerMin: number) {
  return check({
    settings: { ...VC, vtSetMl: 500, inspiratoryFlowLMin: 60, inspiratoryTimeS: 0.5 },
    readings: { vtExhaledMl: 500, plateauCmH2O: 15, peakCmH2O: 25, rateTotalPerMin: ratePerMin },
  });
}

const EDGES: {
  id: string;
  level: Flag['level'];
  short: string;
  flagged: Omit<BedStay, 'flags'>;
  quiet: Omit<BedStay, 'flags'>;
}[] = [
  { id: 'vt-per-kg-high', level: 'attention', short: 'Vt 8.6 mL/kg', flagged: vt(860), quiet: vt(800) },
  { id: 'vt-per-kg-high', level: 'attention', short: 'Vt 8.01 mL/kg', flagged: vt(801), quiet: vt(800) },
  { id: 'vt-per-kg-above', level: 'note', short: 'Vt 8 mL/kg', flagged: vt(800), quiet: vt(801) },
  { id: 'vt-per-kg-above', level: 'note', short: 'Vt 6.51 mL/kg', flagged: vt(651), quiet: vt(650) },
  { id: 'plateau-high', level: 'attention', short: 'Plateau 31', flagged: pause(31), quiet: pause(30) },
  {
    id: 'plateau-high',
    level: 'attention',
    short: 'Plateau 31',
    flagged: pause(31, { passive: true }),
    quiet: pause(31, { passive: false }),
  },
  {
    id: 'driving-pressure-high',
    level: 'attention',
    short: 'Driving P 16',
    flagged: pause(36),
    quiet: pause(35),
  },
  {
    id: 'mechanical-power-high',
    level: 'note',
    short: 'Power 17.6 J/min',
    flagged: power(18),
    quiet: power(17),
  },
  {
    id: 'intrinsic-peep',
    level: 'attention',
    short: 'iPEEP 5',
    flagged: readings({ intrinsicPeepCmH2O: 5 }),
    quiet: readings({ intrinsicPeepCmH2O: 4 }),
  },
  {
    id: 'intrinsic-peep',
    level: 'attention',
    short: 'iPEEP 5',
    flagged: readings({ intrinsicPeepCmH2O: 5 }),
    quiet: readings({ intrinsicPeepCmH2O: 5 }, { passive: false }),
  },
  {
    id: 'fio2-high',
    level: 'note',
    short: 'FiO2 60 %',
    flagged: check({ settings: { ...VC, fio2Percent: 60 } }),
    quiet: check({ settings: { ...VC, fio2Percent: 59 } }),
  },
  {
    id: 'pf-low',
    level: 'attention',
    short: 'P/F 99',
    flagged: gas({ po2MmHg: 99, fio2Percent: 100 }),
    quiet: gas({ po2MmHg: 150, fio2Percent: 100 }),
  },
  {
    id: 'pf-low',
    level: 'note',
    short: 'P/F 100',
    flagged: gas({ po2MmHg: 100, fio2Percent: 100 }),
    quiet: gas({ po2MmHg: 90, fio2Percent: 100 }, { site: 'venous' }),
  },
  {
    id: 'pf-low',
    level: 'note',
    short: 'P/F 149',
    flagged: gas({ po2MmHg: 149, fio2Percent: 100 }),
    quiet: gas({ po2MmHg: 90 }),
  },
  {
    id: 'ph-low',
    level: 'attention',
    short: 'pH 7.24',
    flagged: gas({ ph: 7.24 }),
    quiet: gas({ ph: 7.25 }),
  },
  {
    id: 'gas-inconsistent',
    level: 'attention',
    short: 'Gas: check entry',
    flagged: gas({ ph: 7.45, pco2MmHg: 40, bicarbonateMmolL: 24 }),
    quiet: gas({ ph: 7.44, pco2MmHg: 40, bicarbonateMmolL: 24 }),
  },
  {
    id: 'cuff-out-of-band',
    level: 'attention',
    short: 'Cuff 19',
    flagged: airway({ cuffCmH2O: 19 }),
    quiet: airway({ cuffCmH2O: 20 }),
  },
  {
    id: 'cuff-out-of-band',
    level: 'attention',
    short: 'Cuff 31',
    flagged: airway({ cuffCmH2O: 31 }),
    quiet: airway({ cuffCmH2O: 30 }),
  },
  {
    id: 'cuff-out-of-band',
    level: 'attention',
    short: 'Cuff 18',
    flagged: airway({ cuffCmH2O: 18 }),
    quiet: airway({ cuffCmH2O: 18 }, { cuffed: false }),
  },
  {
    id: 'depth-moved',
    level: 'attention',
    short: 'Depth +2 cm',
    flagged: airway({ depthCm: 24 }),
    quiet: airway({ depthCm: 23.5 }),
  },
  {
    id: 'depth-moved',
    level: 'attention',
    short: 'Depth −2.5 cm',
    flagged: airway({ depthCm: 19.5 }),
    quiet: airway({ depthCm: 20.5 }),
  },
  {
    id: 'suction-catheter-small',
    level: 'note',
    short: 'Suction ≤ 8 Fr',
    flagged: airway({}, { sizeMm: 6.5 }),
    quiet: airway({}, { sizeMm: 7 }),
  },
  {
    id: 'rate-above-set',
    level: 'note',
    short: 'Rate 28, set 18',
    flagged: readings({ rateTotalPerMin: 28 }),
    quiet: readings({ rateTotalPerMin: 27 }),
  },
  {
    id: 'expiratory-time-short',
    level: 'note',
    short: 'Te 1.4 s short',
    flagged: emptying(31),
    quiet: emptying(30),
  },
  {
    id: 'limit-off-high-pressure',
    level: 'attention',
    short: 'P limit off',
    flagged: limited({ highPressureCmH2O: 'off' }),
    quiet: limited({}),
  },
  {
    id: 'limit-off-low-vt',
    level: 'attention',
    short: 'Vt limit off',
    flagged: limited({ lowVtMl: 'off' }, {}, { mode: 'ac-vtpc' }),
    quiet: limited({ lowVtMl: 'off' }),
  },
  {
    id: 'limit-off-low-minute-volume',
    level: 'attention',
    short: 'MV limit off',
    flagged: limited({ lowMinuteVolumeLMin: 'off' }, {}, { mode: 'aprv' }),
    quiet: limited({ lowMinuteVolumeLMin: 'off' }),
  },
  {
    id: 'limit-off-high-rate',
    level: 'attention',
    short: 'Rate limit off',
    flagged: limited({ highRatePerMin: 'off' }, {}, { mode: 'simv-vc' }),
    quiet: limited({ highRatePerMin: 'off' }),
  },
  {
    id: 'limit-off-apnoea',
    level: 'attention',
    short: 'Apnoea off',
    flagged: limited({ apnoeaS: 'off' }, {}, { mode: 'psv' }),
    quiet: limited({ apnoeaS: 'off' }),
  },
  {
    id: 'limit-off-apnoea',
    level: 'attention',
    short: 'Apnoea off',
    flagged: limited({ apnoeaS: 'off' }, {}, { mode: 'niv-cpap' }),
    quiet: limited({}, {}, { mode: 'niv-cpap' }),
  },
  {
    id: 'limit-passed-high-pressure',
    level: 'attention',
    short: 'P past limit',
    flagged: limited({ highPressureCmH2O: 40 }, { peakCmH2O: 40 }),
    quiet: limited({ highPressureCmH2O: 40 }, { peakCmH2O: 39 }),
  },
  {
    id: 'limit-passed-low-vt',
    level: 'attention',
    short: 'Vt past limit',
    flagged: limited({ lowVtMl: 400 }, { vtExhaledMl: 400 }),
    quiet: limited({ lowVtMl: 400 }, { vtExhaledMl: 401 }),
  },
  {
    id: 'limit-passed-low-minute-volume',
    level: 'attention',
    short: 'MV past limit',
    flagged: limited({ lowMinuteVolumeLMin: 5 }, { minuteVolumeLMin: 5 }),
    quiet: limited({ lowMinuteVolumeLMin: 5 }, { minuteVolumeLMin: 5.1 }),
  },
  {
    id: 'limit-passed-high-minute-volume',
    level: 'attention',
    short: 'MV past limit',
    flagged: limited({ highMinuteVolumeLMin: 12 }, { minuteVolumeLMin: 12 }),
    quiet: limited({ highMinuteVolumeLMin: 12 }, { minuteVolumeLMin: 11.9 }),
  },
  {
    id: 'limit-passed-high-rate',
    level: 'attention',
    short: 'Rate past limit',
    flagged: limited({ highRatePerMin: 30 }, { rateTotalPerMin: 30 }),
    quiet: limited({ highRatePerMin: 30 }, { rateTotalPerMin: 29 }),
  },
  {
    id: 'limits-not-recorded',
    level: 'note',
    short: 'No limits noted',
    flagged: check({ settings: VC, limits: {} }),
    quiet: check({ mode: 'hfov', limits: {} }),
  },
  {
    id: 'limits-not-recorded',
    level: 'note',
    short: 'Limit not noted',
    flagged: check({ settings: VC, limits: { apnoeaS: 20 } }),
    quiet: check({ settings: VC, limits: { highPressureCmH2O: 'off' } }),
  },
];

describe('each rule, at both sides of its edge', () => {
  it.each(EDGES)(
    '$id raises "$short" and keeps quiet one step away',
    ({ id, level, short, flagged, quiet }) => {
      expect(flagsOf(flagged).filter((flag) => flag.id === id)).toMatchObject([{ level, short }]);
      expect(ids(quiet)).not.toContain(id);
    },
  );

  it('has an edge for every rule that can find something', () => {
    const tried = new Set(EDGES.map(({ id }) => id));
    // High minute volume is required by no mode; an apnoea time has no reading to pass it.
    const never = ['limit-off-high-minute-volume', 'limit-passed-apnoea'];
    expect(FLAG_RULES.map(({ id }) => id).filter((id) => !tried.has(id))).toEqual(never);
  });

  it('notes a volume below the limit only where the ventilator gives the breath', () => {
    expect(ids(vt(700))).toContain('vt-per-kg-above');
    expect(ids(vt(700, 'psv'))).not.toContain('vt-per-kg-above');
    expect(ids(vt(860, 'psv'))).toContain('vt-per-kg-high');
  });

  it('says P/F once, at its higher level', () => {
    expect(flagsOf(gas({ po2MmHg: 80, fio2Percent: 100 })).map(({ id, level }) => [id, level])).toEqual([
      ['pf-low', 'attention'],
    ]);
  });
});

describe('bedFlags', () => {
  it('flags nothing where nothing is recorded', () => {
    expect(flagsOf(EMPTY)).toEqual([]);
  });

  it('judges nothing per kg without a weight', () => {
    const stay = vt(860);
    const unweighed = { ...stay.check?.derived, vtPerKgMl: null };
    expect(unweighed.vtPerKgMl).toBeNull();
    const core = { mode: 'ac-vc', settings: VC, readings: { vtExhaledMl: 860 }, passive: null } as const;
    const derived = deriveCheck({ check: core, predictedBodyWeightKg: null });
    expect(
      ids({ ...stay, predictedBodyWeightKg: null, check: stay.check && { ...stay.check, derived } }),
    ).toEqual([]);
  });

  it('raises no flag from a check that no longer tells of the present settings or support', () => {
    expect(ids(pause(36, { changedSinceAt: AT }))).toEqual([]);
    expect(ids({ ...pause(36), support: { id: 'hfnc', shortName: 'HFNC', sinceAt: AT } })).toEqual([]);
  });

  it('still flags a gas that was drawn before a change', () => {
    expect(ids(gas({ ph: 7.2, po2MmHg: 80, fio2Percent: 100 }, { changedSinceAt: AT }))).toEqual([
      'pf-low',
      'ph-low',
    ]);
  });

  it('puts attention before notes and keeps the order of the rules', () => {
    const stay = {
      ...check({
        settings: { ...VC, peepCmH2O: 14, fio2Percent: 70 },
        readings: { vtExhaledMl: 700, plateauCmH2O: 31, peakCmH2O: 36, rateTotalPerMin: 30 },
        limits: {},
      }),
      ...{ gas: gas({ ph: 7.2, po2MmHg: 62, fio2Percent: 70 }).gas },
    };
    expect(flagsOf(stay).map(({ id, level }) => `${level} ${id}`)).toEqual([
      'attention plateau-high',
      'attention driving-pressure-high',
      'attention pf-low',
      'attention ph-low',
      'note vt-per-kg-above',
      'note mechanical-power-high',
      'note fio2-high',
      'note limits-not-recorded',
      'note rate-above-set',
    ]);
  });

  it('says which groups each flag rests on', () => {
    const groups = new Map(FLAG_RULES.map(({ id, from }) => [id, from]));
    expect(groups.get('plateau-high')).toEqual(['check']);
    expect(groups.get('pf-low')).toEqual(['gas']);
    expect(groups.get('depth-moved')).toEqual(['airway']);
  });

  it('finds the time to breathe out, or nothing, for any volume-controlled breath that can be entered', () => {
    const within = ([min, max]: readonly [number, number]) =>
      fc.oneof(fc.constantFrom(min, max), fc.integer({ min, max }));
    const breath = fc.record({
      vtExhaledMl: within([20, 2000]),
      plateauCmH2O: within([1, 60]),
      rateTotalPerMin: within([0, 80]),
      flow: within([5, 180]),
      resistive: within([0, 60]),
    });
    fc.assert(
      fc.property(breath, ({ flow, resistive, ...values }) => {
        const stay = check({
          settings: { ...VC, peepCmH2O: 0, inspiratoryFlowLMin: flow },
          readings: { ...values, peakCmH2O: values.plateauCmH2O + resistive },
        });
        expect(flagsOf(stay).every(({ inputs }) => inputs.every(({ value }) => Number.isFinite(value)))).toBe(
          true,
        );
      }),
    );
  });

  it('makes every flag whole: a short wording, a sentence, a source and finite inputs, and each id once', () => {
    fc.assert(
      fc.property(anyStay(), (stay) => {
        const flags = flagsOf(stay);
        expect(new Set(flags.map(({ id }) => id)).size).toBe(flags.length);
        for (const flag of flags) {
          expect(flag.short.length).toBeGreaterThan(0);
          expect(flag.short.length).toBeLessThanOrEqual(SHORT_LENGTH);
          expect(flag.sentence.endsWith('.')).toBe(true);
          expect(flag.source.length).toBeGreaterThan(10);
          expect(flag.from.every((group) => stay[group] !== null)).toBe(true);
          expect(`${flag.short} ${flag.sentence}`).not.toMatch(/NaN|undefined|null|Infinity/);
          expect(flag.inputs.every(({ value }) => Number.isFinite(value))).toBe(true);
        }
      }),
      { numRuns: 400 },
    );
  });
});

type Numbers = Record<string, number>;

/** Numbers as they are entered: within their limits, at their precision, each of them there or not. */
function someOf(
  fields: Record<string, { hard: readonly [number, number]; decimals: number }>,
): fc.Arbitrary<Numbers> {
  const arbitraries = Object.fromEntries(
    Object.entries(fields).map(([key, { hard, decimals }]) => {
      const steps = 10 ** decimals;
      return [key, fc.integer({ min: hard[0] * steps, max: hard[1] * steps }).map((step) => step / steps)];
    }),
  );
  return fc.record(arbitraries, { requiredKeys: [] }).map((values) => {
    const there = Object.entries(values).flatMap(([key, value]) =>
      value === undefined ? [] : [{ key, value }],
    );
    return Object.fromEntries(there.map(({ key, value }) => [key, value]));
  });
}

function anyStay(): fc.Arbitrary<Omit<BedStay, 'flags'>> {
  const limits = fc
    .tuple(someOf(LIMIT_FIELDS), fc.subarray(Object.keys(LIMIT_FIELDS)))
    .map(([numbers, off]) => ({
      ...numbers,
      ...Object.fromEntries(off.map((key) => [key, 'off' as const])),
    }));
  const anyCheck = fc
    .record({
      mode: fc.constantFrom(...SUPPORT_CATALOGUE).map(({ id }) => id),
      settings: someOf(SETTING_FIELDS),
      readings: someOf(READING_FIELDS),
      limits,
      passive: fc.constantFrom(null, true, false),
    })
    // Pressures of one breath stand in order, as entry has it.
    .map((parts) => ({ ...parts, readings: inOrder(parts.readings, parts.settings.peepCmH2O ?? 0) }))
    .map((parts) => check(parts));
  const anyGas = fc
    .tuple(someOf(GAS_FIELDS), fc.constantFrom('arterial', 'venous', 'capillary'))
    .map(([values, site]) => gas(values, { site }));
  const anyAirway = someOf(AIRWAY_FIELDS).map(({ sizeMm = 7.5, ...found }) => airway(found, { sizeMm }));
  return fc.tuple(fc.option(anyCheck), fc.option(anyGas), fc.option(anyAirway)).map(([one, two, three]) => ({
    ...EMPTY,
    support: one?.support ?? null,
    check: one?.check ?? null,
    gas: two?.gas ?? null,
    device: three?.device ?? null,
    airway: three?.airway ?? null,
  }));
}

function inOrder(values: Numbers, peep: number): Numbers {
  const { plateauCmH2O = peep, peakCmH2O = peep } = values;
  const plateau = Math.max(peep, plateauCmH2O);
  return { ...values, plateauCmH2O: plateau, peakCmH2O: Math.max(plateau, peakCmH2O) };
}
