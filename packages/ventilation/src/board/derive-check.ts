import type { BedCheck, CheckDerived } from '../contract/board.ts';
import { drivingPressure } from '../mechanics/driving-pressure.ts';
import { staticCompliance } from '../mechanics/static-compliance.ts';
import { roxIndex } from '../oxygenation/rox-index.ts';
import { minuteVentilation } from '../physiology/minute-ventilation.ts';
import { rapidShallowBreathingIndex } from '../physiology/rapid-shallow-breathing-index.ts';
import { tidalVolumePerKg } from '../physiology/tidal-volume-per-kg.ts';
import { type SupportId, supportEntry } from '../support/catalogue.ts';
import { mechanicalPowerOf } from './mechanical-power-of.ts';
import { wasPassive } from './passive-breath.ts';

export type CheckToDerive = Pick<BedCheck, 'mode' | 'settings' | 'readings' | 'passive'>;

/** Modes through a tube in which every breath is the patient's own; a mask leaks too much for the index. */
const BREATHES_ALONE: readonly SupportId[] = ['psv', 'cpap', 'tpiece', 'trach-collar'];

/** mL/cmH2O; five times that of healthy lungs, and the most that a time constant is reckoned from. */
const LARGEST_COMPLIANCE = 500;

/**
 * What one check implies. Pure, unrounded; null where an input was not recorded, where the mode gives the
 * quantity no meaning, or where it cannot exist (a plateau that is not above total PEEP). Never throws on a
 * check that its schema lets through, so that no calculation can keep a save from being kept.
 *
 * @param input.predictedBodyWeightKg kg; null without sex or height, and then nothing is judged per kg.
 */
export function deriveCheck({
  check,
  predictedBodyWeightKg,
}: {
  check: CheckToDerive;
  predictedBodyWeightKg: number | null;
}): CheckDerived {
  const tidalVolumeMl = tidalVolumeOf(check);
  return {
    vtPerKgMl:
      tidalVolumeMl === null || predictedBodyWeightKg === null
        ? null
        : tidalVolumePerKg({ tidalVolumeMl, predictedBodyWeightKg }),
    ...pausePressures({ check, tidalVolumeMl }),
    mechanicalPowerJMin: mechanicalPowerOf({ check, tidalVolumeMl }),
    minuteVolumeLMin: minuteVolumeOf(check),
    roxIndex: roxOf(check),
    rsbiPerMinL: rsbiOf(check),
  };
}

/**
 * The volume of a breath as it came back; the set volume stands in for it only where the ventilator fixes it.
 * Oscillation and plain oxygen have no such volume, whatever was typed.
 */
export function tidalVolumeOf({ mode, settings, readings }: CheckToDerive): number | null {
  if (mode === 'aprv') return readings.vtReleaseMl ?? null;
  const { control, readings: wanted } = supportEntry(mode);
  if (!wanted.includes('vtExhaledMl')) return null;
  return readings.vtExhaledMl ?? (control === 'volume' ? (settings.vtSetMl ?? null) : null);
}

/** Total PEEP is what is set and what is trapped above it; trapped gas that nobody measured adds nothing. */
function pausePressures({ check, tidalVolumeMl }: { check: CheckToDerive; tidalVolumeMl: number | null }) {
  const { plateauCmH2O, intrinsicPeepCmH2O } = check.readings;
  const { peepCmH2O } = check.settings;
  if (!wasPassive(check) || plateauCmH2O === undefined || peepCmH2O === undefined) {
    return { drivingPressureCmH2O: null, staticComplianceMlCmH2O: null };
  }
  const pause = { plateauCmH2O, totalPeepCmH2O: peepCmH2O + (intrinsicPeepCmH2O ?? 0) };
  return {
    drivingPressureCmH2O: drivingPressure(pause),
    staticComplianceMlCmH2O:
      tidalVolumeMl === null ? null : asLung(staticCompliance({ tidalVolumeMl, ...pause })),
  };
}

/** Where plateau and PEEP are all but equal, the quotient is not the compliance of any lung. */
function asLung(complianceMlCmH2O: number | null): number | null {
  return complianceMlCmH2O !== null && complianceMlCmH2O > LARGEST_COMPLIANCE ? null : complianceMlCmH2O;
}

/** As read, or rate times volume where all breaths are alike; breaths of two kinds cannot be multiplied so. */
function minuteVolumeOf({ mode, readings }: CheckToDerive): number | null {
  const { minuteVolumeLMin, rateTotalPerMin, vtExhaledMl } = readings;
  if (minuteVolumeLMin !== undefined) return minuteVolumeLMin;
  const { kind, sequence } = supportEntry(mode);
  const alike = sequence === 'CMV' || sequence === 'CSV' || kind === 'mask';
  if (!alike || rateTotalPerMin === undefined || vtExhaledMl === undefined) return null;
  return minuteVentilation({ ratePerMin: rateTotalPerMin, tidalVolumeMl: vtExhaledMl });
}

function roxOf({ mode, settings, readings }: CheckToDerive): number | null {
  const { rateTotalPerMin, spo2Percent } = readings;
  const { fio2Percent } = settings;
  if (mode !== 'hfnc' || fio2Percent === undefined || spo2Percent === undefined) return null;
  // Without a breath there is no index; zero would divide.
  if (rateTotalPerMin === undefined || rateTotalPerMin < 1) return null;
  return roxIndex({ spo2Percent, fio2: fio2Percent / 100, ratePerMin: rateTotalPerMin });
}

function rsbiOf({ mode, readings }: CheckToDerive): number | null {
  const { rateTotalPerMin } = readings;
  const tidalVolumeMl = readings.vtSpontaneousMl ?? readings.vtExhaledMl;
  if (!BREATHES_ALONE.includes(mode) || tidalVolumeMl === undefined) return null;
  if (rateTotalPerMin === undefined || rateTotalPerMin < 1) return null;
  return rapidShallowBreathingIndex({ ratePerMin: rateTotalPerMin, tidalVolumeMl });
}
