/**
 * How a breathing trial is made: half an hour to two hours, the first with a little pressure support.
 *
 * @source length: Esteban A et al., Am J Respir Crit Care Med 1999;159:512–8; method: Ouellette DR et al., Chest
 *   2017;151:166–80 (5 to 8 cmH2O from memory).
 */
export const TRIAL_PLAN = {
  minutes: [30, 120],
  pressureSupportCmH2O: [5, 8],
  firstMethod: 'pressure-support',
} as const;
