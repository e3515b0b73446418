import {
  bicarbonate,
  cmH2OFromMmHg,
  expectedPaco2Winters,
  gasConsistency,
  hPaFromCmH2O,
  hydrogenIon,
  kpaFromMmHg,
} from '@windrow/ventilation';
import { expect } from 'vitest';
import { numberAt, numbersAt, type Row } from '../rows.ts';
import { type Check, expectNear } from './expectations.ts';

export const ACID_BASE: readonly Check[] = [
  [
    /^H-\d\.\d$/,
    (row) => {
      expectNear(row, 'h_nmol_per_L', hydrogenIon({ ph: numberAt(row.inputs, 'pH') }));
    },
  ],
  [
    /^HH-R\d$/,
    (row) => {
      expectNear(row, 'ph_rounded', consistency(row, 7.4).expectedPh);
    },
  ],
  [
    /^HH-\d$/,
    (row) => {
      const { expectedPh } = consistency(row, 7.4);
      expectNear(row, 'ph_0.03', expectedPh);
      const paco2MmHg = numberAt(row.inputs, 'paco2_mmHg');
      expect(bicarbonate({ ph: expectedPh, paco2MmHg })).toBeCloseTo(
        numberAt(row.inputs, 'hco3_mmol_per_L'),
        9,
      );
    },
  ],
  [
    /^ABG-CONS\d$/,
    (row) => {
      const ph = numberAt(row.inputs, 'pH');
      expectNear(row, 'h_from_ph', hydrogenIon({ ph }));
      expect(consistency(row, ph).consistent).toBe(row.expected.consistent);
    },
  ],
  [
    /^WINTER-4$/,
    (row) => {
      const band = expectedPaco2Winters({ bicarbonateMmolL: numberAt(row.inputs, 'hco3_mmol_per_L') });
      expectNear(row, 'low', band.low);
      expectNear(row, 'paco2_mmHg', band.mid);
      expectNear(row, 'high', band.high);
    },
  ],
  [
    /^UNIT-KPA2$/,
    (row) => {
      expectNear(row, 'kPa', kpaFromMmHg(numberAt(row.inputs, 'mmHg')));
    },
  ],
  [
    /^UNIT-H2O1$/,
    (row) => {
      expectNear(row, 'hPa', hPaFromCmH2O(numberAt(row.inputs, 'cmH2O')));
      expectNear(row, 'kPa', hPaFromCmH2O(numberAt(row.inputs, 'cmH2O')) / 10);
    },
  ],
  [
    /^UNIT-H2O2$/,
    (row) => {
      expectNear(row, 'cmH2O', cmH2OFromMmHg(numberAt(row.inputs, 'mmHg')));
    },
  ],
  [
    /^CUFF-MMHG$/,
    (row) => {
      const printed = numbersAt(row.expected, 'cmH2O');
      numbersAt(row.inputs, 'mmHg').forEach((mmHg, at) => {
        expect(Math.abs(cmH2OFromMmHg(mmHg) - Number(printed[at]))).toBeLessThanOrEqual(0.01);
      });
    },
  ],
];

function consistency(row: Row, ph: number) {
  return gasConsistency({
    ph,
    paco2MmHg: numberAt(row.inputs, 'paco2_mmHg'),
    bicarbonateMmolL: numberAt(row.inputs, 'hco3_mmol_per_L'),
  });
}
