import { z } from 'zod';
import {
  AIRWAY_FIELDS,
  GAS_FIELDS,
  LIMIT_FIELDS,
  READING_FIELDS,
  SETTING_FIELDS,
  SIGN_FIELDS,
  TRIAL_FIELDS,
} from '../entry/fields.ts';
import { numberSchema } from '../entry/number-schema.ts';
import { SCREEN_ANSWER_KEYS, type ScreenAnswerKey } from '../readiness/screen-answers.ts';
import { FAILURE_CRITERION_IDS } from '../readiness/trial-failure.ts';
import { SUPPORT_IDS, type SupportId, supportEntry } from '../support/catalogue.ts';
import { Day, Id, Instant, Note, Reason } from './instant.ts';

type FieldTable = Record<string, Parameters<typeof numberSchema>[0]>;

function optionalNumbers<T extends FieldTable>(fields: T) {
  const shape = Object.fromEntries(
    Object.entries(fields).map(([key, field]) => [key, numberSchema(field).optional()]),
  );
  return z.strictObject(shape as { [K in keyof T]: z.ZodOptional<z.ZodNumber> });
}

function optionalLimits<T extends FieldTable>(fields: T) {
  const shape = Object.fromEntries(
    Object.entries(fields).map(([key, field]) => [
      key,
      z.union([z.literal('off'), numberSchema(field)]).optional(),
    ]),
  );
  return z.strictObject(
    shape as { [K in keyof T]: z.ZodOptional<z.ZodUnion<[z.ZodLiteral<'off'>, z.ZodNumber]>> },
  );
}

/** What every recorded fact carries beside its values. */
const envelope = {
  observedAt: Instant,
  /** Keys of unusual values about which the person was asked, and kept. */
  confirmedUnusual: z.array(z.string().max(40)).max(30).optional(),
  note: Note.optional(),
};

export const MASK_INTERFACES = ['full-face', 'oronasal', 'nasal', 'helmet'] as const;

export const Support = z.enum(SUPPORT_IDS as [SupportId, ...SupportId[]], {
  error: (issue) => `mode must be one of ${SUPPORT_IDS.join(', ')}, not ${JSON.stringify(issue.input)}`,
});

/** One patient–ventilator check: what is set, what is read, which limits stand. */
export const Check = z
  .strictObject({
    ...envelope,
    mode: Support,
    settings: optionalNumbers(SETTING_FIELDS),
    readings: optionalNumbers(READING_FIELDS).optional().default({}),
    limits: optionalLimits(LIMIT_FIELDS).optional().default({}),
    interface: z.enum(MASK_INTERFACES).optional(),
    /** Whether the patient made no effort while plateau and intrinsic PEEP were read. Missing: not recorded. */
    passive: z.boolean().optional(),
  })
  .superRefine((check, ctx) => {
    const entry = supportEntry(check.mode);
    const settable: readonly string[] = [...entry.required, ...entry.optional];
    for (const key of entry.required) {
      if (check.settings[key] === undefined) {
        const field = SETTING_FIELDS[key];
        ctx.addIssue({
          code: 'custom',
          path: ['settings', key],
          input: undefined,
          message: `${field.label} is needed in ${entry.shortName}: ${field.hard[0]} to ${field.hard[1]} ${field.unit}`,
        });
      }
    }
    for (const key of Object.keys(check.settings)) {
      if (!settable.includes(key)) {
        ctx.addIssue({
          code: 'custom',
          path: ['settings', key],
          input: check.settings[key as keyof typeof check.settings],
          message: `${entry.shortName} has no such setting; it takes ${settable.join(', ') || 'none'}`,
        });
      }
    }
    if (check.interface && !entry.wantsInterface) {
      ctx.addIssue({
        code: 'custom',
        path: ['interface'],
        input: check.interface,
        message: `${entry.shortName} has no mask`,
      });
    }
    for (const issue of pressureOrder(check)) {
      ctx.addIssue({
        code: 'custom',
        path: ['readings', issue.key],
        input: issue.value,
        message: issue.message,
      });
    }
  });
export type Check = z.infer<typeof Check>;

/** Pressures of one breath stand in order: PEEP, plateau, peak. Also used by the form while typing. */
export function pressureOrder({ settings, readings }: Pick<Check, 'settings' | 'readings'>) {
  const issues: { key: 'plateauCmH2O' | 'peakCmH2O'; value: number; message: string }[] = [];
  const { peakCmH2O: peak, plateauCmH2O: plateau } = readings;
  const peep = settings.peepCmH2O ?? settings.epapCmH2O ?? settings.cpapCmH2O;
  if (peak !== undefined && plateau !== undefined && plateau > peak) {
    issues.push({
      key: 'plateauCmH2O',
      value: plateau,
      message: `Plateau must be at most the peak pressure, ${peak} cmH2O, not ${plateau}`,
    });
  }
  if (peak !== undefined && peep !== undefined && peak < peep) {
    issues.push({
      key: 'peakCmH2O',
      value: peak,
      message: `Peak pressure must be at least PEEP, ${peep} cmH2O, not ${peak}`,
    });
  }
  if (plateau !== undefined && peep !== undefined && plateau < peep) {
    issues.push({
      key: 'plateauCmH2O',
      value: plateau,
      message: `Plateau must be at least PEEP, ${peep} cmH2O, not ${plateau}`,
    });
  }
  return issues;
}

export const GAS_SITES = ['arterial', 'venous', 'capillary'] as const;

/** A blood gas; `observedAt` is when it was drawn. */
export const Gas = z.strictObject({
  ...envelope,
  site: z.enum(GAS_SITES),
  ph: numberSchema(GAS_FIELDS.ph),
  pco2MmHg: numberSchema(GAS_FIELDS.pco2MmHg),
  po2MmHg: numberSchema(GAS_FIELDS.po2MmHg),
  bicarbonateMmolL: numberSchema(GAS_FIELDS.bicarbonateMmolL).optional(),
  baseExcessMmolL: numberSchema(GAS_FIELDS.baseExcessMmolL).optional(),
  sao2Percent: numberSchema(GAS_FIELDS.sao2Percent).optional(),
  lactateMmolL: numberSchema(GAS_FIELDS.lactateMmolL).optional(),
  hbGL: numberSchema(GAS_FIELDS.hbGL).optional(),
  /** As breathed when the gas was drawn; without it there is no P/F. */
  fio2Percent: numberSchema(GAS_FIELDS.fio2Percent).optional(),
  peepCmH2O: numberSchema(GAS_FIELDS.peepCmH2O).optional(),
});
export type Gas = z.infer<typeof Gas>;

export const AIRWAY_KINDS = ['oral-tube', 'nasal-tube', 'tracheostomy', 'laryngeal-mask'] as const;
export type AirwayKind = (typeof AIRWAY_KINDS)[number];
export const DEPTH_MARKS = ['lip', 'teeth', 'nostril', 'flange'] as const;

/** A device put into the airway (`observedAt`: when placed), or taken out. */
export const Airway = z.discriminatedUnion('event', [
  z.strictObject({
    ...envelope,
    event: z.literal('placed'),
    kind: z.enum(AIRWAY_KINDS),
    sizeMm: numberSchema(AIRWAY_FIELDS.sizeMm),
    /** Depth at which it was secured, at the mark. A tracheostomy has none. */
    depthCm: numberSchema(AIRWAY_FIELDS.depthCm).optional(),
    depthMark: z.enum(DEPTH_MARKS).optional(),
    cuffed: z.boolean(),
    subglotticPort: z.boolean().optional(),
  }),
  z.strictObject({ ...envelope, event: z.literal('removed') }),
]);
export type Airway = z.infer<typeof Airway>;

export const CUFF_METHODS = ['manometer', 'minimal-leak', 'automatic'] as const;
export const TUBE_POSITIONS = ['left', 'centre', 'right'] as const;

export const AirwayCheck = z
  .strictObject({
    ...envelope,
    depthCm: numberSchema(AIRWAY_FIELDS.depthCm).optional(),
    cuffCmH2O: numberSchema(AIRWAY_FIELDS.cuffCmH2O).optional(),
    cuffMethod: z.enum(CUFF_METHODS).optional(),
    position: z.enum(TUBE_POSITIONS).optional(),
    secured: z.boolean().optional(),
  })
  .refine(
    (check) => [check.depthCm, check.cuffCmH2O, check.position, check.secured].some((v) => v !== undefined),
    {
      error: 'an airway check needs at least one of depthCm, cuffCmH2O, position, secured',
    },
  );
export type AirwayCheck = z.infer<typeof AirwayCheck>;

/** Points in time that change what comes next. Those with `support` also change what the patient breathes with. */
export const HAPPENING_KINDS = {
  intubated: { label: 'Intubated', support: false },
  'extubated-planned': { label: 'Extubated, planned', support: true },
  'extubated-unplanned': { label: 'Extubated, unplanned', support: true },
  reintubated: { label: 'Reintubated', support: false },
  tracheostomy: { label: 'Tracheostomy', support: false },
  proned: { label: 'Turned prone', support: false },
  supine: { label: 'Turned supine', support: false },
  'left-for-transport': { label: 'Left for transport', support: false },
  'back-from-transport': { label: 'Back from transport', support: false },
  screened: { label: 'Screened for readiness', support: false },
  'trial-started': { label: 'Breathing trial started', support: false },
  'trial-passed': { label: 'Breathing trial passed', support: false },
  'trial-failed': { label: 'Breathing trial failed', support: false },
  'circuit-changed': { label: 'Circuit changed', support: false },
  'machine-swapped': { label: 'Ventilator swapped', support: false },
} as const;
export type HappeningKind = keyof typeof HAPPENING_KINDS;
const happeningKinds = Object.keys(HAPPENING_KINDS) as [HappeningKind, ...HappeningKind[]];

export const TRIAL_METHODS = {
  'pressure-support': 'Pressure support',
  't-piece': 'T-piece',
  cpap: 'CPAP',
} as const;
export type TrialMethod = keyof typeof TRIAL_METHODS;
export const TRIAL_METHOD_IDS = Object.keys(TRIAL_METHODS) as [TrialMethod, ...TrialMethod[]];

/** What a person found at the bed when screening; an item that was not judged is left out. */
const ScreenAnswers = z
  .strictObject(
    Object.fromEntries(SCREEN_ANSWER_KEYS.map((key) => [key, z.boolean().optional()])) as Record<
      ScreenAnswerKey,
      z.ZodOptional<z.ZodBoolean>
    >,
  )
  .refine((answers) => Object.values(answers).some((answer) => answer !== undefined), {
    error: `a screen needs at least one answer of ${SCREEN_ANSWER_KEYS.join(', ')}`,
  });

export const Happening = z
  .strictObject({
    ...envelope,
    kind: z.enum(happeningKinds),
    /** For an extubation: what the patient breathes with from then on. */
    toSupport: Support.optional(),
    /** For a transport: where to. For a failed trial: why, in own words. */
    detail: Note.optional(),
    /** For a trial that starts: on what, and for how long it is meant. */
    method: z.enum(TRIAL_METHOD_IDS).optional(),
    plannedMinutes: numberSchema(TRIAL_FIELDS.plannedMinutes).optional(),
    /** For a trial that was passed: how long it went on. */
    minutes: numberSchema(TRIAL_FIELDS.minutes).optional(),
    /** For a failed trial: the published criteria that were met. */
    criteria: z
      .array(z.enum(FAILURE_CRITERION_IDS))
      .min(1)
      .max(FAILURE_CRITERION_IDS.length)
      .refine((ids) => new Set(ids).size === ids.length, { error: 'names a criterion twice' })
      .optional(),
    /** For a screen: what the record cannot know. */
    screen: ScreenAnswers.optional(),
  })
  .superRefine((happening, ctx) => {
    const fault = (path: string, message: string, input: unknown = undefined) =>
      ctx.addIssue({ code: 'custom', path: [path], input, message });
    const { label, support: needsSupport } = HAPPENING_KINDS[happening.kind];
    if (needsSupport && !happening.toSupport) {
      fault('toSupport', `an extubation needs the support that follows: ${SUPPORT_IDS.join(', ')}`);
    }
    if (!needsSupport && happening.toSupport) {
      fault('toSupport', `${label} does not change the support`, happening.toSupport);
    }
    for (const [key, kind] of ONLY_OF) {
      if (happening[key] !== undefined && happening.kind !== kind) {
        fault(key, `belongs to "${HAPPENING_KINDS[kind].label}" only`, happening[key]);
      }
    }
    if (happening.kind === 'trial-failed' && !happening.detail && !happening.criteria) {
      fault('detail', 'a failed trial needs its reason: a published criterion, or a detail in words');
    }
    if (happening.kind === 'screened' && !happening.screen) {
      fault('screen', `a screen needs at least one answer of ${SCREEN_ANSWER_KEYS.join(', ')}`);
    }
  });

const ONLY_OF = [
  ['method', 'trial-started'],
  ['plannedMinutes', 'trial-started'],
  ['minutes', 'trial-passed'],
  ['criteria', 'trial-failed'],
  ['screen', 'screened'],
] as const satisfies readonly (readonly [string, HappeningKind])[];
export type Happening = z.infer<typeof Happening>;

/**
 * Somebody has looked at a flag. It names what the flag rested on, so that it holds for these values and no
 * others; it takes nothing away, and is not taken away itself.
 */
export const Acknowledgement = z.strictObject({
  observedAt: Instant,
  flagId: z.string().min(1).max(80),
  fingerprint: z.string().min(1).max(600),
  note: Note.min(3, { error: 'a note of at least 3 letters is needed' }),
});
export type Acknowledgement = z.infer<typeof Acknowledgement>;

/** The farthest that a unit's calendar runs ahead of UTC; and how long ago a day may be, so that a slip in the year is caught. */
const FARTHEST_ZONE_MS = 14 * 3_600_000;
const FARTHEST_DAY_MS = 366 * 86_400_000;

/** A sign of infection, or a day of treatment, entered by hand for surveillance. `day` is the unit's calendar day. */
export const InfectionSign = z
  .discriminatedUnion('sign', [
    z.strictObject({
      ...envelope,
      sign: z.literal('temperature'),
      temperatureC: numberSchema(SIGN_FIELDS.temperatureC),
    }),
    z.strictObject({
      ...envelope,
      sign: z.literal('white-cells'),
      whiteCellsPerMm3: numberSchema(SIGN_FIELDS.whiteCellsPerMm3),
    }),
    /** One agent, given on one day. */
    z.strictObject({
      ...envelope,
      sign: z.literal('antimicrobial'),
      agent: z.string().trim().min(2, { error: 'the name of the agent is needed' }).max(60),
      day: Day,
    }),
    /** A day wholly on extracorporeal support. */
    z.strictObject({ ...envelope, sign: z.literal('extracorporeal'), day: Day }),
  ])
  .superRefine((entry, ctx) => {
    if (!('day' in entry) || ctx.issues.length > 0) return;
    const dayAt = (ms: number) => new Date(Date.parse(entry.observedAt) + ms).toISOString().slice(0, 10);
    if (entry.day >= dayAt(-FARTHEST_DAY_MS) && entry.day <= dayAt(FARTHEST_ZONE_MS)) return;
    ctx.addIssue({
      code: 'custom',
      path: ['day'],
      input: entry.day,
      message: `Day must be in the year before the time of the entry and not after it, not ${entry.day}`,
    });
  });
export type InfectionSign = z.infer<typeof InfectionSign>;
export const INFECTION_SIGNS = ['temperature', 'white-cells', 'antimicrobial', 'extracorporeal'] as const;
export type InfectionSignKind = (typeof INFECTION_SIGNS)[number];

/** Kinds of fact that a person records on a stay, by the last part of their route. */
export const RECORDED_KINDS = {
  check: { path: 'checks', label: 'Check', schema: Check },
  gas: { path: 'gases', label: 'Gas', schema: Gas },
  airway: { path: 'airways', label: 'Airway', schema: Airway },
  'airway-check': { path: 'airway-checks', label: 'Airway check', schema: AirwayCheck },
  happening: { path: 'happenings', label: 'Happening', schema: Happening },
  'infection-sign': { path: 'infection-signs', label: 'Infection sign', schema: InfectionSign },
} as const;
export type RecordedKind = keyof typeof RECORDED_KINDS;

/** Amend: the whole corrected fact, or struck out as entered in error. The first value stays readable. */
export const Amendment = z.discriminatedUnion('as', [
  z.strictObject({ as: z.literal('corrected'), reason: Reason, body: z.record(z.string(), z.unknown()) }),
  z.strictObject({ as: z.literal('struck'), reason: Reason }),
]);
export type Amendment = z.infer<typeof Amendment>;

export const SOURCES = ['hand', 'feed', 'import'] as const;

/** One fact as it stands in the record. */
export const RecordEntry = z.object({
  observationId: Id,
  kind: z.enum([
    'check',
    'gas',
    'airway',
    'airway-check',
    'happening',
    'infection-sign',
    'acknowledgement',
    'details',
    'place',
  ]),
  observedAt: z.string(),
  recordedAt: z.string(),
  recordedBy: z.object({ personId: Id, displayName: z.string(), initials: z.string() }),
  source: z.enum(SOURCES),
  /** The fact that this one amends, and why. */
  amends: z.object({ observationId: Id, reason: z.string(), as: z.enum(['corrected', 'struck']) }).nullable(),
  /** The later fact that amends this one; then it no longer counts. */
  amendedBy: Id.nullable(),
  body: z.record(z.string(), z.unknown()),
});
export type RecordEntry = z.infer<typeof RecordEntry>;
