import type { BedGas } from '../contract/board.ts';
import { pfRatio } from '../oxygenation/pf-ratio.ts';
import { ventilatoryRatio } from '../physiology/ventilatory-ratio.ts';

/** As much of a gas as can be reckoned with. */
export type GasToDerive = { site: string; pco2MmHg: number; po2MmHg: number; fio2Percent?: number };

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
}): Pick<BedGas, 'pfMmHg' | 'ventilatoryRatio'> {
  if (site !== 'arterial') return { pfMmHg: null, ventilatoryRatio: null };
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
  };
}
