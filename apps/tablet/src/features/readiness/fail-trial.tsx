import { Button } from '@windrow/ui/controls/button';
import { CheckField } from '@windrow/ui/controls/check-field';
import { WriteFault } from '@windrow/ui/controls/faults';
import { TextField } from '@windrow/ui/controls/text-field';
import {
  FAILURE_CRITERIA,
  FAILURE_CRITERION_IDS,
  type FailureCriterion,
} from '@windrow/ventilation/readiness/trial-failure';
import { useState } from 'react';
import { useHappening } from './use-happening.ts';

const LONGEST = 500;

/** The trial has failed: by which published criteria, or why in words. Nothing is ticked by itself. */
export function FailTrial({
  stayId,
  signs,
  onClose,
}: {
  stayId: string;
  signs: readonly FailureCriterion[];
  onClose: () => void;
}) {
  const [criteria, setCriteria] = useState<readonly FailureCriterion[]>([]);
  const [detail, setDetail] = useState('');
  const [wasTried, setTried] = useState(false);
  const recording = useHappening({ stayId, doneWords: 'Breathing trial failed' });
  const words = detail.trim();
  const isEmpty = criteria.length === 0 && words === '';
  const toggle = (id: FailureCriterion, isMet: boolean) =>
    setCriteria((before) => (isMet ? [...before, id] : before.filter((one) => one !== id)));

  return (
    <div className="flex flex-col gap-3">
      <fieldset>
        <legend className="font-bold">Criteria met</legend>
        <div className="grid gap-x-6 gap-y-2 md:grid-cols-2">
          {FAILURE_CRITERION_IDS.map((id) => (
            <CheckField
              key={id}
              label={`${FAILURE_CRITERIA[id].label}${signs.includes(id) ? ' (recorded so)' : ''}`}
              checked={criteria.includes(id)}
              onChange={(event) => toggle(id, event.target.checked)}
            />
          ))}
        </div>
      </fieldset>
      <TextField
        label="In words"
        hint="Needed where no criterion fits"
        maxLength={LONGEST}
        value={detail}
        error={wasTried && isEmpty ? 'Tick a criterion, or say why in words' : undefined}
        onChange={(event) => setDetail(event.target.value)}
      />
      <p className="text-ink-muted text-sm">
        Source: Boles JM et al., Eur Respir J 2007;29:1033–56, table 6.
      </p>
      <WriteFault error={recording.error} />
      <div className="flex flex-wrap gap-3">
        <Button
          tone="main"
          disabled={recording.isPending}
          onClick={() => {
            setTried(true);
            if (isEmpty) return;
            recording.mutate({
              kind: 'trial-failed',
              ...(criteria.length > 0
                ? { criteria: FAILURE_CRITERION_IDS.filter((id) => criteria.includes(id)) }
                : {}),
              ...(words === '' ? {} : { detail: words }),
            });
          }}
        >
          {recording.isPending ? 'Sending …' : 'Record as failed'}
        </Button>
        <Button onClick={onClose}>Go on with the trial</Button>
      </div>
    </div>
  );
}
