import { ARDS_RULE, type ArdsGrade, ardsAid } from '@windrow/ventilation/aids/ards-aid';
import type { BedStay } from '@windrow/ventilation/contract/board';
import { workedOut } from '@windrow/ventilation/notes/worked-out';
import { AidPanel, type Clock } from './aid-panel.tsx';
import { noteLinks } from './note-links.ts';

const CLASSES = {
  none: 'Oxygenation of no class',
  mild: 'Mild',
  moderate: 'Moderate',
  severe: 'Severe',
  'non-intubated': 'Non-intubated, without a grade',
} as const;

export function ArdsPanel({ stay, clock }: { stay: BedStay; clock: Clock }) {
  const { result, inputs, missing } = ardsAid(stay);
  const peepCmH2O = stay.gas?.values.peepCmH2O ?? stay.check?.settings.peepCmH2O;
  const notes = result?.berlin.is
    ? noteLinks([['Berlin class', workedOut('berlinClass', { pfMmHg: stay.gas?.pfMmHg, peepCmH2O })]])
    : [];
  return (
    <AidPanel
      title="ARDS class by oxygenation"
      rule={ARDS_RULE}
      inputs={inputs}
      missing={missing}
      notes={notes}
      clock={clock}
    >
      {result && (
        <>
          <dl className="grid grid-cols-2 gap-x-4">
            <Grade definition="Berlin, 2012" grade={result.berlin} />
            <Grade definition="Global, 2023" grade={result.global} />
          </dl>
          <p className="text-ink-muted">
            Onset within a week, opacities on both sides and their origin are for people to judge.
          </p>
        </>
      )}
    </AidPanel>
  );
}

function Grade({ definition, grade }: { definition: string; grade: ArdsGrade }) {
  return (
    <div>
      <dt className="text-ink-muted text-sm">{definition}</dt>
      <dd>
        {grade.is === null ? (
          <span>no class: {grade.why}</span>
        ) : (
          <span className="font-bold text-xl">{CLASSES[grade.is]}</span>
        )}
      </dd>
    </div>
  );
}
