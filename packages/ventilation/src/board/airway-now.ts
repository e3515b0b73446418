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
 * How the device was last found. Until its first check that is its placement, with the depth at which
 * it was secured; a check of an earlier device says nothing about this one.
 */
export function airwayNow({ airway, airwayCheck }: StayFacts, device: BedStay['device']): BedAirway | null {
  if (!device || !airway) return null;
  const checked = airwayCheck && airwayCheck.observedAt >= device.placedAt ? airwayCheck : null;
  const { observationId, observedAt, recordedAt, recordedByInitials } = checked ?? airway;
  return {
    observationId,
    observedAt,
    recordedAt,
    recordedByInitials,
    changedSinceAt: null,
    depthCm: checked ? (checked.body.depthCm ?? null) : device.depthCm,
    cuffCmH2O: checked?.body.cuffCmH2O ?? null,
    cuffMethod: checked?.body.cuffMethod ?? null,
    position: checked?.body.position ?? null,
    secured: checked?.body.secured ?? null,
  };
}
