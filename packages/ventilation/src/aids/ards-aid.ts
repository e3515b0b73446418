import { presentArterialGas, presentCheck } from '../board/present-facts.ts';
import type { BedCheck, BedGas, BedStay } from '../contract/board.ts';
import { READING_FIELDS, SETTING_FIELDS } from '../entry/fields.ts';
import { berlinClass } from '../oxygenation/berlin-class.ts';
import { globalArdsClass } from '../oxygenation/global-ards-class.ts';
import { type SupportId, supportEntry } from '../support/catalogue.ts';
import type { Aid, AidRule } from './aid.ts';
import { Collected } from './collect.ts';

/** A class, or the reason why the definition does not give one. */
export type ArdsGrade =
  | { is: 'none' | 'mild' | 'moderate' | 'severe' | 'non-intubated'; why: null }
  | { is: null; why: string };
export type ArdsAid = { berlin: ArdsGrade; global: ArdsGrade };

export const ARDS_RULE: AidRule = {
  rule: 'Oxygenation alone: P/F up to 300, 200 and 100 at a PEEP of at least 5 cmH2O; by the 2023 definition also S/F up to 315, 235 and 148 at an SpO2 of at most 97 %, and without a tube on high flow of at least 30 L/min or a mask. Onset within a week, opacities on both sides and their origin are for people to judge.',
  source:
    'ARDS Definition Task Force, JAMA 2012;307:2526–33; Matthay MA et al., Am J Respir Crit Care Med 2024;209:37–47',
};

const PF = { label: 'P/F', unit: 'mmHg', decimals: 0 } as const;

/** What the present oxygenation would be called by both published definitions. */
export function ardsAid(stay: BedStay): Aid<ArdsAid> {
  const collected = new Collected();
  const { fact: check, why } = presentCheck(stay);
  const gas = presentArterialGas(stay);
  if (!check) collected.lacks(why);
  const pfMmHg = collected.use(gas.fact?.pfMmHg, PF, gas.fact);
  const whyNoRatio = gas.why ?? 'the gas has no oxygen recorded with it';
  if (pfMmHg === null) collected.lacks(`no P/F: ${whyNoRatio}`);
  if (!check) return { ...collected, result: null };

  const peepCmH2O = peepOf({ check, gas: gas.fact, collected });
  const saturation = pfMmHg === null ? saturationOf(check, collected) : null;
  const berlin = berlinOf({ pfMmHg, peepCmH2O });
  const global = globalOf({ check, pfMmHg, peepCmH2O, saturation });
  return { ...collected, result: { berlin, global } };
}

/** PEEP as it stood at the draw, or as it is set under the same settings. */
function peepOf({ check, gas, collected }: { check: BedCheck; gas: BedGas | null; collected: Collected }) {
  const { peepCmH2O, epapCmH2O, cpapCmH2O } = check.settings;
  const atDraw = gas?.values.peepCmH2O;
  const from = atDraw === undefined ? check : gas;
  return collected.use(atDraw ?? peepCmH2O ?? epapCmH2O ?? cpapCmH2O, SETTING_FIELDS.peepCmH2O, from);
}

function saturationOf({ readings, settings, ...stamp }: BedCheck, collected: Collected) {
  const spo2Percent = collected.need(
    readings.spo2Percent,
    READING_FIELDS.spo2Percent,
    stamp,
    'no SpO2 in the check',
  );
  const oxygen = collected.need(
    settings.fio2Percent,
    SETTING_FIELDS.fio2Percent,
    stamp,
    'oxygen not in the check',
  );
  return spo2Percent === null || oxygen === null ? null : { spo2Percent, fio2: oxygen / 100 };
}

function berlinOf({ pfMmHg, peepCmH2O }: { pfMmHg: number | null; peepCmH2O: number | null }): ArdsGrade {
  if (pfMmHg === null) return { is: null, why: 'it asks for a P/F' };
  if (peepCmH2O === null) return { is: null, why: 'it asks for a PEEP or CPAP' };
  const is = berlinClass({ pfMmHg, peepCmH2O });
  return is === null ? { is, why: 'PEEP is below 5 cmH2O' } : { is, why: null };
}

function globalOf({
  check: { mode, settings },
  pfMmHg,
  peepCmH2O,
  saturation,
}: {
  check: BedCheck;
  pfMmHg: number | null;
  peepCmH2O: number | null;
  saturation: { spo2Percent: number; fio2: number } | null;
}): ArdsGrade {
  const strength = {
    support: globalSupport(mode),
    ...(peepCmH2O === null ? {} : { peepCmH2O }),
    ...(settings.flowLMin === undefined ? {} : { flowLMin: settings.flowLMin }),
  };
  if (pfMmHg !== null) return graded(globalArdsClass({ pfMmHg, ...strength }), TOO_WEAK);
  if (!saturation) return { is: null, why: 'it asks for a P/F, or an SpO2 and oxygen' };
  const why = saturation.spo2Percent > 97 ? 'SpO2 is above 97 %, where it tells too little' : TOO_WEAK;
  return graded(globalArdsClass({ ...saturation, ...strength }), why);
}

const TOO_WEAK = 'the support is weaker than the definition asks for';

function graded(is: ReturnType<typeof globalArdsClass>, why: string): ArdsGrade {
  return is === null ? { is, why } : { is, why: null };
}

function globalSupport(mode: SupportId): 'invasive' | 'mask' | 'high-flow' | 'none' {
  const { kind } = supportEntry(mode);
  return kind === 'oxygen' ? 'none' : kind;
}
