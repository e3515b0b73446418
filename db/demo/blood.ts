import { GAS_FIELDS, type GasKey } from '@windrow/ventilation/entry/fields';
import type { Lung } from './plan.ts';
import type { Random } from './random.ts';

const PK = 6.1;
const CO2_SOLUBILITY = 0.03;

/**
 * A gas that fits itself: pH follows from PCO2 and bicarbonate, the bicarbonate is then what an analyser would
 * print with that pH, and base excess and saturation follow.
 */
export function gasValues({
  lung,
  fio2Percent,
  random,
  isNewest,
}: {
  lung: Lung;
  fio2Percent: number;
  random: Random;
  /** The newest gas is exactly as the plan has it, so that what the board shows can be planned. */
  isNewest: boolean;
}): Partial<Record<GasKey, number>> {
  const sway = isNewest ? 0 : 1;
  const pco2MmHg = Math.round(lung.pco2MmHg + sway * random.around(2.5));
  const ph = round(
    PK + Math.log10((lung.hco3MmolL + sway * random.around(0.8)) / (CO2_SOLUBILITY * pco2MmHg)),
    'ph',
  );
  const bicarbonateMmolL = round(CO2_SOLUBILITY * pco2MmHg * 10 ** (ph - PK), 'bicarbonateMmolL');
  const po2MmHg = Math.max(
    38,
    Math.round(((lung.pfMmHg * fio2Percent) / 100) * (1 + sway * random.around(0.05))),
  );
  return {
    ph,
    pco2MmHg,
    po2MmHg,
    bicarbonateMmolL,
    baseExcessMmolL: round(0.9287 * (bicarbonateMmolL - 24.4 + 14.83 * (ph - 7.4)), 'baseExcessMmolL'),
    sao2Percent: Math.min(100, Math.round(saturationOf(po2MmHg))),
    lactateMmolL: round(ph < 7.3 ? 2.1 + random.next() * 1.6 : 0.8 + random.next() * 0.9, 'lactateMmolL'),
    hbGL: random.whole(82, 118),
  };
}

/**
 * Haemoglobin saturation of a PO2 at normal pH and temperature, %.
 *
 * @source Severinghaus JW, J Appl Physiol 1979;46:599–602.
 */
export function saturationOf(po2MmHg: number): number {
  return 100 / (23_400 / (po2MmHg ** 3 + 150 * po2MmHg) + 1);
}

function round(value: number, key: GasKey): number {
  const text = value.toFixed(GAS_FIELDS[key].decimals);
  return Number(text) === 0 ? 0 : Number(text);
}
