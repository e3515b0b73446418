import { presentCheck } from '../board/present-facts.ts';
import type { BedStay } from '../contract/board.ts';
import { SETTING_FIELDS } from '../entry/fields.ts';
import {
  LADDER_NAMES,
  type LadderName,
  type LadderPosition,
  ladderPosition,
} from '../oxygenation/peep-fio2-ladders.ts';
import { supportEntry } from '../support/catalogue.ts';
import type { Aid, AidRule } from './aid.ts';
import { Collected } from './collect.ts';

export type LadderAid = readonly { ladder: LadderName; position: LadderPosition }[];

export const LADDER_RULE: AidRule = {
  rule: 'Set PEEP and oxygen against the two PEEP–FiO2 tables. The next step up takes away neither, the next step down adds neither.',
  source:
    'ARDS Network, N Engl J Med 2000;342:1301–8 (lower PEEP) and 2004;351:327–36 (higher PEEP, from memory)',
};

/** Where the settings of the present check stand on both published ladders. */
export function ladderAid(stay: BedStay): Aid<LadderAid> {
  const { fact: check, why } = presentCheck(stay);
  const collected = new Collected();
  if (!check) return { result: null, inputs: [], missing: [why] };
  const { shortName, kind } = supportEntry(check.mode);
  if (kind !== 'invasive') collected.lacks(`${shortName} has no PEEP through a tube`);
  const { settings } = check;
  const noPeep = `${shortName} has no PEEP of the ladder`;
  const peepCmH2O =
    kind === 'invasive' ? collected.need(settings.peepCmH2O, SETTING_FIELDS.peepCmH2O, check, noPeep) : null;
  const oxygen = collected.need(
    settings.fio2Percent,
    SETTING_FIELDS.fio2Percent,
    check,
    'oxygen not in the check',
  );
  if (peepCmH2O === null || oxygen === null) return { ...collected, result: null };
  const result = LADDER_NAMES.map((ladder) => ({
    ladder,
    position: ladderPosition({ peepCmH2O, fio2: oxygen / 100, ladder }),
  }));
  return { ...collected, result };
}
