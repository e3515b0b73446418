import { Button } from '@windrow/ui/controls/button';
import { ChoiceGroup } from '@windrow/ui/controls/choice-group';
import { WriteFault } from '@windrow/ui/controls/faults';
import {
  SCREEN_ANSWER_KEYS,
  SCREEN_ANSWERS,
  type ScreenAnswerKey,
} from '@windrow/ventilation/readiness/screen-answers';
import { useState } from 'react';
import { Plate } from './plate.tsx';
import { useHappening } from './use-happening.ts';

type Answer = 'yes' | 'no' | 'left';
type Answers = Partial<Record<ScreenAnswerKey, Answer>>;

const OPTIONS = [
  { value: 'yes', label: 'Yes' },
  { value: 'no', label: 'No' },
  { value: 'left', label: 'Not judged' },
] as const;

/** The items that only a person at the bed can answer, recorded together as of now. */
export function ScreenForm({ stayId, onDone }: { stayId: string; onDone: () => void }) {
  const [answers, setAnswers] = useState<Answers>({});
  const [wasTried, setTried] = useState(false);
  const recording = useHappening({ stayId, doneWords: 'Screen recorded' });
  const screen = screenOf(answers);
  const isEmpty = Object.keys(screen).length === 0;

  return (
    <Plate title="Screen now">
      <p className="text-ink-muted">
        What the record cannot know. Nothing is taken over from an earlier screen; this one is recorded as of
        now, and an earlier one is entered under Happening.
      </p>
      <div className="grid gap-x-6 gap-y-3 md:grid-cols-2">
        {SCREEN_ANSWER_KEYS.map((key) => (
          <ChoiceGroup
            key={key}
            label={SCREEN_ANSWERS[key]}
            options={OPTIONS}
            value={answers[key] ?? null}
            onChoose={(answer) => setAnswers((before) => ({ ...before, [key]: answer }))}
          />
        ))}
      </div>
      <WriteFault error={recording.error} />
      <p role="alert" className="font-bold text-flag-text empty:hidden">
        {wasTried && isEmpty ? 'Answer at least one item.' : ''}
      </p>
      <div className="flex flex-wrap gap-3">
        <Button
          tone="main"
          disabled={recording.isPending}
          onClick={() => {
            setTried(true);
            if (!isEmpty) recording.mutate({ kind: 'screened', screen }, { onSuccess: onDone });
          }}
        >
          {recording.isPending ? 'Sending …' : 'Record the screen'}
        </Button>
        <Button onClick={onDone}>Not now</Button>
      </div>
    </Plate>
  );
}

function screenOf(answers: Answers): Partial<Record<ScreenAnswerKey, boolean>> {
  const screen: Partial<Record<ScreenAnswerKey, boolean>> = {};
  for (const key of SCREEN_ANSWER_KEYS) {
    if (answers[key] === 'yes' || answers[key] === 'no') screen[key] = answers[key] === 'yes';
  }
  return screen;
}
