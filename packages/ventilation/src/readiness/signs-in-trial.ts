import { presentCheck, shownArterialGas } from '../board/present-facts.ts';
import type { BedStay } from '../contract/board.ts';
import { type FailureCriterion, failureSigns } from './trial-failure.ts';

/**
 * Which published criteria of failure a check or an arterial gas since the start of the running trial meets.
 * Rises against the start are not in it: the row holds the newest values only.
 */
export function signsInTrial(
  stay: Pick<BedStay, 'check' | 'gas' | 'support' | 'withdrawn' | 'trial'>,
): FailureCriterion[] {
  const { trial } = stay;
  if (!trial) return [];
  const since = <Fact extends { observedAt: string }>(fact: Fact | null) =>
    fact && fact.observedAt >= trial.startedAt ? fact : null;
  const check = since(presentCheck(stay).fact);
  const gas = since(shownArterialGas(stay).fact)?.values;
  return failureSigns({
    now: {
      ratePerMin: check?.readings.rateTotalPerMin,
      rsbiPerMinL: check?.derived.rsbiPerMinL ?? undefined,
      sao2Percent: gas?.sao2Percent ?? check?.readings.spo2Percent,
      pao2MmHg: gas?.po2MmHg,
      fio2Percent: gas?.fio2Percent,
      paco2MmHg: gas?.pco2MmHg,
      ph: gas?.ph,
    },
  });
}
