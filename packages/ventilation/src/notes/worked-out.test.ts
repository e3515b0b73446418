import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type CheckToDerive, deriveCheck } from '../board/derive-check.ts';
import { deriveGas } from '../board/derive-gas.ts';
import type { BedStay, CheckDerived } from '../contract/board.ts';
import { READING_FIELDS, SETTING_FIELDS } from '../entry/fields.ts';
import {
  check as checkStay,
  emptying,
  flagsOf,
  gas as gasStay,
  pause,
  power,
  vt,
} from '../flags/example-stays.ts';
import * as calculations from '../index.ts';
import { predictedBodyWeight } from '../physiology/predicted-body-weight.ts';
import { SUPPORT_CATALOGUE } from '../support/catalogue.ts';
import { checkWorkedOut } from './check-worked-out.ts';
import { flagWorkedOut } from './flag-worked-out.ts';
import { gasWorkedOut, weightWorkedOut } from './gas-worked-out.ts';
import { noteAddress, type WorkedOut, workedOut } from './worked-out.ts';

const FUNCTIONS: Readonly<Record<string, unknown>> = { ...calculations };

/** As the note does: from the texts of the address, and nothing else. */
function again(from: WorkedOut): unknown {
  const { pathname, searchParams } = new URL(noteAddress(from), 'http://here');
  const texts = [...searchParams].map(([key, text]) => [
    key,
    Number.isNaN(Number(text)) ? text : Number(text),
  ]);
  const calculation = FUNCTIONS[pathname.split('/')[2] ?? ''] as (input: unknown) => unknown;
  return calculation(Object.fromEntries(texts));
}

const KEYS = [
  'vtPerKgMl',
  'drivingPressureCmH2O',
  'staticComplianceMlCmH2O',
  'mechanicalPowerJMin',
  'minuteVolumeLMin',
  'roxIndex',
  'rsbiPerMinL',
] as const satisfies readonly (keyof CheckDerived)[];

describe('the calculation and the numbers behind a value', () => {
  it('make each value of a check again, to the last digit', () => {
    const seen = new Set<string>();
    fc.assert(
      fc.property(
        anyCheck(),
        fc.double({ min: 16, max: 122, noNaN: true }),
        (facts, predictedBodyWeightKg) => {
          const derived = deriveCheck({ check: facts, predictedBodyWeightKg });
          for (const key of KEYS) {
            const from = checkWorkedOut(key, { check: { ...facts, derived }, predictedBodyWeightKg });
            const wasRead = key === 'minuteVolumeLMin' && facts.readings.minuteVolumeLMin !== undefined;
            expect(from === null).toBe(derived[key] === null || wasRead);
            if (from === null) continue;
            expect(again(from)).toBe(derived[key]);
            seen.add(key);
          }
        },
      ),
      { numRuns: 1_500 },
    );
    expect([...seen].sort()).toEqual([...KEYS].sort());
  });

  it('make P/F, the ventilatory ratio and the weight again', () => {
    const values = { ph: 7.31, pco2MmHg: 51.3, po2MmHg: 71.7, fio2Percent: 57 };
    const predictedBodyWeightKg = predictedBodyWeight({ sex: 'female', heightCm: 163.5 });
    const derived = deriveGas({
      gas: { site: 'arterial', ...values },
      predictedBodyWeightKg,
      minuteVolumeLMin: 9.7,
    });
    for (const key of ['pfMmHg', 'ventilatoryRatio'] as const) {
      const from = gasWorkedOut(key, { gas: { values, ...derived }, predictedBodyWeightKg });
      expect(from && again(from)).toBe(derived[key]);
    }
    const weight = weightWorkedOut({ sex: 'female', heightCm: 163.5 });
    expect(weight && again(weight)).toBe(predictedBodyWeightKg);
  });

  it('are not told where there is no value', () => {
    const venous = deriveGas({
      gas: { site: 'venous', pco2MmHg: 50, po2MmHg: 40, fio2Percent: 40 },
      predictedBodyWeightKg: 70,
      minuteVolumeLMin: 9,
    });
    const gas = { values: { pco2MmHg: 50, po2MmHg: 40, fio2Percent: 40 }, ...venous };
    expect(gasWorkedOut('pfMmHg', { gas, predictedBodyWeightKg: 70 })).toBeNull();
    expect(gasWorkedOut('ventilatoryRatio', { gas, predictedBodyWeightKg: 70 })).toBeNull();
    expect(weightWorkedOut({ sex: null, heightCm: 170 })).toBeNull();
    expect(workedOut('pfRatio', { pao2MmHg: undefined, fio2: 0.4 })).toBeNull();
  });
});

const FLAGGED: readonly (readonly [id: string, stay: Omit<BedStay, 'flags'>, labels: readonly string[]])[] = [
  ['vt-per-kg-high', vt(920), ['Vt per kg']],
  ['vt-per-kg-above', vt(730), ['Vt per kg']],
  ['driving-pressure-high', pause(37), ['Driving pressure']],
  ['mechanical-power-high', power(40), ['Mechanical power']],
  ['pf-low', gasStay({ ph: 7.4, pco2MmHg: 40, po2MmHg: 55, fio2Percent: 60 }), ['P/F']],
  [
    'gas-inconsistent',
    gasStay({ ph: 7.1, pco2MmHg: 40, po2MmHg: 90, bicarbonateMmolL: 24 }),
    ['Expected pH'],
  ],
  ['expiratory-time-short', emptying(50), ['Expiratory time', 'Time constant', 'Resistance', 'Compliance']],
];

describe('the calculations behind a flag', () => {
  it.each(FLAGGED)('of %s make the values of its "Why" again', (id, stay, labels) => {
    const flag = flagsOf(stay).find((one) => one.id === id);
    if (!flag) throw new Error(`${id} is not raised`);
    const made = flagWorkedOut({ flag, stay });
    expect(made.map(({ label }) => label)).toEqual(labels);
    for (const { label, from } of made) {
      const shown = flag.inputs.find((input) => input.label === label);
      if (shown) expect(valuesOf(again(from))).toContain(shown.value);
    }
  });

  it('are none where a flag rests on what was read or set', () => {
    const stay = checkStay({ readings: { plateauCmH2O: 33 }, passive: true });
    expect(flagWorkedOut({ flag: { id: 'plateau-high' }, stay })).toEqual([]);
  });
});

it('puts nothing into the address but the input of the calculation', () => {
  const from = workedOut('pfRatio', { pao2MmHg: 78, fio2: 0.45 });
  expect(from && noteAddress(from)).toBe('/notes/pfRatio?pao2MmHg=78&fio2=0.45');
});

function valuesOf(result: unknown): unknown[] {
  return typeof result === 'object' && result !== null ? Object.values(result) : [result];
}

/** Any mode with all its settings, and readings of which each may be missing; pressures in their order. */
function anyCheck(): fc.Arbitrary<CheckToDerive> {
  return fc.constantFrom(...SUPPORT_CATALOGUE).chain((entry) =>
    fc.record({
      mode: fc.constant(entry.id),
      settings: numbers(SETTING_FIELDS, [...entry.required, ...entry.optional]),
      readings: numbers(READING_FIELDS, Object.keys(READING_FIELDS)).map(inOrder),
      passive: fc.constantFrom(null, true, false),
    }),
  );
}

function inOrder(readings: Record<string, number>): Record<string, number> {
  const { peakCmH2O, plateauCmH2O } = readings;
  if (peakCmH2O === undefined || plateauCmH2O === undefined) return readings;
  return {
    ...readings,
    peakCmH2O: Math.max(peakCmH2O, plateauCmH2O),
    plateauCmH2O: Math.min(peakCmH2O, plateauCmH2O),
  };
}

function numbers(
  fields: Record<string, { hard: readonly [number, number] }>,
  keys: readonly string[],
): fc.Arbitrary<Record<string, number>> {
  const arbitraries = Object.fromEntries(
    keys.map((key) => {
      const [low, high] = fields[key]?.hard ?? [0, 0];
      return [key, fc.double({ min: low, max: high, noNaN: true })];
    }),
  );
  return fc.record(arbitraries, { requiredKeys: [] }).map(given);
}

function given(values: Record<string, number | undefined>): Record<string, number> {
  return Object.fromEntries(
    Object.entries(values).filter((entry): entry is [string, number] => entry[1] !== undefined),
  );
}
