/** Oxygen in air as every bedside blend is reckoned. */
export const OXYGEN_IN_AIR = 0.21;
