/** Apparent pK of carbonic acid in plasma. */
export const PK = 6.1;

/** CO2 dissolved in plasma, mmol/L per mmHg; analysers also use 0.0307, which moves pH by 0.010. */
export const CO2_SOLUBILITY = 0.03;
