import { Button } from '@windrow/ui/controls/button';
import { RATE_RULE, rateAid } from '@windrow/ventilation/aids/rate-aid';
import type { BedStay } from '@windrow/ventilation/contract/board';
import { formatNumber } from '@windrow/ventilation/format/number';
import { workedOut } from '@windrow/ventilation/notes/worked-out';
import { RATE_CEILING_PER_MIN, type RateForTarget } from '@windrow/ventilation/physiology/rate-for-target';
import { useState } from 'react';
import { AidPanel, type Clock } from './aid-panel.tsx';
import { noteLinks } from './note-links.ts';

const USUAL_TARGET_MMHG = 40;
const TARGETS_MMHG = [25, 90] as const;
const TENTH = { decimals: 1 } as const;

export function RatePanel({ stay, clock }: { stay: BedStay; clock: Clock }) {
  const [targetPaco2MmHg, setTarget] = useState(USUAL_TARGET_MMHG);
  const { result, inputs, missing } = rateAid({ stay, targetPaco2MmHg });
  const ratePerMin = stay.check?.readings.rateTotalPerMin;
  const notes = result
    ? noteLinks([
        [
          'rate for a target PaCO2',
          workedOut('rateForTargetPaco2', {
            ratePerMin,
            paco2MmHg: stay.gas?.values.pco2MmHg,
            targetPaco2MmHg,
          }),
        ],
      ])
    : [];
  return (
    <AidPanel
      title="Rate for a target PaCO2"
      rule={RATE_RULE}
      inputs={inputs}
      missing={missing}
      notes={notes}
      clock={clock}
    >
      <TargetStepper target={targetPaco2MmHg} onTarget={setTarget} />
      {result && (
        <>
          <p aria-live="polite">
            <span className="font-bold text-3xl tabular-nums">{result.setPerMin}</span>
            <span className="text-ink-muted">
              {' '}
              /min expected ({formatNumber(result.expectedPerMin, TENTH)}); now{' '}
              {ratePerMin === undefined ? 'not known' : `${ratePerMin} /min`}
            </span>
          </p>
          <Cautions result={result} />
          {result.paco2AtHighestMmHg !== null && (
            <p className="font-bold">
              At most {result.highestPerMin} /min by these cautions: PaCO2 expected at{' '}
              {formatNumber(result.paco2AtHighestMmHg, { decimals: 0 })} mmHg.
            </p>
          )}
        </>
      )}
    </AidPanel>
  );
}

function TargetStepper({ target, onTarget }: { target: number; onTarget: (target: number) => void }) {
  const [low, high] = TARGETS_MMHG;
  return (
    // biome-ignore lint/a11y/useSemanticElements: a fieldset is for form answers; nothing here is sent
    <div role="group" aria-label="Target PaCO2" className="flex items-center gap-3">
      <Button
        aria-label="Target one lower"
        disabled={target <= low}
        onClick={() => onTarget(Math.max(low, target - 1))}
      >
        −
      </Button>
      <p aria-live="polite" className="min-w-24 text-center">
        <span className="font-bold text-xl tabular-nums">{target}</span>
        <span className="text-ink-muted text-sm"> mmHg</span>
      </p>
      <Button
        aria-label="Target one higher"
        disabled={target >= high}
        onClick={() => onTarget(Math.min(high, target + 1))}
      >
        +
      </Button>
    </div>
  );
}

/** The ladder of caution, rung by rung: what stands against this rate, and what cannot be said. */
function Cautions({ result }: { result: RateForTarget }) {
  const rungs = [
    result.isAboveCeiling
      ? { is: 'against', words: `Above ${RATE_CEILING_PER_MIN} /min: the rate alone does not get there.` }
      : { is: 'clear', words: `Not above ${RATE_CEILING_PER_MIN} /min.` },
    expirationRung(result),
  ];
  return (
    <ol aria-label="Cautions" className="flex flex-col gap-1">
      {rungs.map(({ is, words }) => (
        <li
          key={words}
          className={`flex gap-2 ${is === 'against' ? 'font-bold text-flag-text' : is === 'open' ? 'text-ink-muted' : ''}`}
        >
          <span aria-hidden="true">{is === 'against' ? '▲' : is === 'open' ? '?' : '✓'}</span>
          <span>
            <span className="sr-only">
              {is === 'against' ? 'Against it: ' : is === 'open' ? 'Not known: ' : ''}
            </span>
            {words}
          </span>
        </li>
      ))}
    </ol>
  );
}

function expirationRung({ expiration }: RateForTarget): {
  is: 'against' | 'open' | 'clear';
  words: string;
} {
  if (!expiration) {
    return {
      is: 'open',
      words:
        'Time to breathe out not judged: it takes volume control with its flow, a peak, and a plateau of a passive patient.',
    };
  }
  const given = formatNumber(expiration.givenS, { decimals: 2 });
  const needed = formatNumber(expiration.neededS, { decimals: 2 });
  return expiration.isShort
    ? {
        is: 'against',
        words: `${given} s left to breathe out, and three time constants take ${needed} s: gas may be trapped.`,
      }
    : { is: 'clear', words: `${given} s left to breathe out; three time constants take ${needed} s.` };
}
