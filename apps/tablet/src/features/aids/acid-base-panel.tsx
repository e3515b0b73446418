import { acidBaseInWords } from '@windrow/ventilation/acid-base/acid-base-in-words';
import { ACID_BASE_RULE, acidBaseAid } from '@windrow/ventilation/aids/acid-base-aid';
import type { BedStay } from '@windrow/ventilation/contract/board';
import { formatNumber } from '@windrow/ventilation/format/number';
import { workedOut } from '@windrow/ventilation/notes/worked-out';
import { AidPanel, type Clock } from './aid-panel.tsx';
import { noteLinks } from './note-links.ts';

export function AcidBasePanel({ stay, clock }: { stay: BedStay; clock: Clock }) {
  const { result, inputs, missing } = acidBaseAid(stay);
  const values = stay.gas?.values ?? {};
  const paco2MmHg = values.pco2MmHg;
  const bicarbonateMmolL = values.bicarbonateMmolL;
  const isMetabolicAcidosis = result?.primary.join() === 'metabolic acidosis';
  const notes = result
    ? noteLinks([
        ['consistency of a gas', workedOut('gasConsistency', { ph: values.ph, paco2MmHg, bicarbonateMmolL })],
        [
          'bicarbonate',
          result.isBicarbonateGiven ? null : workedOut('bicarbonate', { ph: values.ph, paco2MmHg }),
        ],
        [
          'expected PaCO2',
          isMetabolicAcidosis
            ? workedOut('expectedPaco2Winters', { bicarbonateMmolL: result.bicarbonateMmolL })
            : null,
        ],
      ])
    : [];
  return (
    <AidPanel
      title="Acid and base"
      rule={ACID_BASE_RULE}
      inputs={inputs}
      missing={missing}
      notes={notes}
      clock={clock}
    >
      {result && (
        <>
          <ul className="flex flex-col gap-1 text-lg">
            {acidBaseInWords(result).map((sentence) => (
              <li key={sentence}>{sentence}</li>
            ))}
          </ul>
          {!result.isBicarbonateGiven && (
            <p className="text-ink-muted">
              Bicarbonate {formatNumber(result.bicarbonateMmolL, { decimals: 1 })} mmol/L, reckoned from pH
              and PCO2: without a measured one the gas cannot be held against itself.
            </p>
          )}
          {result.compensation && (
            <p className="text-ink-muted">
              Rule: {result.compensation.of} = {result.compensation.rule} ({result.compensation.source})
            </p>
          )}
        </>
      )}
    </AidPanel>
  );
}
