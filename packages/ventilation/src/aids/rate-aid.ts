import { presentArterialGas, presentCheck } from '../board/present-facts.ts';
import type { BedCheck, BedStay } from '../contract/board.ts';
import { GAS_FIELDS, READING_FIELDS } from '../entry/fields.ts';
import { emptyingOf } from '../flags/timing-rules.ts';
import { RATE_CEILING_PER_MIN, type RateForTarget, rateForTarget } from '../physiology/rate-for-target.ts';
import { supportEntry } from '../support/catalogue.ts';
import type { Aid, AidRule } from './aid.ts';
import { Collected } from './collect.ts';

export const RATE_RULE: AidRule = {
  rule: `Rate × PaCO2 ÷ target. It holds while tidal volume, dead space and CO2 production stay as they are and every breath is taken. Not above ${RATE_CEILING_PER_MIN}\u00a0/min, and not without three time constants to breathe out. Draw a gas after the change.`,
  source: 'alveolar ventilation equation; ceiling: ARDS Network protocol card',
};

const SECONDS = { unit: 's', decimals: 1 } as const;
const PACO2 = { ...GAS_FIELDS.pco2MmHg, label: 'PaCO2' };

/** The rate expected to bring PaCO2 to a target, from the present check and a gas drawn under its settings. */
export function rateAid({
  stay,
  targetPaco2MmHg,
}: {
  stay: BedStay;
  targetPaco2MmHg: number;
}): Aid<RateForTarget> {
  const collected = new Collected();
  const { fact: check, why } = presentCheck(stay);
  const gas = presentArterialGas(stay);
  if (!check) collected.lacks(why);
  else if (check.settings.rateSetPerMin === undefined)
    collected.lacks(`${supportEntry(check.mode).shortName} sets no rate`);
  const ratePerMin =
    check && collected.need(check.readings.rateTotalPerMin, READING_FIELDS.rateTotalPerMin, check, NO_RATE);
  const paco2MmHg = collected.need(
    gas.fact?.values.pco2MmHg,
    PACO2,
    gas.fact,
    gas.why ?? 'no PCO2 in the gas',
  );
  const emptying = check && emptyingNow(check, collected);
  if (collected.missing.length > 0 || ratePerMin === null || paco2MmHg === null)
    return { ...collected, result: null };
  return { ...collected, result: rateForTarget({ ratePerMin, paco2MmHg, targetPaco2MmHg, emptying }) };
}

const NO_RATE = 'the total rate is not in the check';

function emptyingNow(check: BedCheck, collected: Collected) {
  const emptying = emptyingOf(check);
  if (!emptying) return null;
  const { neededS } = emptying;
  const { inspiratoryTimeS } = emptying.madeFrom.timing;
  collected.use(inspiratoryTimeS, { ...SECONDS, label: 'Inspiratory time' }, check);
  collected.use(neededS, { ...SECONDS, label: 'Three time constants' }, check);
  return { inspiratoryTimeS, neededS };
}
