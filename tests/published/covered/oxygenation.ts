import {
  alveolarArterialGradient,
  alveolarOxygen,
  berlinClass,
  globalArdsClass,
  kpaFromMmHg,
  oxygenationIndex,
  oxygenSaturationIndex,
  peepFio2Step,
  pfRatio,
  sfRatio,
} from '@windrow/ventilation';
import { ladderPosition } from '@windrow/ventilation/oxygenation/peep-fio2-ladders';
import { expect } from 'vitest';
import { numberAt, numbersAt, type Row, textAt } from '../rows.ts';
import { type Check, expectNear } from './expectations.ts';

export const OXYGENATION: readonly Check[] = [
  [
    /^PF-R2$/,
    (row) => {
      const ratio = pfRatio({
        pao2MmHg: numberAt(row.inputs, 'pao2_mmHg'),
        fio2: numberAt(row.inputs, 'fio2_fraction'),
      });
      expectNear(row, 'pf_mmHg', ratio);
    },
  ],
  [
    /^PF-KPA$/,
    (row) => {
      const kpa = numbersAt(row.inputs, 'pf_mmHg').map(kpaFromMmHg);
      const printed = numbersAt(row.expected, 'pf_kPa');
      expect(kpa.map((value, at) => Math.abs(value - Number(printed[at])) <= 0.01)).toEqual([
        true,
        true,
        true,
      ]);
    },
  ],
  [
    /^BERLIN-\d+$/,
    (row) => {
      const given = berlinClass({
        pfMmHg: numberAt(row.inputs, 'pf_mmHg'),
        peepCmH2O: numberAt(row.inputs, 'peep_cmh2o'),
      });
      expect(given ?? 'not-classifiable').toBe(textAt(row.expected, 'class'));
    },
  ],
  [
    /^SF-RICE1$/,
    (row) => {
      // The cut-offs stand where the class changes: an S/F exactly on one belongs below it.
      const classOn = (spo2Percent: number, fio2: number) =>
        globalArdsClass({ spo2Percent, fio2, support: 'invasive', peepCmH2O: 5 });
      expect(numbersAt(row.expected, 'sf')).toEqual([235, 315]);
      expect([classOn(94, 0.4), classOn(94.1, 0.4)]).toEqual(['moderate', 'mild']);
      expect([classOn(94.5, 0.3), classOn(94.6, 0.3)]).toEqual(['mild', 'none']);
    },
  ],
  [
    /^GLOBAL-\d$/,
    (row) => {
      const reading = {
        spo2Percent: numberAt(row.inputs, 'spo2_percent'),
        fio2: numberAt(row.inputs, 'fio2_fraction'),
      };
      expectNear(row, 'sf', sfRatio(reading));
      expect(globalArdsClass({ ...reading, support: 'invasive', peepCmH2O: 5 })).toBe(row.expected.class);
    },
  ],
  [
    /^GLOBAL-NONINT$/,
    (row) => {
      const spo2Percent = numberAt(row.inputs, 'spo2_percent');
      const fio2 = spo2Percent / numberAt(row.inputs, 'sf');
      const qualifies = numbersAt(row.inputs, 'flow_L_per_min').map(
        (flowLMin) =>
          globalArdsClass({ spo2Percent, fio2, support: 'high-flow', flowLMin }) === 'non-intubated',
      );
      expect(qualifies).toEqual(row.expected.qualifies);
    },
  ],
  [
    /^OI-(R1|3)$/,
    (row) => {
      const index = oxygenationIndex({
        meanAirwayPressureCmH2O: numberAt(row.inputs, 'map_cmh2o'),
        fio2: numberAt(row.inputs, 'fio2_fraction'),
        pao2MmHg: numberAt(row.inputs, 'pao2_mmHg'),
      });
      expectNear(row, 'oi', index);
    },
  ],
  [
    /^OSI-1$/,
    (row) => {
      const index = oxygenSaturationIndex({
        meanAirwayPressureCmH2O: numberAt(row.inputs, 'map_cmh2o'),
        fio2: numberAt(row.inputs, 'fio2_fraction'),
        spo2Percent: numberAt(row.inputs, 'spo2_percent'),
      });
      expectNear(row, 'osi', index);
    },
  ],
  [/^AAG-(R1|\d)$/, alveolarRow],
  [
    /^AAG-FULL$/,
    (row) => {
      expectNear(row, 'PAO2_mmHg', alveolarOxygen({ ...airOf(row), form: 'full' }));
    },
  ],
  [
    /^PEEP-(LOW|HIGH)$/,
    (row) => {
      const ladder = ladderOf(row);
      const pairs = Array.isArray(row.expected.pairs_fio2_peep) ? row.expected.pairs_fio2_peep : [];
      expect(pairs.length).toBeGreaterThan(10);
      for (const [fio2, peepCmH2O] of pairs) {
        expect(peepFio2Step({ fio2, peepCmH2O, ladder }).onLadder, `${fio2}/${peepCmH2O}`).toBe(true);
      }
      expect(walkedUp(ladder)).toEqual(pairs);
    },
  ],
  [
    /^PEEP-(LOW|HIGH)-/,
    (row) => {
      const fio2 = numberAt(row.inputs, 'fio2_fraction');
      const ladder = ladderOf(row);
      const allowed = numbersAt(row.expected, 'peep_cmh2o');
      const low = Math.min(...allowed);
      const high = Math.max(...allowed);
      for (const peepCmH2O of allowed) {
        expect(peepFio2Step({ fio2, peepCmH2O, ladder })).toEqual({ onLadder: true, peepRange: [low, high] });
      }
      for (const peepCmH2O of [low - 1, high + 1]) {
        expect(peepFio2Step({ fio2, peepCmH2O, ladder }).onLadder).toBe(false);
      }
    },
  ],
];

/** Every step of a ladder, from below it to its end. */
function walkedUp(ladder: 'lower' | 'higher'): [fio2: number, peepCmH2O: number][] {
  const steps: [number, number][] = [];
  let { up } = ladderPosition({ fio2: 0.21, peepCmH2O: 0, ladder });
  while (up) {
    const fio2 = up.fio2Percent / 100;
    steps.push([fio2, up.peepCmH2O]);
    ({ up } = ladderPosition({ fio2, peepCmH2O: up.peepCmH2O, ladder }));
  }
  return steps;
}

function ladderOf(row: Row): 'lower' | 'higher' {
  return row.id.startsWith('PEEP-LOW') ? 'lower' : 'higher';
}

function airOf(row: Row) {
  // One worked sheet prints the factor 1.2 instead of a quotient.
  const { factor } = row.inputs;
  return {
    barometricMmHg: numberAt(row.inputs, 'pb_mmHg'),
    fio2: numberAt(row.inputs, 'fio2_fraction'),
    paco2MmHg: numberAt(row.inputs, 'paco2_mmHg'),
    respiratoryQuotient: typeof factor === 'number' ? 1 / factor : numberAt(row.inputs, 'R'),
  };
}

function alveolarRow(row: Row): void {
  const air = { ...airOf(row), form: 'simplified' } as const;
  const pao2MmHg = numberAt(row.inputs, 'pao2_mmHg');
  expectNear(row, 'PAO2_mmHg', alveolarOxygen(air));
  expectNear(row, 'a_a_mmHg', alveolarArterialGradient({ ...air, pao2MmHg }));
  expectNear(row, 'a_over_A', pao2MmHg / alveolarOxygen(air));
}
