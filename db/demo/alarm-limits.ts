import type { LimitKey } from '@windrow/ventilation/entry/fields';
import { supportEntry } from '@windrow/ventilation/support/catalogue';
import type { Readings, Settings } from './breath.ts';
import type { Phase } from './plan.ts';

/** Alarm limits around the readings, as teaching texts have them: peak + 10, volume − 100, minute volume ± 3 to 5, 20 s. */
export function alarmLimits({
  mode,
  settings,
  readings,
}: {
  mode: Phase['mode'];
  settings: Settings;
  readings: Readings;
}): Partial<Record<LimitKey, number>> {
  const { limits } = supportEntry(mode);
  const peak = readings.peakCmH2O ?? settings.ipapCmH2O ?? settings.pHighCmH2O ?? 20;
  const volume = readings.vtReleaseMl ?? readings.vtExhaledMl ?? 400;
  const minute = Math.round(readings.minuteVolumeLMin ?? 8);
  const all: Record<LimitKey, number> = {
    highPressureCmH2O: Math.min(60, Math.max(30, peak + 10)),
    lowVtMl: Math.max(150, Math.round((volume - 120) / 10) * 10),
    lowMinuteVolumeLMin: Math.max(3, minute - 3),
    highMinuteVolumeLMin: minute + 5,
    highRatePerMin: Math.max(35, (readings.rateTotalPerMin ?? 0) + 8),
    apnoeaS: 20,
  };
  const kept: Partial<Record<LimitKey, number>> = {};
  for (const key of limits) kept[key] = all[key];
  return kept;
}
