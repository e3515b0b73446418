import type { BedGas } from '../contract/board.ts';
import { pfRatio } from '../oxygenation/pf-ratio.ts';
import { ventilatoryRatio } from '../physiology/ventilatory-ratio.ts';

/** As much of a gas as can be reckoned with. */
export type GasToDerive = { site: string; pco2MmHg: number; po2MmHg: number; fio2Percent?: number };

export type GasDerived = Pick<BedGas, 'pfMmHg' | 'ventilatoryRatio' | 'minuteVolumeAtDrawLMin'>;

/** Of a gas from which nothing can be had. */
export const NOTHING_DERIVED: GasDerived = {
  pfMmHg: null,
  ventilatoryRatio: null,
  minuteVolumeAtDrawLMin: null,
};

/**
 * What one gas implies. Only an arterial gas says how well oxygen crosses and carbon dioxide leaves: any
 * other site gives null, and so does an oxygen fraction that nobody recorded at the draw.
 *
 * @param input.predictedBodyWeightKg kg; null without sex or height.
 * @param input.minuteVolumeLMin exhaled minute volume as it stood at the draw, L/min.
 */
export function deriveGas({
  gas: { site, pco2MmHg, po2MmHg, fio2Percent },
  predictedBodyWeightKg,
  minuteVolumeLMin,
}: {
  gas: GasToDerive;
  predictedBodyWeightKg: number | null;
  minuteVolumeLMin: number | null;
}): GasDerived {
  if (site !== 'arterial') return NOTHING_DERIVED;
  return {
    pfMmHg: fio2Percent === undefined ? null : pfRatio({ pao2MmHg: po2MmHg, fio2: fio2Percent / 100 }),
    ventilatoryRatio:
      predictedBodyWeightKg === null || minuteVolumeLMin === null
        ? null
        : ventilatoryRatio({
            minuteVentilationLMin: minuteVolumeLMin,
            paco2MmHg: pco2MmHg,
            predictedBodyWeightKg,
          }),
    minuteVolumeAtDrawLMin: minuteVolumeLMin,
  };
}
