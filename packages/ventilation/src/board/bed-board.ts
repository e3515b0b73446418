import type { Bed, BedAssignment, BedPlace, BedStay } from '../contract/board.ts';
import { bedFlags } from '../flags/bed-flags.ts';
import { predictedBodyWeight } from '../physiology/predicted-body-weight.ts';
import { ladderFor, type Policy } from '../policy/policy.ts';
import { supportEntry } from '../support/catalogue.ts';
import { acknowledgedFlags } from './acknowledged-flags.ts';
import { airwayNow, deviceNow } from './airway-now.ts';
import { deriveCheck } from './derive-check.ts';
import { deriveGas } from './derive-gas.ts';
import type { StayFacts } from './facts.ts';
import { latestOf } from './latest-of.ts';
import { lastTrialOf, screenNow, trialNow } from './readiness-row.ts';
import { settingsChangedAfter } from './settings-changed-after.ts';

/**
 * A bed's board row, from the facts of the stay in it. Pure and without a clock: it holds the times of
 * things and never their ages, so the same row is right at any later moment until a fact changes.
 */
export function bedBoard({
  place,
  revision,
  facts,
  policy,
  assignments,
  ventilator,
}: {
  place: BedPlace;
  revision: number;
  facts: StayFacts | null;
  policy: Policy;
  assignments: BedAssignment[];
  ventilator: Bed['ventilator'];
}): Bed {
  return { ...place, revision, stay: facts ? stayRow(facts, policy) : null, assignments, ventilator };
}

function stayRow(facts: StayFacts, policy: Policy): BedStay {
  const stay = withoutFlags(facts, policy);
  const flagsOf = (one: Omit<BedStay, 'flags'>) => bedFlags({ stay: one, thresholds: policy.thresholds });
  const flags = acknowledgedFlags({
    flags: flagsOf(stay),
    facts,
    flagsOf: (earlier) => flagsOf(withoutFlags(earlier, policy)),
  });
  return { ...stay, flags };
}

function withoutFlags(facts: StayFacts, policy: Policy): Omit<BedStay, 'flags'> {
  const { patient, difficultAirway, precautions, careLimits, orders } = facts.details;
  const predictedBodyWeightKg = weightOf(patient);
  const check = checkRow(facts, predictedBodyWeightKg);
  const device = deviceNow(facts);
  return {
    stayId: facts.stayId,
    version: facts.version,
    admittedAt: facts.admittedAt,
    patient,
    predictedBodyWeightKg,
    difficultAirway,
    precautions,
    careLimits,
    orders,
    support: facts.support
      ? {
          id: facts.support.id,
          shortName: supportEntry(facts.support.id).shortName,
          sinceAt: facts.support.sinceAt,
        }
      : null,
    ...courseOf(facts),
    trial: trialNow(facts),
    lastTrial: lastTrialOf(facts),
    screen: screenNow(facts, policy.thresholds.screenHoldsHours),
    check,
    device,
    airway: airwayNow(facts, device),
    gas: gasRow(facts, predictedBodyWeightKg, policy.freshness.check.withdrawFrom),
    ladder: ladderFor(policy.freshness, orders),
    plateauLimitCmH2O: policy.thresholds.plateauHighCmH2O,
    withdrawn: { check: null, airway: null, gas: null },
  };
}

/** Null without sex or height, and where the formula gives no weight: then nothing is judged per kg. */
function weightOf({ sex, heightCm }: StayFacts['details']['patient']): number | null {
  return sex === null || heightCm === null ? null : predictedBodyWeight({ sex, heightCm });
}

function checkRow(facts: StayFacts, predictedBodyWeightKg: number | null): BedStay['check'] {
  const latest = facts.checks[0];
  if (!latest) return null;
  const { observationId, observedAt, recordedAt, recordedByInitials, body } = latest;
  const passive = body.passive ?? null;
  return {
    observationId,
    observedAt,
    recordedAt,
    recordedByInitials,
    changedSinceAt: supportChangedAfter(facts, observedAt),
    mode: body.mode,
    settings: defined(body.settings),
    readings: defined(body.readings),
    limits: defined(body.limits),
    interface: body.interface ?? null,
    passive,
    derived: deriveCheck({
      check: { mode: body.mode, settings: defined(body.settings), readings: defined(body.readings), passive },
      predictedBodyWeightKg,
    }),
  };
}

/** An extubation after the check: the check was true, but not of what the patient breathes with now. */
function supportChangedAfter(facts: StayFacts, observedAt: string): string | null {
  return (
    facts.happenings.find((fact) => fact.body.toSupport !== undefined && fact.observedAt > observedAt)
      ?.observedAt ?? null
  );
}

function gasRow(
  facts: StayFacts,
  predictedBodyWeightKg: number | null,
  withinMinutes: number,
): BedStay['gas'] {
  const { gas } = facts;
  if (!gas) return null;
  const { observationId, observedAt, recordedAt, recordedByInitials, body } = gas;
  const { observedAt: _observedAt, confirmedUnusual: _confirmed, note: _note, site, ...values } = body;
  return {
    observationId,
    observedAt,
    recordedAt,
    recordedByInitials,
    changedSinceAt: settingsChangedAfter(facts, {
      observedAt,
      fio2Percent: body.fio2Percent,
      peepCmH2O: body.peepCmH2O,
    }),
    site,
    values: defined(values),
    ...deriveGas({
      gas: body,
      predictedBodyWeightKg,
      minuteVolumeLMin: minuteVolumeAt(facts, observedAt, withinMinutes),
    }),
  };
}

/**
 * The minute volume that a gas may be held against: of the last check before it, if that was through a
 * tube, no older than a check may be shown, and the support was not changed between the two.
 */
function minuteVolumeAt(
  { checks, happenings }: StayFacts,
  drawnAt: string,
  withinMinutes: number,
): number | null {
  const check = checks.find(({ observedAt }) => observedAt <= drawnAt);
  if (!check || supportEntry(check.body.mode).kind !== 'invasive') return null;
  if (Date.parse(drawnAt) - Date.parse(check.observedAt) >= withinMinutes * 60_000) return null;
  const isOther = happenings.some(
    ({ body, observedAt }) =>
      body.toSupport !== undefined && observedAt > check.observedAt && observedAt <= drawnAt,
  );
  return isOther ? null : (check.body.readings.minuteVolumeLMin ?? null);
}

function courseOf({ happenings }: StayFacts): Pick<BedStay, 'proneSinceAt' | 'away'> {
  const position = latestOf(happenings, ['proned', 'supine']);
  const transport = latestOf(happenings, ['left-for-transport', 'back-from-transport']);
  return {
    proneSinceAt: position?.body.kind === 'proned' ? position.observedAt : null,
    away:
      transport?.body.kind === 'left-for-transport'
        ? { sinceAt: transport.observedAt, to: transport.body.detail ?? null }
        : null,
  };
}

/** Only the keys that were recorded: a missing reading is missing, not undefined and not zero. */
function defined<Value>(values: Record<string, Value | undefined>): Record<string, Value> {
  const kept: Record<string, Value> = {};
  for (const [key, value] of Object.entries(values)) if (value !== undefined) kept[key] = value;
  return kept;
}
