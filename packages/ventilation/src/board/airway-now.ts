import type { BedAirway, BedStay } from '../contract/board.ts';
import type { StayFacts } from './facts.ts';
import { latestOf } from './latest-of.ts';

/** The device in the airway now: the last one placed, unless it was removed or the patient extubated since. */
export function deviceNow({ airway, happenings }: StayFacts): BedStay['device'] {
  if (airway?.body.event !== 'placed') return null;
  const extubated = latestOf(happenings, ['extubated-planned', 'extubated-unplanned']);
  if (extubated && extubated.observedAt >= airway.observedAt) return null;
  const { kind, sizeMm, depthCm, depthMark, cuffed, subglotticPort } = airway.body;
  return {
    observationId: airway.observationId,
    placedAt: airway.observedAt,
    kind,
    sizeMm,
    cuffed,
    depthCm: depthCm ?? null,
    depthMark: depthMark ?? null,
    subglotticPort: subglotticPort ?? null,
  };
}

/**
 * How the device was last found: depth and cuff each from the newest check that recorded it, the rest
 * from the newest check. Until its first check that is its placement, with the depth at which it was
 * secured; a check of an earlier device says nothing about this one.
 *
 * The group is as old as the older of depth and cuff, so that a check of the position alone makes
 * neither of them young.
 */
export function airwayNow(
  { airway, airwayChecks }: Pick<StayFacts, 'airway' | 'airwayChecks'>,
  device: BedStay['device'],
): BedAirway | null {
  if (!device || !airway) return null;
  const checks = airwayChecks.filter(({ observedAt }) => observedAt >= device.placedAt);
  const latest = checks[0];
  const depth = checks.find(({ body }) => body.depthCm !== undefined);
  const cuff = checks.find(({ body }) => body.cuffCmH2O !== undefined);
  const { observationId, recordedAt, recordedByInitials } = latest ?? airway;
  const depthAt = device.depthCm === null && !depth ? null : (depth ?? airway).observedAt;
  const evidence = [depthAt, cuff?.observedAt].filter((at) => at !== null && at !== undefined).sort();
  return {
    observationId,
    observedAt: evidence[0] ?? (latest ?? airway).observedAt,
    recordedAt,
    recordedByInitials,
    changedSinceAt: null,
    depthCm: depth?.body.depthCm ?? device.depthCm,
    cuffCmH2O: cuff?.body.cuffCmH2O ?? null,
    cuffMethod: cuff?.body.cuffMethod ?? null,
    position: latest?.body.position ?? null,
    secured: latest?.body.secured ?? null,
  };
}
