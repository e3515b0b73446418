/** Joules in a litre moved against 1 cmH2O: 0.0980665, written 0.098 in the papers on mechanical power and kept so. */
export const JOULES_PER_L_CMH2O = 0.098;
