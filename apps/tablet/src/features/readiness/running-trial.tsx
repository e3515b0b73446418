import { Button } from '@windrow/ui/controls/button';
import type { BedStay } from '@windrow/ventilation/contract/board';
import { TRIAL_METHODS } from '@windrow/ventilation/contract/observations';
import { formatMoment } from '@windrow/ventilation/format/clock';
import { signsInTrial } from '@windrow/ventilation/readiness/signs-in-trial';
import { FAILURE_CRITERIA } from '@windrow/ventilation/readiness/trial-failure';
import { trialMinutes } from '@windrow/ventilation/readiness/trials';
import { useState } from 'react';
import { FailTrial } from './fail-trial.tsx';
import { PassTrial } from './pass-trial.tsx';
import { Plate } from './plate.tsx';

type RunningTrialProps = {
  stay: BedStay;
  trial: NonNullable<BedStay['trial']>;
  mayRecord: boolean;
  now: number;
  timeZone: string;
};

/** The trial that runs: how long it has, what speaks against it, and its end. */
export function RunningTrial({ stay, trial, mayRecord, now, timeZone }: RunningTrialProps) {
  const [ending, setEnding] = useState<'passed' | 'failed' | null>(null);
  const minutes = trialMinutes({ startedAt: trial.startedAt, at: now });
  const signs = signsInTrial(stay);
  const close = () => setEnding(null);
  return (
    <Plate title="Breathing trial">
      <p>
        <span className="font-bold text-3xl tabular-nums">{minutes}</span>
        <span className="text-ink-muted">
          {' '}
          min{trial.plannedMinutes === null ? '' : ` of ${trial.plannedMinutes} planned`} · on{' '}
          {trial.method ? TRIAL_METHODS[trial.method] : 'a method that was not recorded'} · since{' '}
          {formatMoment(trial.startedAt, now, timeZone)}
        </span>
      </p>
      {trial.plannedMinutes !== null && minutes >= trial.plannedMinutes && (
        <p className="font-bold">The planned time is over.</p>
      )}
      {signs.length > 0 && (
        <div>
          <p className="font-bold">Criteria of failure in what was recorded since the start</p>
          <ul className="list-disc pl-5">
            {signs.map((id) => (
              <li key={id}>{FAILURE_CRITERIA[id].label}</li>
            ))}
          </ul>
        </div>
      )}
      {mayRecord && ending === null && (
        <div className="flex flex-wrap gap-3">
          <Button tone="main" onClick={() => setEnding('passed')}>
            Passed
          </Button>
          <Button tone="main" onClick={() => setEnding('failed')}>
            Failed
          </Button>
        </div>
      )}
      {ending === 'passed' && <PassTrial stayId={stay.stayId} minutes={minutes} onClose={close} />}
      {ending === 'failed' && <FailTrial stayId={stay.stayId} signs={signs} onClose={close} />}
    </Plate>
  );
}
