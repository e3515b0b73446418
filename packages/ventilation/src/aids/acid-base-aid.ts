import { type AcidBaseReading, acidBaseReading } from '../acid-base/acid-base-reading.ts';
import { shownArterialGas } from '../board/present-facts.ts';
import type { BedStay } from '../contract/board.ts';
import { GAS_FIELDS } from '../entry/fields.ts';
import type { Aid, AidRule } from './aid.ts';
import { Collected } from './collect.ts';

export const ACID_BASE_RULE: AidRule = {
  rule: 'pH outside 7.35 to 7.45 names acidaemia or alkalaemia; its side of 7.40 decides which of PaCO2 (35 to 45 mmHg) and bicarbonate (22 to 26 mmol/L) is primary; compensation outside its band is a second disorder. Anion gap and course are not in it.',
  source: 'common practice; each rule of compensation with its own source',
};

/** The arterial gas in the words of acid and base. It is of the blood, so a later change of settings leaves it true. */
export function acidBaseAid(stay: BedStay): Aid<AcidBaseReading> {
  const { fact: gas, why } = shownArterialGas(stay);
  if (!gas) return { result: null, inputs: [], missing: [why] };
  const collected = new Collected();
  const { values } = gas;
  const ph = collected.need(values.ph, GAS_FIELDS.ph, gas, 'no pH in the gas');
  const paco2MmHg = collected.need(
    values.pco2MmHg,
    { ...GAS_FIELDS.pco2MmHg, label: 'PaCO2' },
    gas,
    'no PCO2 in the gas',
  );
  const given = collected.use(values.bicarbonateMmolL, GAS_FIELDS.bicarbonateMmolL, gas);
  if (ph === null || paco2MmHg === null) return { ...collected, result: null };
  return {
    ...collected,
    result: acidBaseReading({ ph, paco2MmHg, ...(given === null ? {} : { bicarbonateMmolL: given }) }),
  };
}
