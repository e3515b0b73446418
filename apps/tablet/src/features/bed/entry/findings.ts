import { deriveCheck } from '@windrow/ventilation/board/derive-check';
import { deriveGas, NOTHING_DERIVED } from '@windrow/ventilation/board/derive-gas';
import { holdsAt } from '@windrow/ventilation/board/shown-bed';
import type { BedStay, FactGroup, Flag } from '@windrow/ventilation/contract/board';
import { MASK_INTERFACES } from '@windrow/ventilation/contract/observations';
import { bedFlags } from '@windrow/ventilation/flags/bed-flags';
import type { Policy } from '@windrow/ventilation/policy/policy';
import { SUPPORT_IDS } from '@windrow/ventilation/support/catalogue';
import { checkDerivedLines, type DerivedLine, gasDerivedLines } from '../derived-in-words.ts';
import type { EntryValues } from './entry-field.ts';
import type { EntryPlan } from './entry-plan.ts';

/** What the values of a form would mean if they were recorded now. */
export type Findings = { derived: readonly DerivedLine[]; flags: readonly Flag[] };

export type FindingsInput = {
  plan: EntryPlan;
  values: EntryValues;
  stay: BedStay;
  thresholds: Policy['thresholds'] | null;
  at: number;
};

const NOTHING: Findings = { derived: [], flags: [] };

/** The same functions that make the board row, over a row in which the typed values stand. */
export function findingsOf({ plan, values, stay, thresholds, at }: FindingsInput): Findings {
  const typed = typedStay({ plan, values, stay, at });
  if (typed === null) return NOTHING;
  const flags = thresholds === null ? [] : bedFlags({ stay: typed.stay, thresholds });
  const told = flags.filter((flag) => flag.from.includes(typed.group) && holdsAt({ flag, at }));
  return { derived: typed.derived, flags: told };
}

type Typed = { stay: BedStay; group: FactGroup; derived: readonly DerivedLine[] };

function typedStay({ plan, values, stay, at }: Omit<FindingsInput, 'thresholds'>): Typed | null {
  switch (plan.kind) {
    case 'check':
      return withCheck({ plan, values, stay, at });
    case 'gas':
      return withGas({ values, stay, at });
    case 'airway-check':
      return withAirway({ values, stay, at });
    default:
      return null;
  }
}

function stampAt(at: number) {
  const now = new Date(at).toISOString();
  return {
    observationId: 'typed',
    observedAt: now,
    recordedAt: now,
    recordedByInitials: '',
    changedSinceAt: null,
  };
}

function withCheck({ plan, values, stay, at }: Omit<FindingsInput, 'thresholds'>): Typed | null {
  const mode = SUPPORT_IDS.find((id) => id === values.mode);
  if (!mode) return null;
  const body = plan.bodyOf(values);
  const check = {
    ...stampAt(at),
    mode,
    settings: numbersIn(body.settings),
    readings: numbersIn(body.readings),
    limits: limitsIn(body.limits),
    interface: MASK_INTERFACES.find((mask) => mask === values.interface) ?? null,
    passive: typeof body.passive === 'boolean' ? body.passive : null,
  };
  const derived = deriveCheck({ check, predictedBodyWeightKg: stay.predictedBodyWeightKg });
  return {
    stay: { ...stay, check: { ...check, derived } },
    group: 'check',
    derived: checkDerivedLines({
      check: { ...check, derived },
      predictedBodyWeightKg: stay.predictedBodyWeightKg,
    }),
  };
}

function withGas({ values, stay, at }: Pick<FindingsInput, 'values' | 'stay' | 'at'>): Typed | null {
  const { site, pco2MmHg, po2MmHg, fio2Percent } = values;
  if (typeof site !== 'string') return null;
  const isWhole = typeof pco2MmHg === 'number' && typeof po2MmHg === 'number';
  const derived = isWhole
    ? deriveGas({
        gas: { site, pco2MmHg, po2MmHg, ...(typeof fio2Percent === 'number' ? { fio2Percent } : {}) },
        predictedBodyWeightKg: stay.predictedBodyWeightKg,
        minuteVolumeLMin: stay.check?.readings.minuteVolumeLMin ?? null,
      })
    : NOTHING_DERIVED;
  const gas = { ...stampAt(at), site, values: numbersIn(values), ...derived };
  return {
    stay: { ...stay, gas },
    group: 'gas',
    derived: gasDerivedLines({ gas, predictedBodyWeightKg: stay.predictedBodyWeightKg }),
  };
}

function withAirway({ values, stay, at }: Pick<FindingsInput, 'values' | 'stay' | 'at'>): Typed {
  const { depthCm, cuffCmH2O } = values;
  const airway = {
    ...stampAt(at),
    depthCm: typeof depthCm === 'number' ? depthCm : null,
    cuffCmH2O: typeof cuffCmH2O === 'number' ? cuffCmH2O : null,
    cuffMethod: null,
    position: null,
    secured: values.secured === undefined ? null : values.secured === 'yes',
  };
  return { stay: { ...stay, airway }, group: 'airway', derived: [] };
}

function numbersIn(part: unknown): Record<string, number> {
  return Object.fromEntries(
    entriesOf(part).filter((entry): entry is [string, number] => typeof entry[1] === 'number'),
  );
}

function limitsIn(part: unknown): Record<string, number | 'off'> {
  return Object.fromEntries(
    entriesOf(part).filter(
      (entry): entry is [string, number | 'off'] => typeof entry[1] === 'number' || entry[1] === 'off',
    ),
  );
}

function entriesOf(part: unknown): [string, unknown][] {
  return typeof part === 'object' && part !== null ? Object.entries(part) : [];
}
