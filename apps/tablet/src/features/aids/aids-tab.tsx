import { useQuery } from '@tanstack/react-query';
import { policyQuery } from '@windrow/client/board/policy-query';
import { usePresentBed } from '@windrow/client/board/use-present-bed';
import { ReadFault } from '@windrow/ui/controls/faults';
import { LoadingState } from '@windrow/ui/controls/states';
import { useParams } from 'react-router-dom';
import { AcidBasePanel } from './acid-base-panel.tsx';
import { ArdsPanel } from './ards-panel.tsx';
import { LadderPanel } from './ladder-panel.tsx';
import { RatePanel } from './rate-panel.tsx';
import { HacorPanel, MurrayPanel, SofaPanel } from './score-panels.tsx';
import { TubePanel } from './tube-panel.tsx';

/** What can be reckoned from the present facts of this bed. Nothing here is stored, and nothing is advice. */
export function AidsTab() {
  const { unitId = '', bedId = '' } = useParams();
  const bed = usePresentBed({ unitId, bedId });
  const policy = useQuery(policyQuery(unitId));
  if (!bed) return null;
  if (policy.isPending) return <LoadingState what="the unit's policy" />;
  if (!policy.data)
    return <ReadFault error={policy.error} what="The unit's policy" onRetry={() => void policy.refetch()} />;
  const { shown, stay, now, timeZone } = bed;
  const groups = Object.values(shown.groups);
  const stateAt = (observedAt: string) =>
    groups.find((group) => group.observedAt === observedAt)?.state ?? 'current';
  const clock = { now, timeZone, stateAt };
  return (
    <div className="flex flex-col gap-3">
      <p className="text-ink-muted">
        Reckoned from what is current at this bed, and stored nowhere. What is withdrawn or from before a
        change is not used. It is arithmetic, and no advice.
      </p>
      <div key={stay.stayId} className="grid items-start gap-3 lg:grid-cols-2">
        <div className="flex min-w-0 flex-col gap-3">
          <LadderPanel stay={stay} clock={clock} />
          <RatePanel stay={stay} clock={clock} />
          <ArdsPanel stay={stay} clock={clock} />
          <SofaPanel stay={stay} clock={clock} />
        </div>
        <div className="flex min-w-0 flex-col gap-3">
          <AcidBasePanel stay={stay} clock={clock} />
          <TubePanel stay={stay} thresholds={policy.data.policy.thresholds} clock={clock} />
          <MurrayPanel stay={stay} clock={clock} />
          <HacorPanel stay={stay} clock={clock} />
        </div>
      </div>
    </div>
  );
}
