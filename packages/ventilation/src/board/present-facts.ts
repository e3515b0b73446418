import type { BedCheck, BedGas, BedStay } from '../contract/board.ts';

type Facts = Pick<BedStay, 'check' | 'gas' | 'support' | 'withdrawn'>;

/** A fact that may be reckoned with as the present, or why there is none. */
export type Present<Fact> = { fact: Fact; why: null } | { fact: null; why: string };

/** The check, where it tells of what the patient breathes with now. */
export function presentCheck({ check, support, withdrawn }: Facts): Present<BedCheck> {
  if (!check) return missing(withdrawn.check === null ? 'no check yet' : 'no current check');
  if (check.changedSinceAt !== null) return missing('the check is from before a change');
  if (support !== null && support.id !== check.mode) return missing('the check is of another support');
  return { fact: check, why: null };
}

/** The gas, where it is arterial and was drawn under the present settings. */
export function presentArterialGas(facts: Facts): Present<BedGas> {
  const shown = shownArterialGas(facts);
  return shown.fact?.changedSinceAt ? missing('the gas is from before a change') : shown;
}

/** The gas, where it is arterial: true of the blood, even if the settings were changed since. */
export function shownArterialGas({ gas, withdrawn }: Facts): Present<BedGas> {
  if (!gas) return missing(withdrawn.gas === null ? 'no gas yet' : 'no current gas');
  return gas.site === 'arterial' ? { fact: gas, why: null } : missing(`the gas is ${gas.site}`);
}

function missing(why: string): { fact: null; why: string } {
  return { fact: null, why };
}
