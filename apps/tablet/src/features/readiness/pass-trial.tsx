import { Button } from '@windrow/ui/controls/button';
import { WriteFault } from '@windrow/ui/controls/faults';
import { TextField } from '@windrow/ui/controls/text-field';
import { isUnusual, TRIAL_FIELDS } from '@windrow/ventilation/entry/fields';
import { wholeNumber } from '@windrow/ventilation/entry/whole-number';
import { useState } from 'react';
import { useHappening } from './use-happening.ts';

const FIELD = TRIAL_FIELDS.minutes;

/** The trial is passed: after how many minutes. The time that has run stands there, and can be mended. */
export function PassTrial({
  stayId,
  minutes,
  onClose,
}: {
  stayId: string;
  minutes: number;
  onClose: () => void;
}) {
  const [text, setText] = useState(String(Math.max(FIELD.hard[0], minutes)));
  const recording = useHappening({ stayId, doneWords: 'Breathing trial passed' });
  const { value, fault } = wholeNumber(text, FIELD.hard);
  const odd = value !== null && isUnusual(FIELD, value);
  return (
    <div className="flex flex-col gap-3">
      <TextField
        label="Went on for, min"
        inputMode="numeric"
        value={text}
        error={fault ?? (value === null ? 'The minutes are needed' : undefined)}
        hint={
          odd
            ? `Published trials last ${FIELD.soft[0]} to ${FIELD.soft[1]} min: keep or change it`
            : undefined
        }
        onChange={(event) => setText(event.target.value)}
      />
      <WriteFault error={recording.error} />
      <div className="flex flex-wrap gap-3">
        <Button
          tone="main"
          disabled={recording.isPending || value === null}
          onClick={() =>
            value !== null &&
            recording.mutate({
              kind: 'trial-passed',
              minutes: value,
              ...(odd ? { confirmedUnusual: ['minutes'] } : {}),
            })
          }
        >
          {recording.isPending ? 'Sending …' : 'Record as passed'}
        </Button>
        <Button onClick={onClose}>Go on with the trial</Button>
      </div>
    </div>
  );
}
