import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { deriveCheck } from '../board/derive-check.ts';
import type { BedStay } from '../contract/board.ts';
import { AIRWAY_FIELDS, GAS_FIELDS, LIMIT_FIELDS, READING_FIELDS, SETTING_FIELDS } from '../entry/fields.ts';
import { SUPPORT_CATALOGUE } from '../support/catalogue.ts';
import { FLAG_RULES } from './bed-flags.ts';
import { AT, airway, check, EMPTY, flagsOf, gas, ids, pause, VC, vt } from './example-stays.ts';
import { SHORT_LENGTH } from './rule.ts';

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
        passive: true,
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

  it('says nothing of the time to breathe out where a mistyped flow makes a resistance that no lung has', () => {
    const settings = { ...VC, peepCmH2O: 0, inspiratoryFlowLMin: 5 };
    const readings = { vtExhaledMl: 450, plateauCmH2O: 20, peakCmH2O: 110, rateTotalPerMin: 5 };
    expect(ids(check({ settings, readings }))).not.toContain('expiratory-time-short');
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
