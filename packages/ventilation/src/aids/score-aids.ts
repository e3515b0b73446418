import { presentArterialGas, presentCheck } from '../board/present-facts.ts';
import type { BedStay } from '../contract/board.ts';
import { GAS_FIELDS, READING_FIELDS, SETTING_FIELDS } from '../entry/fields.ts';
import { hacorScore } from '../scores/hacor-score.ts';
import { murrayScore } from '../scores/murray-score.ts';
import { respiratorySofa } from '../scores/respiratory-sofa.ts';
import { isOnVentilator, supportEntry } from '../support/catalogue.ts';
import type { Aid, AidRule } from './aid.ts';
import { Collected } from './collect.ts';

/** Points of a score. */
export type Points = { points: number };

export const MURRAY_RULE: AidRule = {
  rule: 'Mean of the points for quadrants on the film, P/F, PEEP and, where it is known, compliance; above 2.5 is severe.',
  source: 'Murray JF et al., Am Rev Respir Dis 1988;138:720–3',
};
export const SOFA_RULE: AidRule = {
  rule: 'P/F below 400, 300, 200 and 100 gives 1, 2, 3 and 4 points; 3 and 4 only with ventilation by tube or mask.',
  source: 'Vincent JL et al., Intensive Care Med 1996;22:707–10',
};
export const HACOR_RULE: AidRule = {
  rule: 'Heart rate, acidosis, consciousness, oxygenation and rate, summed; above 5 after an hour of mask ventilation is high risk.',
  source: 'Duan J et al., Intensive Care Med 2017;43:192–9',
};

const PF = { label: 'P/F', unit: 'mmHg', decimals: 0 } as const;
const COMPLIANCE = { label: 'Compliance', unit: 'mL/cmH2O', decimals: 0 } as const;
const NO_RATIO = 'the gas has no oxygen recorded with it';

/** @param input.quadrants of the chest film, as counted by a person; null: not yet. */
export function murrayAid({ stay, quadrants }: { stay: BedStay; quadrants: number | null }): Aid<Points> {
  const { collected, check, pfMmHg } = begun(stay);
  const peepCmH2O =
    check &&
    collected.need(check.settings.peepCmH2O, SETTING_FIELDS.peepCmH2O, check, 'no PEEP in the check');
  const complianceMlCmH2O = check && collected.use(check.derived.staticComplianceMlCmH2O, COMPLIANCE, check);
  if (quadrants === null) collected.lacks('the quadrants of the film: choose them here');
  if (quadrants === null || pfMmHg === null || peepCmH2O === null) return { ...collected, result: null };
  return {
    ...collected,
    result: { points: murrayScore({ quadrants, pfMmHg, peepCmH2O, complianceMlCmH2O }) },
  };
}

export function sofaAid(stay: BedStay): Aid<Points> {
  const { collected, pfMmHg, check } = begun(stay);
  if (pfMmHg === null || !check) return { ...collected, result: null };
  return {
    ...collected,
    result: { points: respiratorySofa({ pfMmHg, supported: isOnVentilator(check.mode) }) },
  };
}

/** @param input.heartRatePerMin and input.glasgowComaScale as entered on the screen; they are stored nowhere. */
export function hacorAid({
  stay,
  heartRatePerMin,
  glasgowComaScale,
}: {
  stay: BedStay;
  heartRatePerMin: number | null;
  glasgowComaScale: number | null;
}): Aid<Points> {
  const { collected, check, gas, pfMmHg } = begun(stay);
  if (check && supportEntry(check.mode).kind !== 'mask')
    collected.lacks('it is for mask ventilation, and there is none now');
  const ph = gas && collected.need(gas.values.ph, GAS_FIELDS.ph, gas, 'no pH in the gas');
  const ratePerMin =
    check &&
    collected.need(
      check.readings.rateTotalPerMin,
      READING_FIELDS.rateTotalPerMin,
      check,
      'the total rate is not in the check',
    );
  if (heartRatePerMin === null) collected.lacks('heart rate: enter it here');
  if (glasgowComaScale === null) collected.lacks('coma scale: enter it here');
  const isWhole = collected.missing.length === 0;
  if (!isWhole || heartRatePerMin === null || glasgowComaScale === null)
    return { ...collected, result: null };
  if (ph === null || pfMmHg === null || ratePerMin === null) return { ...collected, result: null };
  return {
    ...collected,
    result: { points: hacorScore({ heartRatePerMin, ph, glasgowComaScale, pfMmHg, ratePerMin }) },
  };
}

/** What all three ask for: the present check, and a P/F drawn under its settings. */
function begun(stay: BedStay) {
  const collected = new Collected();
  const { fact: check, why } = presentCheck(stay);
  const { fact: gas, why: whyNoGas } = presentArterialGas(stay);
  if (!check) collected.lacks(why);
  const pfMmHg = collected.need(gas?.pfMmHg, PF, gas, `no P/F: ${whyNoGas ?? NO_RATIO}`);
  return { collected, check, gas, pfMmHg };
}
