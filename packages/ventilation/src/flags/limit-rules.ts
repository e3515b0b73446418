import type { BedCheck } from '../contract/board.ts';
import { LIMIT_FIELDS, type LimitKey, READING_FIELDS, type ReadingKey } from '../entry/fields.ts';
import { formatWithUnit } from '../format/number.ts';
import { supportEntry } from '../support/catalogue.ts';
import { chip, type Finding, type FlagRule, input } from './rule.ts';

const SOURCE =
  'common practice in teaching texts: in volume control the pressure limits guard, in pressure control the volume limits';

type AuditedLimit = {
  key: LimitKey;
  id: string;
  /** What it is called on a chip. */
  chip: string;
  side: 'high' | 'low';
  /** The readings that it guards; the first that was recorded is held against it. */
  guards: readonly ReadingKey[];
};

const LIMITS: readonly AuditedLimit[] = [
  { key: 'highPressureCmH2O', id: 'high-pressure', chip: 'P', side: 'high', guards: ['peakCmH2O'] },
  { key: 'lowVtMl', id: 'low-vt', chip: 'Vt', side: 'low', guards: ['vtExhaledMl', 'vtReleaseMl'] },
  {
    key: 'lowMinuteVolumeLMin',
    id: 'low-minute-volume',
    chip: 'MV',
    side: 'low',
    guards: ['minuteVolumeLMin'],
  },
  {
    key: 'highMinuteVolumeLMin',
    id: 'high-minute-volume',
    chip: 'MV',
    side: 'high',
    guards: ['minuteVolumeLMin'],
  },
  { key: 'highRatePerMin', id: 'high-rate', chip: 'Rate', side: 'high', guards: ['rateTotalPerMin'] },
  { key: 'apnoeaS', id: 'apnoea', chip: 'Apnoea', side: 'high', guards: [] },
];

/**
 * The limit audit: is each limit that the mode needs recorded, does it stand, and does it still guard what is
 * read. One row a limit and fault, so that two limits that are off are two flags.
 */
export const LIMIT_RULES: readonly FlagRule[] = [
  ...LIMITS.map((limit) =>
    rule({ id: `limit-off-${limit.id}`, find: (check) => limitOff({ check, limit }) }),
  ),
  ...LIMITS.map((limit) =>
    rule({ id: `limit-missing-${limit.id}`, find: (check) => limitMissing({ check, limit }) }),
  ),
  ...LIMITS.map((limit) =>
    rule({ id: `limit-passed-${limit.id}`, find: (check) => limitPassed({ check, limit }) }),
  ),
  rule({ id: 'limits-not-recorded', find: limitsNotRecorded }),
];

function rule({ id, find }: { id: string; find: (check: BedCheck) => Finding | null }): FlagRule {
  return { id, from: ['check'], source: SOURCE, find: ({ check }) => check && find(check) };
}

function limitOff({ check, limit }: { check: BedCheck; limit: AuditedLimit }): Finding | null {
  if (check.limits[limit.key] !== 'off' || !mustStand(check, limit.key)) return null;
  const { label } = LIMIT_FIELDS[limit.key];
  return {
    level: 'attention',
    short: limit.key === 'apnoeaS' ? 'Apnoea off' : chip(`${limit.chip} limit off`),
    sentence: `${label} is off; ${supportEntry(check.mode).shortName} must not run without it.`,
    ...restingOn(check, limit),
  };
}

/** Where other limits were written down, one that the mode must not run without is not forgotten but not set. */
function limitMissing({ check, limit }: { check: BedCheck; limit: AuditedLimit }): Finding | null {
  if (hasNoLimits(check) || check.limits[limit.key] !== undefined || !isDecisive(check, limit.key))
    return null;
  const { label } = LIMIT_FIELDS[limit.key];
  return {
    level: 'attention',
    short: limit.key === 'apnoeaS' ? 'Apnoea missing' : chip(`${limit.chip} limit missing`),
    sentence: `Other alarm limits are recorded and no ${inSentence(label)}; ${supportEntry(check.mode).shortName} must not run without it.`,
    ...restingOn(check, limit),
  };
}

/**
 * Of the limits that a mode needs, those that watch what it does not fix: pressure where the volume is set,
 * volume where the pressure is set, and that there is a breath where each is the patient's own. A tidal volume
 * tells sooner than a minute volume, so where one of the two stands the other is only noted.
 */
function isDecisive({ mode, limits }: BedCheck, key: LimitKey): boolean {
  const { requiredLimits } = supportEntry(mode);
  if (!requiredLimits.includes(key) || key === 'highRatePerMin') return false;
  return (
    key !== 'lowMinuteVolumeLMin' ||
    (!requiredLimits.includes('lowVtMl') && typeof limits.lowVtMl !== 'number')
  );
}

/** A fault of a limit is of what goes unguarded by it: the reading itself, the mode, and all that it leaves open. */
function restingOn(check: BedCheck, { guards }: AuditedLimit): Pick<Finding, 'inputs' | 'facts'> {
  const guarded = guards.find((reading) => check.readings[reading] !== undefined);
  const value = guarded && check.readings[guarded];
  return {
    inputs:
      guarded === undefined || value === undefined
        ? []
        : [input(READING_FIELDS[guarded].label, value, READING_FIELDS[guarded])],
    facts: leftOpen(check),
  };
}

function leftOpen({ mode, readings }: BedCheck): string[] {
  return [mode, ...supportEntry(mode).watched.map((key) => `${key}=${readings[key] ?? 'not read'}`)];
}

/** "Low exhaled Vt limit" within a sentence: only its first letter is small. */
function inSentence(label: string): string {
  return label.charAt(0).toLowerCase() + label.slice(1);
}

function hasNoLimits({ limits }: BedCheck): boolean {
  return Object.keys(limits).length === 0;
}

/** Limits that guard what the mode does not fix; and where each breath is the patient's own, that there is one. */
function mustStand({ mode }: BedCheck, key: LimitKey): boolean {
  const { requiredLimits, sequence } = supportEntry(mode);
  return requiredLimits.includes(key) || (key === 'apnoeaS' && sequence === 'CSV');
}

function limitPassed({ check, limit }: { check: BedCheck; limit: AuditedLimit }): Finding | null {
  const set = check.limits[limit.key];
  const guarded = limit.guards.find((reading) => check.readings[reading] !== undefined);
  const value = guarded && check.readings[guarded];
  if (typeof set !== 'number' || guarded === undefined || value === undefined) return null;
  if (limit.side === 'high' ? value < set : value > set) return null;
  const [reading, field] = [READING_FIELDS[guarded], LIMIT_FIELDS[limit.key]];
  return {
    level: 'attention',
    short: chip(`${limit.chip} past limit`),
    sentence: `${reading.label} is ${formatWithUnit(value, reading)}, at or past its own ${limit.side} limit of ${formatWithUnit(set, field)}.`,
    inputs: [input(reading.label, value, reading), input(field.label, set, field)],
  };
}

function limitsNotRecorded(check: BedCheck): Finding | null {
  const { requiredLimits, shortName } = supportEntry(check.mode);
  const none = hasNoLimits(check);
  const missing = requiredLimits.filter(
    (key) => check.limits[key] === undefined && (none || !isDecisive(check, key)),
  );
  if (missing.length === 0) return null;
  const names = missing.map((key) => inSentence(LIMIT_FIELDS[key].label)).join(' and ');
  return {
    level: 'note',
    short: none ? 'No limits noted' : 'Limit not noted',
    sentence: `Alarm limits not recorded with this check: ${shortName} needs the ${names}.`,
    inputs: [],
    facts: [...leftOpen(check), ...missing],
  };
}
