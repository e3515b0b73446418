import type { StayPlan } from '../plan.ts';
import { ORCHARD_FAR_PLANS } from './orchard-far.ts';
import { ORCHARD_NEAR_PLANS } from './orchard-near.ts';

/** Orchard: the largest unit. Beds 09 and 18 are closed, 13 and 22 empty. */
export const ORCHARD_PLANS: StayPlan[] = [...ORCHARD_NEAR_PLANS, ...ORCHARD_FAR_PLANS];
