/**
 * The limits of the readiness screen.
 *
 * @source Boles JM et al., Eur Respir J 2007;29:1033–56, table 4, as modified in later cohorts. Vital capacity and
 *   maximal inspiratory pressure stand in the list too; they are seldom measured, and are left to the bedside.
 */
export const SCREENING_LIMITS = {
  saturationAbovePercent: 90,
  fio2AtMostPercent: 40,
  pfFromMmHg: 150,
  peepAtMostCmH2O: 8,
  rateAtMostPerMin: 35,
  vtAboveMlPerKg: 5,
  rsbiAtMostPerMinL: 105,
  heartRateAtMostPerMin: 140,
  systolicMmHg: [90, 160],
  temperatureCelsius: [36, 38],
} as const;

type Value = number | null | undefined;

/**
 * Whether blood is oxygenated enough to try: a saturation above 90 % on at most 40 % oxygen, or a P/F of at
 * least 150. Null where what is known does not settle it.
 */
export function oxygenationMet({
  saturationPercent,
  fio2Percent,
  pfMmHg,
}: {
  saturationPercent: Value;
  fio2Percent: Value;
  pfMmHg: Value;
}): boolean | null {
  const { saturationAbovePercent, fio2AtMostPercent, pfFromMmHg } = SCREENING_LIMITS;
  const parts = [
    said(saturationPercent, (value) => value > saturationAbovePercent),
    said(fio2Percent, (value) => value <= fio2AtMostPercent),
  ];
  const bySaturation = parts.includes(false) ? false : parts.includes(null) ? null : true;
  const byRatio = said(pfMmHg, (value) => value >= pfFromMmHg);
  if (bySaturation || byRatio) return true;
  return bySaturation === false && byRatio === false ? false : null;
}

function said(value: Value, test: (value: number) => boolean): boolean | null {
  return value === null || value === undefined ? null : test(value);
}
