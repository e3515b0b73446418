/** @source CDC NHSN, ventilator-associated event protocol: above 38.0 or below 36.0 °C. */
export function isTemperatureSign(celsius: number): boolean {
  return celsius > 38 || celsius < 36;
}

/** @source CDC NHSN, ventilator-associated event protocol: at least 12,000 or at most 4,000 per mm³. */
export function isWhiteCellSign(perMm3: number): boolean {
  return perMm3 >= 12_000 || perMm3 <= 4000;
}
