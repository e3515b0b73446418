import type { Range } from './require-number.ts';

/** The conventional millimetre of mercury, 133.322387415 Pa. */
export const KPA_PER_MMHG = 0.133322387415;

/** The conventional centimetre of water, 98.0665 Pa. */
export const HPA_PER_CMH2O = 0.980665;

/** Partial and airway pressures here are never below zero. */
export const PRESSURE_RANGE: Range = [0, 100_000];
