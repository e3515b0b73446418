import { Button } from '@windrow/ui/controls/button';
import { ChoiceGroup } from '@windrow/ui/controls/choice-group';
import { WriteFault } from '@windrow/ui/controls/faults';
import { Notice } from '@windrow/ui/controls/notice';
import {
  TRIAL_METHOD_IDS,
  TRIAL_METHODS,
  type TrialMethod,
} from '@windrow/ventilation/contract/observations';
import { TRIAL_PLAN } from '@windrow/ventilation/readiness/trial-plan';
import { useState } from 'react';
import { Plate } from './plate.tsx';
import { useHappening } from './use-happening.ts';

const METHODS = TRIAL_METHOD_IDS.map((value) => ({ value, label: TRIAL_METHODS[value] }));
const MINUTES = ['30', '60', '90', '120'].map((value) => ({ value, label: `${value} min` }));
const [LEAST, MOST] = TRIAL_PLAN.minutes;
const [LOW, HIGH] = TRIAL_PLAN.pressureSupportCmH2O;

/** Begins a trial as of now. It may be begun whatever the screen says; what stands against it is said. */
export function StartTrial({
  stayId,
  isReady,
  onDone,
}: {
  stayId: string;
  isReady: boolean;
  onDone: () => void;
}) {
  const [method, setMethod] = useState<TrialMethod | null>(null);
  const [minutes, setMinutes] = useState<string | null>(null);
  const [wasTried, setTried] = useState(false);
  const recording = useHappening({ stayId, doneWords: 'Breathing trial started' });
  const start = () => {
    setTried(true);
    if (method === null || minutes === null) return;
    recording.mutate(
      { kind: 'trial-started', method, plannedMinutes: Number(minutes) },
      { onSuccess: onDone },
    );
  };

  return (
    <Plate title="Start a breathing trial">
      {!isReady && (
        <Notice tone="note" title="The screen is not met">
          <p>An item is not met or not known. The trial can be started all the same.</p>
        </Notice>
      )}
      <ChoiceGroup
        label="On"
        options={METHODS}
        value={method}
        onChoose={setMethod}
        error={wasTried && method === null ? 'Choose what it is made on' : undefined}
      />
      <ChoiceGroup
        label="Planned for"
        options={MINUTES}
        value={minutes}
        onChoose={setMinutes}
        error={wasTried && minutes === null ? 'Choose how long it is meant' : undefined}
      />
      <p className="text-ink-muted text-sm">
        Published: {LEAST} to {MOST} min (Esteban 1999); the first with pressure support of {LOW} to {HIGH}{' '}
        cmH2O (Ouellette 2017). A change of settings is recorded as a check.
      </p>
      <WriteFault error={recording.error} />
      <div className="flex flex-wrap gap-3">
        <Button tone="main" disabled={recording.isPending} onClick={start}>
          {recording.isPending ? 'Sending …' : 'Start the trial'}
        </Button>
        <Button onClick={onDone}>Not now</Button>
      </div>
    </Plate>
  );
}
