import { ChoiceGroup } from '@windrow/ui/controls/choice-group';
import { TextField } from '@windrow/ui/controls/text-field';
import type { Aid } from '@windrow/ventilation/aids/aid';
import {
  HACOR_RULE,
  hacorAid,
  MURRAY_RULE,
  murrayAid,
  type Points,
  SOFA_RULE,
  sofaAid,
} from '@windrow/ventilation/aids/score-aids';
import type { BedStay } from '@windrow/ventilation/contract/board';
import { wholeNumber } from '@windrow/ventilation/entry/whole-number';
import { useState } from 'react';
import { AidPanel, type Clock } from './aid-panel.tsx';

type PanelProps = { stay: BedStay; clock: Clock };

const QUADRANTS = ['0', '1', '2', '3', '4'].map((value) => ({ value, label: value }));

export function MurrayPanel({ stay, clock }: PanelProps) {
  const [quadrants, setQuadrants] = useState<string | null>(null);
  const aid = murrayAid({ stay, quadrants: quadrants === null ? null : Number(quadrants) });
  return (
    <AidPanel title="Lung injury score (Murray)" rule={MURRAY_RULE} {...aid} clock={clock}>
      <ChoiceGroup
        label="Quadrants with consolidation on the film"
        options={QUADRANTS}
        value={quadrants}
        onChoose={setQuadrants}
      />
      <PointsOf aid={aid} decimals={2} of={4} />
    </AidPanel>
  );
}

export function SofaPanel({ stay, clock }: PanelProps) {
  const aid = sofaAid(stay);
  return (
    <AidPanel title="Respiratory part of SOFA" rule={SOFA_RULE} {...aid} clock={clock}>
      <PointsOf aid={aid} decimals={0} of={4} />
    </AidPanel>
  );
}

const HEART_RATES = [0, 350] as const;
const COMA_SCALES = [3, 15] as const;

/** Heart rate and coma scale are asked for here and stored nowhere: the record has no place for them. */
export function HacorPanel({ stay, clock }: PanelProps) {
  const [heartRate, setHeartRate] = useState('');
  const [comaScale, setComaScale] = useState('');
  const rate = wholeNumber(heartRate, HEART_RATES);
  const coma = wholeNumber(comaScale, COMA_SCALES);
  const aid = hacorAid({ stay, heartRatePerMin: rate.value, glasgowComaScale: coma.value });
  return (
    <AidPanel title="HACOR, on a mask" rule={HACOR_RULE} {...aid} clock={clock}>
      <div className="grid gap-3 sm:grid-cols-2">
        <TextField
          label="Heart rate /min"
          inputMode="numeric"
          value={heartRate}
          error={rate.fault ?? undefined}
          onChange={(event) => setHeartRate(event.target.value)}
        />
        <TextField
          label="Glasgow coma scale"
          inputMode="numeric"
          value={comaScale}
          error={coma.fault ?? undefined}
          onChange={(event) => setComaScale(event.target.value)}
        />
      </div>
      <p className="text-ink-muted">Both are used here only, and recorded nowhere.</p>
      <PointsOf aid={aid} decimals={0} of={25} />
    </AidPanel>
  );
}

function PointsOf({ aid: { result }, decimals, of }: { aid: Aid<Points>; decimals: number; of: number }) {
  if (!result) return null;
  return (
    <p aria-live="polite">
      <span className="font-bold text-3xl tabular-nums">{result.points.toFixed(decimals)}</span>
      <span className="text-ink-muted"> of {of} points</span>
    </p>
  );
}
