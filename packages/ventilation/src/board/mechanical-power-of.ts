import type { BedCheck } from '../contract/board.ts';
import { mechanicalPowerPressureControl } from '../mechanics/mechanical-power-pressure-control.ts';
import { mechanicalPowerVolumeControl } from '../mechanics/mechanical-power-volume-control.ts';
import { supportEntry } from '../support/catalogue.ts';
import { wasPassive } from './passive-breath.ts';

/**
 * Mechanical power of a check, by the form that fits what the mode controls; null where the forms do not
 * hold: breaths of two kinds, the patient's own effort, oscillation, no tube.
 *
 * In an adaptive mode the pressure above PEEP is not set but chosen by the ventilator: it is peak less PEEP,
 * as the breath is a square pressure wave.
 */
export function mechanicalPowerOf({
  check,
  tidalVolumeMl,
}: {
  check: Pick<BedCheck, 'mode' | 'settings' | 'readings' | 'passive'>;
  tidalVolumeMl: number | null;
}): number | null {
  const { control, sequence } = supportEntry(check.mode);
  const { rateTotalPerMin: ratePerMin, peakCmH2O, plateauCmH2O } = check.readings;
  const { peepCmH2O } = check.settings;
  if (sequence !== 'CMV' || !wasPassive(check)) return null;
  if (tidalVolumeMl === null || ratePerMin === undefined || peepCmH2O === undefined) return null;

  const breath = { ratePerMin, tidalVolumeMl, peepCmH2O };
  if (control === 'volume') {
    if (peakCmH2O === undefined || plateauCmH2O === undefined) return null;
    if (plateauCmH2O < peepCmH2O || plateauCmH2O > peakCmH2O) return null;
    return mechanicalPowerVolumeControl({ ...breath, peakCmH2O, plateauCmH2O });
  }
  const inspiratoryPressureCmH2O =
    control === 'adaptive-pressure' ? above(peakCmH2O, peepCmH2O) : check.settings.pInspCmH2O;
  if (inspiratoryPressureCmH2O === undefined) return null;
  return mechanicalPowerPressureControl({ ...breath, inspiratoryPressureCmH2O });
}

function above(peakCmH2O: number | undefined, peepCmH2O: number): number | undefined {
  return peakCmH2O === undefined || peakCmH2O < peepCmH2O ? undefined : peakCmH2O - peepCmH2O;
}
