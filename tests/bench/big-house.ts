import { NOTHING_ACKNOWLEDGED, type Stamped, type StayFacts } from '@windrow/ventilation/board/facts';
import type { Check } from '@windrow/ventilation/contract/observations';
import { LIMIT_FIELDS, READING_FIELDS, SETTING_FIELDS } from '@windrow/ventilation/entry/fields';
import { SUPPORT_IDS, type SupportId, supportEntry } from '@windrow/ventilation/support/catalogue';

/** The moment at which the house is looked at; nothing here reads a clock. */
export const NOW = Date.parse('2026-03-05T10:00:00Z');
const CHECKS_OF_TWO_DAYS = 12;

/** Facts of a stay in each of `beds` beds: as many modes, checks, gases and flags as a real house has at once. */
export function bigHouse(beds: number): StayFacts[] {
  const random = seeded(20260305);
  return Array.from({ length: beds }, (_, at) => stayOf(at, random));
}

function stayOf(at: number, random: () => number): StayFacts {
  const mode = SUPPORT_IDS[at % SUPPORT_IDS.length] ?? 'ac-vc';
  const checks = Array.from({ length: CHECKS_OF_TWO_DAYS }, (_, back) =>
    stamped(`c${at}-${back}`, 20 + back * 240 + (at % 200), checkOf(mode, random)),
  );
  const observed = (minutes: number) => ago(minutes + (at % 60));
  return {
    ...NOTHING_ACKNOWLEDGED,
    stayId: `s${at}`,
    version: 1,
    admittedAt: observed(5_000),
    details: {
      patient: {
        hospitalNumber: `H${at}`,
        familyName: 'Varga',
        givenName: 'Ilse',
        bornOn: '1961-03-04',
        sex: at % 2 === 0 ? 'female' : 'male',
        heightCm: 155 + (at % 35),
      },
      difficultAirway: at % 20 === 0,
      precautions: null,
      careLimits: null,
      orders: { checkEveryMinutes: null, gasEveryMinutes: null },
    },
    checks,
    gas: stamped(`g${at}`, 60 + (at % 300), {
      observedAt: observed(60),
      site: 'arterial',
      ph: 7.2 + random() * 0.3,
      pco2MmHg: 30 + Math.round(random() * 40),
      po2MmHg: 55 + Math.round(random() * 60),
      bicarbonateMmolL: 18 + Math.round(random() * 12),
      fio2Percent: 30 + Math.round(random() * 60),
    }),
    airway: stamped(`a${at}`, 4_900, {
      observedAt: observed(4_900),
      event: 'placed',
      kind: 'oral-tube',
      sizeMm: 7.5,
      depthCm: 22,
      depthMark: 'lip',
      cuffed: true,
    }),
    airwayChecks: [
      stamped(`w${at}`, 200 + (at % 300), {
        observedAt: observed(200),
        depthCm: 22 + Math.round(random() * 3),
        cuffCmH2O: 16 + Math.round(random() * 18),
      }),
    ],
    happenings: [
      stamped(`h${at}`, 700, { observedAt: observed(700), kind: at % 2 === 0 ? 'proned' : 'supine' }),
      stamped(`i${at}`, 4_900, { observedAt: observed(4_900), kind: 'intubated' }),
    ],
    support: { id: mode, sinceAt: observed(4_800), observedAt: observed(20) },
  };
}

/** Somewhere in the middle half of each field's range, pressures in their order. */
function checkOf(mode: SupportId, random: () => number): Check {
  const entry = supportEntry(mode);
  const within = ([low, high]: readonly [number, number]) =>
    Math.round(low + (high - low) * (0.1 + random() * 0.4));
  const pick = (
    keys: readonly string[],
    fields: Readonly<Record<string, { hard: readonly [number, number] }>>,
  ) => Object.fromEntries(keys.map((key) => [key, within(fields[key]?.hard ?? [0, 1])]));
  return {
    observedAt: ago(0),
    mode,
    passive: random() < 0.6,
    settings: pick([...entry.required, ...entry.optional], SETTING_FIELDS),
    readings: { ...pick(entry.readings, READING_FIELDS), peakCmH2O: 40, plateauCmH2O: 32 },
    limits: pick(entry.limits, LIMIT_FIELDS),
  };
}

function stamped<Body extends { observedAt: string }>(
  observationId: string,
  minutes: number,
  body: Body,
): Stamped<Body> {
  const at = ago(minutes);
  return {
    observationId,
    observedAt: at,
    recordedAt: at,
    recordedByInitials: 'AO',
    body: { ...body, observedAt: at },
  };
}

function ago(minutes: number): string {
  return new Date(NOW - minutes * 60_000).toISOString();
}

/** The same numbers in every run. @source the public-domain generator mulberry32. */
function seeded(seed: number): () => number {
  let state = seed;
  return () => {
    state = (state + 0x6d2b79f5) | 0;
    let mixed = Math.imul(state ^ (state >>> 15), 1 | state);
    mixed = (mixed + Math.imul(mixed ^ (mixed >>> 7), 61 | mixed)) ^ mixed;
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4_294_967_296;
  };
}
