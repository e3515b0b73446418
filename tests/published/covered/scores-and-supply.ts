import {
  blendedFio2,
  cylinderDuration,
  erlangB,
  expectedTubeDepth,
  hacorScore,
  liquidOxygenGas,
  murrayScore,
  offeredForBlocking,
  oxygenFlow,
  poissonBinomial,
  respiratorySofa,
  suctionCatheterMaxFr,
} from '@windrow/ventilation';
import { expect } from 'vitest';
import { numberAt, numbersAt, type Row, textAt } from '../rows.ts';
import { type Check, expectNear } from './expectations.ts';

export const SCORES_AND_SUPPLY: readonly Check[] = [
  [
    /^ETT-HFORM$/,
    (row) => {
      expectNear(row, 'cm', expectedTubeDepth({ heightCm: numberAt(row.inputs, 'height_cm') }));
    },
  ],
  [
    /^SUC-\d\.0$/,
    (row) => {
      const largest = suctionCatheterMaxFr({ tubeInternalDiameterMm: numberAt(row.inputs, 'ett_id_mm') });
      expectNear(row, 'max_fr_50pct', largest);
      expectNear(row, 'largest_even_fr_not_above', Math.floor(largest / 2) * 2);
    },
  ],
  [
    /^SUC-CPG$/,
    (row) => {
      const outerMm = suctionCatheterMaxFr({ tubeInternalDiameterMm: 7 }) / 3;
      expect(outerMm / 7).toBeCloseTo(numberAt(row.expected, 'adult_max_ratio'), 12);
    },
  ],
  [
    /^O2-R1$/,
    (row) => {
      const airLMin = numberAt(row.inputs, 'air_L_per_min');
      const oxygenLMin = numberAt(row.inputs, 'o2_L_per_min');
      expectNear(row, 'fio2_fraction', blendedFio2({ airLMin, oxygenLMin }));
    },
  ],
  [
    /^O2-R3$/,
    (row) => {
      const fio2 = numberAt(row.inputs, 'fio2_percent') / 100;
      const totalFlowLMin = numberAt(row.expected, 'total_L_per_min');
      const oxygenLMin = oxygenFlow({ totalFlowLMin, fio2 });
      expectNear(row, 'o2_L_per_min', oxygenLMin);
      expect(blendedFio2({ airLMin: totalFlowLMin - oxygenLMin, oxygenLMin })).toBeCloseTo(fio2, 12);
    },
  ],
  [
    /^O2-BLEND\d$/,
    (row) => {
      const totalFlowLMin = numberAt(row.inputs, 'total_flow_L_per_min');
      const fio2 = numberAt(row.inputs, 'fio2_fraction');
      expectNear(row, 'o2_L_per_min', oxygenFlow({ totalFlowLMin, fio2 }));
    },
  ],
  [
    /^O2-VENT$/,
    (row) => {
      const totalFlowLMin =
        numberAt(row.inputs, 've_L_per_min') + numberAt(row.inputs, 'bias_flow_L_per_min');
      const fio2 = numberAt(row.inputs, 'fio2_fraction');
      expectNear(row, 'o2_L_per_min', oxygenFlow({ totalFlowLMin, fio2 }));
    },
  ],
  [
    /^CYL-F-/,
    (row) => {
      // One psi above an empty reserve, drawn at 1 L/min, lasts as many minutes as it holds litres.
      const minutes = cylinderDuration({ cylinder: sizeOf(row), pressurePsi: 1, reservePsi: 0, flowLMin: 1 });
      expectNear(row, 'factor_L_per_psi', minutes);
    },
  ],
  [
    /^CYL-\d$/,
    (row) => {
      const minutes = cylinderDuration({
        cylinder: sizeOf(row),
        pressurePsi: numberAt(row.inputs, 'psi'),
        reservePsi: numberAt(row.inputs, 'reserve_psi'),
        flowLMin: numberAt(row.inputs, 'flow_L_per_min'),
      });
      expectNear(row, 'minutes', minutes);
    },
  ],
  [
    /^LOX-1$/,
    (row) => {
      const litres = liquidOxygenGas({ kind: 'pounds', amount: numberAt(row.inputs, 'lb') });
      expectNear(row, 'minutes', litres / numberAt(row.inputs, 'flow_L_per_min'));
    },
  ],
  [
    /^ERL(1|2)?-\d+$/,
    (row) => {
      const servers = numberAt(row.inputs, 'servers');
      const blocking = numberAt(row.inputs, 'blocking');
      expectNear(row, 'offered_erlang', offeredForBlocking({ servers, blocking }));
    },
  ],
  [
    /^ERLB-\d$/,
    (row) => {
      const servers = numberAt(row.inputs, 'servers');
      const offeredErlangs = numberAt(row.inputs, 'offered_erlang');
      expectNear(row, 'blocking', erlangB({ servers, offeredErlangs }));
    },
  ],
  [
    /^ERL-LOAD$/,
    (row) => {
      const servers = numberAt(row.inputs, 'servers');
      const offeredErlangs =
        numberAt(row.inputs, 'arrivals_per_day') * numberAt(row.inputs, 'mean_stay_days');
      const blocking = erlangB({ servers, offeredErlangs });
      expectNear(row, 'offered_erlang', offeredErlangs);
      expectNear(row, 'blocking', blocking);
      expectNear(row, 'carried', offeredErlangs * (1 - blocking));
      expectNear(row, 'occupancy', (offeredErlangs * (1 - blocking)) / servers);
    },
  ],
  [
    /^POIS-\d$/,
    (row) => {
      // Blocking is the chance of exactly n over that of at most n; the printed chances are rounded to 1e-4.
      const blocking = erlangB({
        servers: numberAt(row.inputs, 'k'),
        offeredErlangs: numberAt(row.inputs, 'mean'),
      });
      expect(blocking).toBeCloseTo(numberAt(row.expected, 'p_eq') / numberAt(row.expected, 'p_le'), 3);
    },
  ],
  [/^PBIN-\d$/, distributionRow],
  [
    /^HACOR-BANDS$/,
    (row) => {
      const worst = { heartRatePerMin: 180, ph: 7.0, glasgowComaScale: 3, pfMmHg: 60, ratePerMin: 60 };
      const best = { heartRatePerMin: 80, ph: 7.4, glasgowComaScale: 15, pfMmHg: 400, ratePerMin: 16 };
      expect([hacorScore(best), hacorScore(worst)]).toEqual([0, numberAt(row.expected, 'max')]);
    },
  ],
  [
    /^HACOR-\d$/,
    (row) => {
      const score = hacorScore({
        heartRatePerMin: numberAt(row.inputs, 'hr'),
        ph: numberAt(row.inputs, 'ph'),
        glasgowComaScale: numberAt(row.inputs, 'gcs'),
        pfMmHg: numberAt(row.inputs, 'pf'),
        ratePerMin: numberAt(row.inputs, 'rr'),
      });
      expect(score).toBe(numberAt(row.expected, 'score'));
    },
  ],
  [
    /^SOFA-R\d+$/,
    (row) => {
      const supported = row.inputs.ventilatory_support === true;
      const points = respiratorySofa({ pfMmHg: numberAt(row.inputs, 'pf_mmHg'), supported });
      expect(points).toBe(numberAt(row.expected, 'points'));
    },
  ],
  [
    /^MURRAY-\d$/,
    (row) => {
      const compliance = row.inputs.compliance_ml_per_cmh2o;
      const score = murrayScore({
        quadrants: numberAt(row.inputs, 'quadrants'),
        pfMmHg: numberAt(row.inputs, 'pf'),
        peepCmH2O: numberAt(row.inputs, 'peep'),
        complianceMlCmH2O: typeof compliance === 'number' ? compliance : null,
      });
      expectNear(row, 'score', score);
    },
  ],
];

function sizeOf(row: Row): 'D' | 'E' | 'M' | 'G' | 'H' {
  const size = textAt(row.inputs, 'size');
  const known = (['D', 'E', 'M', 'G', 'H'] as const).find((each) => each === size);
  if (!known) throw new Error(`no cylinder ${size}`);
  return known;
}

function distributionRow(row: Row): void {
  const pmf = poissonBinomial({ probabilities: numbersAt(row.inputs, 'p') });
  const printed = numbersAt(row.expected, 'pmf');
  expect(pmf).toHaveLength(printed.length);
  pmf.forEach((chance, at) => {
    expect(chance).toBeCloseTo(Number(printed[at]), 10);
  });
  const mean = pmf.reduce((sum, chance, count) => sum + chance * count, 0);
  expectNear(row, 'mean', mean);
  expectNear(
    row,
    'variance',
    pmf.reduce((sum, chance, count) => sum + chance * (count - mean) ** 2, 0),
  );
}
