import { LADDER_RULE, ladderAid } from '@windrow/ventilation/aids/ladder-aid';
import type { BedStay } from '@windrow/ventilation/contract/board';
import { workedOut } from '@windrow/ventilation/notes/worked-out';
import type {
  LadderName,
  LadderPosition,
  LadderStep,
} from '@windrow/ventilation/oxygenation/peep-fio2-ladders';
import { AidPanel, type Clock } from './aid-panel.tsx';
import { noteLinks } from './note-links.ts';

const NAMES: Record<LadderName, string> = {
  lower: 'Lower PEEP, higher oxygen',
  higher: 'Higher PEEP, lower oxygen',
};

export function LadderPanel({ stay, clock }: { stay: BedStay; clock: Clock }) {
  const { result, inputs, missing } = ladderAid(stay);
  const { peepCmH2O, fio2Percent } = stay.check?.settings ?? {};
  const fio2 = fio2Percent === undefined ? undefined : fio2Percent / 100;
  const notes = result
    ? noteLinks(
        result.map(({ ladder }) => [NAMES[ladder], workedOut('peepFio2Step', { peepCmH2O, fio2, ladder })]),
      )
    : [];
  return (
    <AidPanel
      title="PEEP and oxygen ladders"
      rule={LADDER_RULE}
      inputs={inputs}
      missing={missing}
      notes={notes}
      clock={clock}
    >
      {result && (
        <ul className="flex flex-col divide-y-2 divide-line">
          {result.map(({ ladder, position }) => (
            <li key={ladder} className="py-2">
              <h3 className="font-bold">{NAMES[ladder]}</h3>
              <Position position={position} />
            </li>
          ))}
        </ul>
      )}
    </AidPanel>
  );
}

function Position({ position: { onLadder, peepRangeCmH2O, up, down } }: { position: LadderPosition }) {
  return (
    <>
      <p>
        {onLadder ? 'On the ladder.' : 'Beside the ladder.'} {rangeInWords(peepRangeCmH2O)}
      </p>
      <dl className="mt-1 grid grid-cols-2 gap-x-4">
        <Step label="Next step down" step={down} end="none below" />
        <Step label="Next step up" step={up} end="none above" />
      </dl>
    </>
  );
}

function Step({ label, step, end }: { label: string; step: LadderStep | null; end: string }) {
  return (
    <div>
      <dt className="text-ink-muted text-sm">{label}</dt>
      <dd>
        {step ? (
          <>
            <span className="font-bold text-xl tabular-nums">{step.peepCmH2O}</span>
            <span className="text-ink-muted text-sm"> cmH2O on </span>
            <span className="font-bold text-xl tabular-nums">{step.fio2Percent}</span>
            <span className="text-ink-muted text-sm"> %</span>
          </>
        ) : (
          end
        )}
      </dd>
    </div>
  );
}

function rangeInWords(range: LadderPosition['peepRangeCmH2O']): string {
  if (!range) return 'This oxygen lies between two of its steps.';
  const [low, high] = range;
  return low === high
    ? `PEEP at this oxygen: ${low}\u00a0cmH2O.`
    : `PEEP at this oxygen: ${low} to ${high}\u00a0cmH2O.`;
}
