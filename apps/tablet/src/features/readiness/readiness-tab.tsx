import { useQuery } from '@tanstack/react-query';
import { policyQuery } from '@windrow/client/board/policy-query';
import { type PresentBed, usePresentBed } from '@windrow/client/board/use-present-bed';
import { Button } from '@windrow/ui/controls/button';
import { ReadFault } from '@windrow/ui/controls/faults';
import { EmptyState, LoadingState } from '@windrow/ui/controls/states';
import { may } from '@windrow/ventilation/permissions/permissions';
import type { Policy } from '@windrow/ventilation/policy/policy';
import { screening } from '@windrow/ventilation/readiness/screening';
import { useState } from 'react';
import { useParams } from 'react-router-dom';
import { DueLine } from './due-line.tsx';
import { PastTrials } from './past-trials.tsx';
import { RunningTrial } from './running-trial.tsx';
import { ScreenForm } from './screen-form.tsx';
import { ScreeningList } from './screening-list.tsx';
import { StartTrial } from './start-trial.tsx';

/** On the way off the ventilator: the screen, the trial, and what became of earlier ones. */
export function ReadinessTab() {
  const { unitId = '', bedId = '' } = useParams();
  const bed = usePresentBed({ unitId, bedId });
  const policy = useQuery(policyQuery(unitId));
  if (!bed) return null;
  if (policy.isPending) return <LoadingState what="the unit's policy" />;
  if (!policy.data)
    return <ReadFault error={policy.error} what="The unit's policy" onRetry={() => void policy.refetch()} />;
  return <Readiness key={bed.stay.stayId} bed={bed} thresholds={policy.data.policy.thresholds} />;
}

type Open = 'screen' | 'trial' | null;

function Readiness({ bed, thresholds }: { bed: PresentBed; thresholds: Policy['thresholds'] }) {
  const { shown, stay, session, now, timeZone } = bed;
  const [open, setOpen] = useState<Open>(null);
  const screened = screening({ stay, phLow: thresholds.phLow });
  const mayRecord = may(session.grants, 'record', shown.bed.unitId);
  const close = () => setOpen(null);
  return (
    <div className="grid items-start gap-3 lg:grid-cols-2">
      <div className="flex min-w-0 flex-col gap-3">
        <DueLine stay={stay} screening={screened} thresholds={thresholds} now={now} timeZone={timeZone} />
        {stay.trial && (
          <RunningTrial
            key={stay.trial.startedAt}
            stay={stay}
            trial={stay.trial}
            mayRecord={mayRecord}
            now={now}
            timeZone={timeZone}
          />
        )}
        {mayRecord && open === null && (
          <div className="flex flex-wrap gap-3">
            {screened && (
              <Button tone="main" onClick={() => setOpen('screen')}>
                Screen now
              </Button>
            )}
            {screened && !stay.trial && <Button onClick={() => setOpen('trial')}>Start a trial</Button>}
          </div>
        )}
        {open === 'screen' && <ScreenForm stayId={stay.stayId} onDone={close} />}
        {open === 'trial' && !stay.trial && (
          <StartTrial stayId={stay.stayId} isReady={screened?.isReady ?? false} onDone={close} />
        )}
        <PastTrials stayId={stay.stayId} revision={shown.bed.revision} now={now} timeZone={timeZone} />
      </div>
      <div className="flex min-w-0 flex-col gap-3">
        {screened ? (
          <ScreeningList screening={screened} clock={{ now, timeZone, groups: shown.groups }} />
        ) : (
          <EmptyState title="No screen without ventilation through a tube">
            <p>It is for patients who are to be freed from a ventilator.</p>
          </EmptyState>
        )}
      </div>
    </div>
  );
}
