import type { Policy } from '../policy/policy.ts';

/**
 * Where a cuff pressure stands against the unit's band, both ends included.
 *
 * @source 20 to 30 cmH2O by default: consensus, below the pressure that stops the flow in the tracheal wall.
 */
export function cuffBand({
  cuffCmH2O,
  thresholds: { cuffLowCmH2O, cuffHighCmH2O },
}: {
  cuffCmH2O: number;
  thresholds: Pick<Policy['thresholds'], 'cuffLowCmH2O' | 'cuffHighCmH2O'>;
}): 'below' | 'within' | 'above' {
  if (cuffCmH2O < cuffLowCmH2O) return 'below';
  return cuffCmH2O > cuffHighCmH2O ? 'above' : 'within';
}
