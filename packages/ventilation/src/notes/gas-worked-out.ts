import type { BedGas, BedStay } from '../contract/board.ts';
import { type WorkedOut, workedOut } from './worked-out.ts';

type GasFacts = {
  gas: Pick<BedGas, 'values' | 'pfMmHg' | 'ventilatoryRatio' | 'minuteVolumeAtDrawLMin'>;
  predictedBodyWeightKg: number | null;
};

/** As `checkWorkedOut`, for what a gas implies. */
export function gasWorkedOut(
  key: 'pfMmHg' | 'ventilatoryRatio',
  { gas, predictedBodyWeightKg }: GasFacts,
): WorkedOut | null {
  if (gas[key] === null) return null;
  const { po2MmHg, pco2MmHg, fio2Percent } = gas.values;
  if (key === 'pfMmHg') {
    return workedOut('pfRatio', { pao2MmHg: po2MmHg, fio2: fio2Percent && fio2Percent / 100 });
  }
  return workedOut('ventilatoryRatio', {
    minuteVentilationLMin: gas.minuteVolumeAtDrawLMin,
    paco2MmHg: pco2MmHg,
    predictedBodyWeightKg,
  });
}

/** As `checkWorkedOut`, for the predicted body weight. */
export function weightWorkedOut(
  patient: Pick<NonNullable<BedStay['patient']>, 'sex' | 'heightCm'>,
): WorkedOut | null {
  return workedOut('predictedBodyWeight', { sex: patient.sex, heightCm: patient.heightCm });
}
