import { useQuery } from '@tanstack/react-query';
import { ReadFault } from '@windrow/ui/controls/faults';
import { LoadingState } from '@windrow/ui/controls/states';
import { TRIAL_METHODS } from '@windrow/ventilation/contract/observations';
import type { Trial } from '@windrow/ventilation/contract/readiness';
import { formatMoment } from '@windrow/ventilation/format/clock';
import { FAILURE_CRITERIA } from '@windrow/ventilation/readiness/trial-failure';
import { Plate } from './plate.tsx';
import { trialsQuery } from './trials-query.ts';

type PastTrialsProps = { stayId: string; revision: number; now: number; timeZone: string };

/** Every trial of the stay that has ended, newest first. */
export function PastTrials({ stayId, revision, now, timeZone }: PastTrialsProps) {
  const trials = useQuery(trialsQuery({ stayId, revision }));
  if (trials.isPending) return <LoadingState what="the trials" />;
  if (!trials.data)
    return <ReadFault error={trials.error} what="The trials" onRetry={() => void trials.refetch()} />;
  const past = trials.data.items.filter(({ outcome }) => outcome !== 'running');
  return (
    <Plate title="Past trials">
      {past.length === 0 && <p className="text-ink-muted">None in this stay yet.</p>}
      <ol className="flex flex-col divide-y-2 divide-line">
        {past.map((trial) => (
          <li key={trial.observationId} className="py-2">
            <OneTrial trial={trial} now={now} timeZone={timeZone} />
          </li>
        ))}
      </ol>
    </Plate>
  );
}

const OUTCOMES = {
  running: 'Running',
  passed: 'Passed',
  failed: 'Failed',
  ended: 'Ended, outcome not recorded',
} as const;

function OneTrial({ trial, now, timeZone }: { trial: Trial } & Pick<PastTrialsProps, 'now' | 'timeZone'>) {
  const { startedAt, endedAt, minutes, method, plannedMinutes, outcome, criteria, detail } = trial;
  const at = (instant: string) => formatMoment(instant, now, timeZone);
  const said = [
    startedAt ? at(startedAt) : endedAt && `start not recorded, ended ${at(endedAt)}`,
    method && TRIAL_METHODS[method],
    minutes !== null && `${minutes} min${plannedMinutes === null ? '' : ` of ${plannedMinutes}`}`,
  ].filter(Boolean);
  return (
    <>
      <p>
        <span className="font-bold">{OUTCOMES[outcome]}</span>
        <span className="text-ink-muted"> · {said.join(' · ')}</span>
      </p>
      {criteria.length > 0 && <p>{criteria.map((id) => FAILURE_CRITERIA[id].label).join('; ')}</p>}
      {detail && <p className="wrap-break-word">{detail}</p>}
    </>
  );
}
