import { HAPPENING_KINDS, MASK_INTERFACES } from '@windrow/ventilation/contract/observations';
import {
  AIRWAY_FIELDS,
  GAS_FIELDS,
  LIMIT_FIELDS,
  type NumberField,
  READING_FIELDS,
  SETTING_FIELDS,
  SIGN_FIELDS,
} from '@windrow/ventilation/entry/fields';
import type { AgeLadder } from '@windrow/ventilation/policy/policy';
import { SUPPORT_CATALOGUE, SUPPORT_IDS, type SupportEntry } from '@windrow/ventilation/support/catalogue';
import fc from 'fast-check';

/** A number that its field lets through, often at its very edge. */
function numberOf({ hard: [low, high], step, multipleOf }: NumberField): fc.Arbitrary<number> {
  const by = multipleOf ?? Math.max(step, 0.05);
  const inside = fc
    .integer({ min: 0, max: Math.floor((high - low) / by) })
    .map((n) => Number((low + n * by).toFixed(4)));
  return fc.oneof({ weight: 4, arbitrary: inside }, { weight: 1, arbitrary: fc.constantFrom(low, high) });
}

/** Some of the fields of a table, and always those that are needed. */
function numbersOf(
  table: Record<string, NumberField>,
  keys: readonly string[],
  needed: readonly string[] = [],
) {
  const shape: Record<string, fc.Arbitrary<number | undefined>> = {};
  for (const key of keys) {
    const field = table[key];
    if (field)
      shape[key] = needed.includes(key) ? numberOf(field) : fc.option(numberOf(field), { nil: undefined });
  }
  return fc.record(shape);
}

/** PEEP, plateau and peak in the order in which they stand in a breath: any other is refused at the door. */
function inOrder(check: {
  settings: Record<string, number | undefined>;
  readings: Record<string, number | undefined>;
}) {
  const peep = check.settings.peepCmH2O ?? check.settings.epapCmH2O ?? check.settings.cpapCmH2O ?? 0;
  const { peakCmH2O: peak, plateauCmH2O: plateau } = check.readings;
  const plateauInOrder = plateau === undefined ? undefined : Math.max(plateau, peep);
  const peakInOrder = peak === undefined ? undefined : Math.max(peak, plateauInOrder ?? 0, peep);
  return { ...check, readings: { ...check.readings, plateauCmH2O: plateauInOrder, peakCmH2O: peakInOrder } };
}

const checkOf = (entry: SupportEntry) =>
  fc
    .record({
      mode: fc.constant(entry.id),
      settings: numbersOf(SETTING_FIELDS, [...entry.required, ...entry.optional], entry.required),
      readings: numbersOf(READING_FIELDS, Object.keys(READING_FIELDS)),
      limits: numbersOf(LIMIT_FIELDS, Object.keys(LIMIT_FIELDS)),
      passive: fc.option(fc.boolean(), { nil: undefined }),
      interface: entry.wantsInterface
        ? fc.option(fc.constantFrom(...MASK_INTERFACES), { nil: undefined })
        : fc.constant(undefined),
    })
    .map(inOrder);

const entries: readonly SupportEntry[] = SUPPORT_CATALOGUE;
const check = fc.oneof(...entries.map(checkOf));
const gasNeeds = ['ph', 'pco2MmHg', 'po2MmHg'];
const gas = fc
  .tuple(
    fc.constantFrom('arterial', 'venous', 'capillary'),
    numbersOf(GAS_FIELDS, Object.keys(GAS_FIELDS), gasNeeds),
  )
  .map(([site, values]) => ({ site, ...values }));
const airway = fc.oneof(
  {
    weight: 4,
    arbitrary: fc
      .tuple(
        fc.constantFrom('oral-tube', 'nasal-tube', 'tracheostomy', 'laryngeal-mask'),
        numbersOf(AIRWAY_FIELDS, ['sizeMm', 'depthCm'], ['sizeMm']),
        fc.boolean(),
      )
      .map(([kind, values, cuffed]) => ({ event: 'placed', kind, cuffed, ...values })),
  },
  { weight: 1, arbitrary: fc.constant({ event: 'removed' }) },
);
const airwayCheck = numbersOf(AIRWAY_FIELDS, ['depthCm', 'cuffCmH2O']).map((values) => ({
  secured: true,
  ...values,
}));
const happening = fc
  .tuple(fc.constantFrom(...Object.keys(HAPPENING_KINDS)), fc.constantFrom(...SUPPORT_IDS))
  .map(([kind, toSupport]) => ({
    kind,
    ...(kind.startsWith('extubated') ? { toSupport } : {}),
    ...(kind === 'trial-failed' ? { detail: 'tired' } : {}),
    ...(kind === 'screened' ? { screen: { coughAdequate: true } } : {}),
  }));

/** Stands in the record and never on the board. */
const sign = fc.oneof(
  numbersOf(SIGN_FIELDS, ['temperatureC'], ['temperatureC']).map((values) => ({
    sign: 'temperature',
    ...values,
  })),
  numbersOf(SIGN_FIELDS, ['whiteCellsPerMm3'], ['whiteCellsPerMm3']).map((values) => ({
    sign: 'white-cells',
    ...values,
  })),
);

export type Recorded = { path: string; body: Record<string, unknown> };
const recorded: fc.Arbitrary<Recorded> = fc.oneof(
  { weight: 4, arbitrary: check.map((body) => ({ path: 'checks', body })) },
  { weight: 2, arbitrary: gas.map((body) => ({ path: 'gases', body })) },
  { weight: 1, arbitrary: airway.map((body) => ({ path: 'airways', body })) },
  { weight: 2, arbitrary: airwayCheck.map((body) => ({ path: 'airway-checks', body })) },
  { weight: 2, arbitrary: happening.map((body) => ({ path: 'happenings', body })) },
  { weight: 1, arbitrary: sign.map((body) => ({ path: 'infection-signs', body })) },
);

/** Minutes before now that something is said to have happened; sometimes a little ahead of the server. */
const agoMinutes = fc.oneof(
  { weight: 6, arbitrary: fc.integer({ min: 0, max: 90 }) },
  { weight: 2, arbitrary: fc.integer({ min: 90, max: 1_600 }) },
  { weight: 1, arbitrary: fc.constantFrom(-2, -1) },
);
const ladder: fc.Arbitrary<AgeLadder> = fc
  .tuple(fc.integer({ min: 1, max: 300 }), fc.integer({ min: 0, max: 200 }), fc.integer({ min: 0, max: 600 }))
  .map(([dueFrom, more, most]) => ({
    dueFrom,
    overdueFrom: dueFrom + more,
    withdrawFrom: dueFrom + more + most,
  }));
const orderedEvery = fc.option(fc.integer({ min: 15, max: 1_440 }), { nil: null });

/** What happens in a unit; which of the present stays, beds or facts it is about is a number to be taken modulo. */
export type Step = { which: number; agoMinutes: number } & (
  | { does: 'admit'; heightCm: number | null }
  | ({ does: 'record' } & Recorded)
  | ({ does: 'correct' } & Recorded)
  | { does: 'strike' | 'transfer' | 'discharge' }
  | { does: 'orders'; checkEveryMinutes: number | null; gasEveryMinutes: number | null }
  | { does: 'policy'; check: AgeLadder; airway: AgeLadder; gas: AgeLadder }
  | { does: 'wait'; minutes: number }
);

const always = { which: fc.nat(1_000), agoMinutes };
const admission: fc.Arbitrary<Step> = fc.record({
  ...always,
  does: fc.constant('admit' as const),
  heightCm: fc.option(fc.integer({ min: 120, max: 230 }), { nil: null }),
});
const step: fc.Arbitrary<Step> = fc.oneof(
  { weight: 3, arbitrary: admission },
  {
    weight: 12,
    arbitrary: fc
      .tuple(fc.record({ ...always, does: fc.constant('record' as const) }), recorded)
      .map(([how, what]) => ({ ...how, ...what })),
  },
  {
    weight: 3,
    arbitrary: fc
      .tuple(fc.record({ ...always, does: fc.constant('correct' as const) }), recorded)
      .map(([how, what]) => ({ ...how, ...what })),
  },
  { weight: 2, arbitrary: fc.record({ ...always, does: fc.constant('strike' as const) }) },
  {
    weight: 2,
    arbitrary: fc.record({ ...always, does: fc.constantFrom('transfer' as const, 'discharge' as const) }),
  },
  {
    weight: 1,
    arbitrary: fc.record({
      ...always,
      does: fc.constant('orders' as const),
      checkEveryMinutes: orderedEvery,
      gasEveryMinutes: orderedEvery,
    }),
  },
  {
    weight: 1,
    arbitrary: fc.record({
      ...always,
      does: fc.constant('policy' as const),
      check: ladder,
      airway: ladder,
      gas: ladder,
    }),
  },
  {
    weight: 4,
    arbitrary: fc.record({
      ...always,
      does: fc.constant('wait' as const),
      minutes: fc.integer({ min: 1, max: 400 }),
    }),
  },
);

/** A history of a unit: two patients, and then whatever comes. */
export const history: fc.Arbitrary<Step[]> = fc
  .tuple(admission, admission, fc.array(step, { minLength: 10, maxLength: 40, size: 'max' }))
  .map(([one, other, steps]) => [one, other, ...steps]);
