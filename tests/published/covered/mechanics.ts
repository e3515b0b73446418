import {
  breathTiming,
  deadSpaceFraction,
  drivingPressure,
  dynamicCompliance,
  mechanicalPowerPressureControl,
  mechanicalPowerVolumeControl,
  mechanicalPowerWithoutPlateau,
  mmHgFromKpa,
  predictedBodyWeight,
  rapidShallowBreathingIndex,
  rateForTargetPaco2,
  roxIndex,
  staticCompliance,
  tidalVolumePerKg,
  timeConstant,
  ventilatoryRatio,
} from '@windrow/ventilation';
import { expect } from 'vitest';
import { numberAt, type Row, textAt } from '../rows.ts';
import { type Check, expectNear } from './expectations.ts';

const CM_PER_INCH = 2.54;

export const MECHANICS: readonly Check[] = [
  [/^PBW-(R1|[FM]\d+)$/, predictedWeightRow],
  [
    /^PBW-CM-/,
    (row) => {
      expectNear(row, 'pbw_kg_inch_form', weight(row, numberAt(row.inputs, 'height_cm')));
    },
  ],
  [
    /^PBW-SLOPE$/,
    (row) => {
      const heightCm = numberAt(row.inputs, 'height_cm');
      const centimetreForm = 50 + 0.91 * (heightCm - 152.4);
      expectNear(row, 'difference_kg', centimetreForm - predictedBodyWeight({ sex: 'male', heightCm }));
    },
  ],
  [/^CPL-\d$/, complianceRow],
  [
    /^CPL-AUTO$/,
    (row) => {
      const tidalVolumeMl = numberAt(row.inputs, 'vt_ml');
      const plateauCmH2O = numberAt(row.inputs, 'pplat_cmh2o');
      const setPeep = numberAt(row.inputs, 'peep_set_cmh2o');
      const totalPeepCmH2O = setPeep + numberAt(row.inputs, 'auto_peep_cmh2o');
      const ignored = staticCompliance({ tidalVolumeMl, plateauCmH2O, totalPeepCmH2O: setPeep });
      expectNear(
        row,
        'cstat_ml_per_cmh2o',
        staticCompliance({ tidalVolumeMl, plateauCmH2O, totalPeepCmH2O }),
      );
      expectNear(row, 'driving_pressure_cmh2o', drivingPressure({ plateauCmH2O, totalPeepCmH2O }));
      expectNear(row, 'cstat_if_auto_peep_ignored', ignored);
    },
  ],
  [
    /^DP-EQ$/,
    (row) => {
      // Any breath of this volume and compliance: the plateau stands volume ÷ compliance above PEEP.
      const tidalVolumeMl = numberAt(row.inputs, 'vt_ml');
      const compliance = numberAt(row.inputs, 'crs_ml_per_cmh2o');
      const breath = { plateauCmH2O: 8 + tidalVolumeMl / compliance, totalPeepCmH2O: 8 };
      expectNear(row, 'driving_pressure_cmh2o', drivingPressure(breath));
      expect(staticCompliance({ tidalVolumeMl, ...breath })).toBeCloseTo(compliance, 9);
    },
  ],
  [
    /^TAU-\d$/,
    (row) => {
      const seconds = timeConstant({
        complianceMlCmH2O: numberAt(row.inputs, 'c_ml_per_cmh2o'),
        resistanceCmH2OPerLS: numberAt(row.inputs, 'r_cmh2o_per_L_per_s'),
      });
      expectNear(row, 'tau_s', seconds);
      expectNear(row, 'three_tau_s', 3 * seconds);
    },
  ],
  [
    /^IE-1$/,
    (row) => {
      const timing = breathTiming({
        ratePerMin: numberAt(row.inputs, 'rr_per_min'),
        inspiratoryTimeS: numberAt(row.inputs, 'ti_s'),
      });
      expectNear(row, 'ttot_s', timing.cycleS);
      expectNear(row, 'te_s', timing.expiratoryTimeS);
      expectNear(row, 'e_per_i', timing.expiratoryPerInspiratory);
    },
  ],
  [
    /^MP-VC\d$/,
    (row) => {
      const power = mechanicalPowerVolumeControl({
        ratePerMin: numberAt(row.inputs, 'rr_per_min'),
        tidalVolumeMl: numberAt(row.inputs, 'vt_L') * 1000,
        peakCmH2O: numberAt(row.inputs, 'ppeak_cmh2o'),
        plateauCmH2O: numberAt(row.inputs, 'pplat_cmh2o'),
        peepCmH2O: numberAt(row.inputs, 'peep_cmh2o'),
      });
      expectNear(row, 'mp_J_per_min', power);
    },
  ],
  [/^MP-EXT\d$/, extendedPowerRow],
  [
    /^MP-PC3$/,
    (row) => {
      const power = mechanicalPowerPressureControl({
        ratePerMin: numberAt(row.inputs, 'rr_per_min'),
        tidalVolumeMl: numberAt(row.inputs, 'vt_L') * 1000,
        inspiratoryPressureCmH2O: numberAt(row.inputs, 'dPinsp_cmh2o'),
        peepCmH2O: numberAt(row.inputs, 'peep_cmh2o'),
      });
      expectNear(row, 'mp_J_per_min', power);
    },
  ],
  [
    /^MP-GIO\d$/,
    (row) => {
      const power = mechanicalPowerWithoutPlateau({
        minuteVentilationLMin: numberAt(row.inputs, 've_L_per_min'),
        peakCmH2O: numberAt(row.inputs, 'ppeak_cmh2o'),
        peepCmH2O: numberAt(row.inputs, 'peep_cmh2o'),
        inspiratoryFlowLMin: numberAt(row.inputs, 'flow_L_per_min'),
      });
      expectNear(row, 'mp_J_per_min', power);
    },
  ],
  [
    /^MP-MONO$/,
    (row) => {
      // Without resistance and PEEP nothing but the elastic term is left.
      const elastic = (litres: number) => {
        const stretch = litres * numberAt(row.inputs, 'E_cmh2o_per_L');
        return mechanicalPowerVolumeControl({
          ratePerMin: numberAt(row.inputs, 'rr_per_min'),
          tidalVolumeMl: litres * 1000,
          peakCmH2O: stretch,
          plateauCmH2O: stretch,
          peepCmH2O: 0,
        });
      };
      expectNear(row, 'at_0.25L', elastic(0.25));
      expectNear(row, 'at_0.50L', elastic(0.5));
      expectNear(row, 'ratio', elastic(0.5) / elastic(0.25));
    },
  ],
  [
    /^VR-(\d|KPA)$/,
    (row) => {
      const kpa = row.inputs.paco2_kPa;
      const ratio = ventilatoryRatio({
        minuteVentilationLMin: numberAt(row.inputs, 've_mL_per_min') / 1000,
        paco2MmHg: typeof kpa === 'number' ? mmHgFromKpa(kpa) : numberAt(row.inputs, 'paco2_mmHg'),
        predictedBodyWeightKg: numberAt(row.inputs, 'pbw_kg'),
      });
      expectNear(row, 'vr', ratio);
    },
  ],
  [
    /^VD-R1$/,
    (row) => {
      const fraction = deadSpaceFraction({
        paco2MmHg: numberAt(row.inputs, 'paco2_mmHg'),
        mixedExpiredPco2MmHg: numberAt(row.inputs, 'peco2_mixed_mmHg'),
      });
      expectNear(row, 'vd_vt', fraction);
      expectNear(row, 'vd_ml', fraction * numberAt(row.inputs, 'vt_ml'));
    },
  ],
  [
    /^RR-\d$/,
    (row) => {
      const rate = rateForTargetPaco2({
        ratePerMin: numberAt(row.inputs, 'rr_per_min'),
        paco2MmHg: numberAt(row.inputs, 'paco2_mmHg'),
        targetPaco2MmHg: numberAt(row.inputs, 'target_paco2_mmHg'),
      });
      expectNear(row, 'new_rr', rate);
    },
  ],
  [
    /^ROX-\d$/,
    (row) => {
      const index = roxIndex({
        spo2Percent: numberAt(row.inputs, 'spo2_percent'),
        fio2: numberAt(row.inputs, 'fio2_fraction'),
        ratePerMin: numberAt(row.inputs, 'rr_per_min'),
      });
      expectNear(row, 'rox', index);
    },
  ],
  [
    /^RSBI-R?\d$/,
    (row) => {
      const index = rapidShallowBreathingIndex({
        ratePerMin: numberAt(row.inputs, 'rr_per_min'),
        tidalVolumeMl: numberAt(row.inputs, 'vt_ml'),
      });
      expectNear(row, 'rsbi', index);
      if ('at_or_below_105' in row.expected) expect(index <= 105).toBe(row.expected.at_or_below_105);
    },
  ],
];

function weight(row: Row, heightCm: number): number {
  return predictedBodyWeight({ sex: textAt(row.inputs, 'sex') === 'M' ? 'male' : 'female', heightCm });
}

function predictedWeightRow(row: Row): void {
  const predictedBodyWeightKg = weight(row, numberAt(row.inputs, 'height_in') * CM_PER_INCH);
  expectNear(row, 'pbw_kg', predictedBodyWeightKg);

  const chart = Object.keys(row.expected).filter((key) => key.startsWith('vt_'));
  for (const key of chart) {
    const mlPerKg = Number(/^vt_(\d)ml/.exec(key)?.[1] ?? numberAt(row.inputs, 'ml_per_kg'));
    expectNear(row, key, mlPerKg * predictedBodyWeightKg);
    const tidalVolumeMl = numberAt(row.expected, key);
    // The chart's volumes are whole mL, and read back as the step that they stand for.
    expect(tidalVolumePerKg({ tidalVolumeMl, predictedBodyWeightKg })).toBeCloseTo(mlPerKg, 1);
  }
}

function complianceRow(row: Row): void {
  const tidalVolumeMl = numberAt(row.inputs, 'vt_ml');
  const plateauCmH2O = numberAt(row.inputs, 'pplat_cmh2o');
  const peepCmH2O = numberAt(row.inputs, 'peep_cmh2o');
  const passive = { plateauCmH2O, totalPeepCmH2O: peepCmH2O };
  const moving = { tidalVolumeMl, peakCmH2O: numberAt(row.inputs, 'ppeak_cmh2o'), peepCmH2O };
  expectNear(row, 'driving_pressure_cmh2o', drivingPressure(passive));
  expectNear(row, 'cstat_ml_per_cmh2o', staticCompliance({ tidalVolumeMl, ...passive }));
  expectNear(row, 'cdyn_ml_per_cmh2o', dynamicCompliance(moving));
}

/** The extended form and ours are one equation: elastance × volume is the plateau over PEEP, resistance × flow the rest. */
function extendedPowerRow(row: Row): void {
  const ratePerMin = numberAt(row.inputs, 'rr_per_min');
  const litres = numberAt(row.inputs, 'vt_L');
  const peepCmH2O = numberAt(row.inputs, 'peep_cmh2o');
  const ratio = numberAt(row.inputs, 'I_over_E');
  const inspiratoryS = (60 / ratePerMin) * (ratio / (1 + ratio));
  const plateauCmH2O = peepCmH2O + litres * numberAt(row.inputs, 'elastance_cmh2o_per_L');
  const peakCmH2O = plateauCmH2O + (numberAt(row.inputs, 'raw_cmh2o_per_L_per_s') * litres) / inspiratoryS;
  const breath = { ratePerMin, tidalVolumeMl: litres * 1000, peakCmH2O, plateauCmH2O, peepCmH2O };
  expectNear(row, 'mp_J_per_min', mechanicalPowerVolumeControl(breath));
}
