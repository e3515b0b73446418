import { TUBE_RULE, type TubeAid, tubeAid } from '@windrow/ventilation/aids/tube-aid';
import type { BedStay } from '@windrow/ventilation/contract/board';
import { formatNumber } from '@windrow/ventilation/format/number';
import { workedOut } from '@windrow/ventilation/notes/worked-out';
import type { Policy } from '@windrow/ventilation/policy/policy';
import type { ReactNode } from 'react';
import { AidPanel, type Clock } from './aid-panel.tsx';
import { noteLinks } from './note-links.ts';

const TENTH = { decimals: 1 } as const;

export function TubePanel({
  stay,
  thresholds,
  clock,
}: {
  stay: BedStay;
  thresholds: Policy['thresholds'];
  clock: Clock;
}) {
  const { result, inputs, missing } = tubeAid({ stay, thresholds });
  const notes = result
    ? noteLinks([
        [
          'expected depth',
          result.expectedDepthCm === null
            ? null
            : workedOut('expectedTubeDepth', { heightCm: stay.patient?.heightCm }),
        ],
        [
          'suction catheter',
          workedOut('suctionCatheterMaxFr', { tubeInternalDiameterMm: stay.device?.sizeMm }),
        ],
      ])
    : [];
  return (
    <AidPanel
      title="Tube facts"
      rule={TUBE_RULE}
      inputs={inputs}
      missing={missing}
      notes={notes}
      clock={clock}
    >
      {result && (
        <dl className="flex flex-col gap-2">
          {result.expectedDepthCm !== null && (
            <Fact label="Expected depth at the teeth">
              <Value>{formatNumber(result.expectedDepthCm, TENTH)}</Value> cm
              {result.depthCm !== null && `; last found at ${formatNumber(result.depthCm, TENTH)} cm`}
            </Fact>
          )}
          <Fact label={`Suction catheter, at most ${result.suction.atMostPercent} % of the inner diameter`}>
            {result.suction.catheterFr === null ? (
              'none that is sold is small enough'
            ) : (
              <>
                <Value>{result.suction.catheterFr}</Value> Fr
              </>
            )}{' '}
            (bound {formatNumber(result.suction.atMostFr, TENTH)} Fr)
          </Fact>
          <Fact label="Cuff, by the band of the unit">{cuffInWords(result.cuff)}</Fact>
        </dl>
      )}
    </AidPanel>
  );
}

function Fact({ label, children }: { label: string; children: ReactNode }) {
  return (
    <div>
      <dt className="text-ink-muted text-sm">{label}</dt>
      <dd>{children}</dd>
    </div>
  );
}

function Value({ children }: { children: ReactNode }) {
  return <span className="font-bold text-xl tabular-nums">{children}</span>;
}

const STATES = { below: 'below the band', within: 'within the band', above: 'above the band' } as const;

function cuffInWords(cuff: TubeAid['cuff']): ReactNode {
  if (!cuff) return 'no cuff';
  const now =
    cuff.nowCmH2O === null || cuff.state === null
      ? null
      : `; now ${formatNumber(cuff.nowCmH2O, TENTH)}, ${STATES[cuff.state]}`;
  return (
    <>
      <Value>
        {cuff.low} to {cuff.high}
      </Value>{' '}
      cmH2O{now}
    </>
  );
}
