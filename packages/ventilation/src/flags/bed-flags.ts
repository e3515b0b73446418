import { presentCheck } from '../board/present-facts.ts';
import type { BedStay, Flag } from '../contract/board.ts';
import type { Policy } from '../policy/policy.ts';
import { readyToTry } from '../readiness/ready-to-try.ts';
import { AIRWAY_RULES } from './airway-rules.ts';
import { flagFingerprint } from './flag-fingerprint.ts';
import { GAS_RULES } from './gas-rules.ts';
import { LIMIT_RULES } from './limit-rules.ts';
import { PRESSURE_RULES } from './pressure-rules.ts';
import { READINESS_RULES } from './readiness-rules.ts';
import type { FlagFacts, FlagRule } from './rule.ts';
import { TIMING_RULES } from './timing-rules.ts';
import { VOLUME_RULES } from './volume-rules.ts';

/** Every rule, in the order in which its flag is shown within its level. */
export const FLAG_RULES: readonly FlagRule[] = [
  ...VOLUME_RULES,
  ...PRESSURE_RULES,
  ...GAS_RULES,
  ...AIRWAY_RULES,
  ...LIMIT_RULES,
  ...TIMING_RULES,
  ...READINESS_RULES,
];

/**
 * What in the present facts of a stay a person should look at: attention first, then notes, each in the order
 * of the rules. A fact that is missing flags nothing; a check that no longer tells of the present settings or
 * support flags nothing either, while a gas is flagged for what it is. Nobody has acknowledged any of them yet:
 * that is known from the record, and added by the board.
 */
export function bedFlags({
  stay,
  thresholds,
}: {
  stay: Omit<BedStay, 'flags'>;
  thresholds: Policy['thresholds'];
}): Flag[] {
  const { device, airway, gas } = stay;
  const facts: FlagFacts = {
    check: presentCheck(stay).fact,
    device,
    airway,
    gas,
    thresholds,
    ready: readyToTry({ stay, thresholds }),
  };
  const flags = FLAG_RULES.flatMap(({ id, source, from, find }) => {
    const finding = find(facts);
    if (!finding) return [];
    const { facts: beside, ...told } = finding;
    const fingerprint = flagFingerprint({ id, inputs: told.inputs, facts: beside });
    return [{ id, source, from: [...from], ...told, fingerprint, acknowledged: null }];
  });
  return [
    ...flags.filter(({ level }) => level === 'attention'),
    ...flags.filter(({ level }) => level === 'note'),
  ];
}
