import { describe, expect, it } from 'vitest';
import type { BedStay, Flag } from '../contract/board.ts';
import type { LimitKey } from '../entry/fields.ts';
import type { SupportId } from '../support/catalogue.ts';
import { FLAG_RULES } from './bed-flags.ts';
import {
  airway,
  check,
  emptying,
  flagsOf,
  gas,
  ids,
  limited,
  pause,
  power,
  QUIET_LIMITS,
  readings,
  VC,
  vt,
} from './example-stays.ts';

const VOLUMES: readonly string[] = ['lowVtMl', 'lowMinuteVolumeLMin'];

const EDGES: {
  id: string;
  level: Flag['level'];
  short: string;
  flagged: Omit<BedStay, 'flags'>;
  quiet: Omit<BedStay, 'flags'>;
}[] = [
  { id: 'vt-per-kg-high', level: 'attention', short: 'Vt 8.6 mL/kg', flagged: vt(860), quiet: vt(800) },
  { id: 'vt-per-kg-high', level: 'attention', short: 'Vt 8.01 mL/kg', flagged: vt(801), quiet: vt(800) },
  { id: 'vt-per-kg-above', level: 'note', short: 'Vt 8 mL/kg', flagged: vt(800), quiet: vt(801) },
  { id: 'vt-per-kg-above', level: 'note', short: 'Vt 6.51 mL/kg', flagged: vt(651), quiet: vt(650) },
  { id: 'plateau-high', level: 'attention', short: 'Plateau 31', flagged: pause(31), quiet: pause(30) },
  {
    id: 'plateau-high',
    level: 'attention',
    short: 'Plateau 31',
    flagged: pause(31, { passive: true }),
    quiet: pause(31, { passive: false }),
  },
  {
    id: 'plateau-high',
    level: 'attention',
    short: 'Plateau 31',
    flagged: pause(31, { passive: true }),
    quiet: pause(31, { passive: null }),
  },
  {
    id: 'driving-pressure-high',
    level: 'attention',
    short: 'Driving P 16',
    flagged: pause(36),
    quiet: pause(36, { passive: null }),
  },
  {
    id: 'driving-pressure-high',
    level: 'attention',
    short: 'Driving P 16',
    flagged: pause(36),
    quiet: pause(35),
  },
  {
    id: 'mechanical-power-high',
    level: 'note',
    short: 'Power 17.6 J/min',
    flagged: power(18),
    quiet: power(17),
  },
  {
    id: 'intrinsic-peep',
    level: 'attention',
    short: 'iPEEP 5',
    flagged: readings({ intrinsicPeepCmH2O: 5 }),
    quiet: readings({ intrinsicPeepCmH2O: 4 }),
  },
  {
    id: 'intrinsic-peep',
    level: 'attention',
    short: 'iPEEP 5',
    flagged: readings({ intrinsicPeepCmH2O: 5 }),
    quiet: readings({ intrinsicPeepCmH2O: 5 }, { passive: false }),
  },
  {
    id: 'fio2-high',
    level: 'note',
    short: 'FiO2 60 %',
    flagged: check({ settings: { ...VC, fio2Percent: 60 } }),
    quiet: check({ settings: { ...VC, fio2Percent: 59 } }),
  },
  {
    id: 'pf-low',
    level: 'attention',
    short: 'P/F 99',
    flagged: gas({ po2MmHg: 99, fio2Percent: 100 }),
    quiet: gas({ po2MmHg: 150, fio2Percent: 100 }),
  },
  {
    id: 'pf-low',
    level: 'note',
    short: 'P/F 100',
    flagged: gas({ po2MmHg: 100, fio2Percent: 100 }),
    quiet: gas({ po2MmHg: 90, fio2Percent: 100 }, { site: 'venous' }),
  },
  {
    id: 'pf-low',
    level: 'note',
    short: 'P/F 149',
    flagged: gas({ po2MmHg: 149, fio2Percent: 100 }),
    quiet: gas({ po2MmHg: 90 }),
  },
  {
    id: 'ph-low',
    level: 'attention',
    short: 'pH 7.24',
    flagged: gas({ ph: 7.24 }),
    quiet: gas({ ph: 7.25 }),
  },
  {
    id: 'gas-inconsistent',
    level: 'attention',
    short: 'Gas: check entry',
    flagged: gas({ ph: 7.45, pco2MmHg: 40, bicarbonateMmolL: 24 }),
    quiet: gas({ ph: 7.44, pco2MmHg: 40, bicarbonateMmolL: 24 }),
  },
  {
    id: 'cuff-out-of-band',
    level: 'attention',
    short: 'Cuff 19',
    flagged: airway({ cuffCmH2O: 19 }),
    quiet: airway({ cuffCmH2O: 20 }),
  },
  {
    id: 'cuff-out-of-band',
    level: 'attention',
    short: 'Cuff 31',
    flagged: airway({ cuffCmH2O: 31 }),
    quiet: airway({ cuffCmH2O: 30 }),
  },
  {
    id: 'cuff-out-of-band',
    level: 'attention',
    short: 'Cuff 18',
    flagged: airway({ cuffCmH2O: 18 }),
    quiet: airway({ cuffCmH2O: 18 }, { cuffed: false }),
  },
  {
    id: 'depth-moved',
    level: 'attention',
    short: 'Depth +2 cm',
    flagged: airway({ depthCm: 24 }),
    quiet: airway({ depthCm: 23.5 }),
  },
  {
    id: 'depth-moved',
    level: 'attention',
    short: 'Depth −2.5 cm',
    flagged: airway({ depthCm: 19.5 }),
    quiet: airway({ depthCm: 20.5 }),
  },
  {
    id: 'suction-catheter-small',
    level: 'note',
    short: 'Suction to 8 Fr',
    flagged: airway({}, { sizeMm: 6.5 }),
    quiet: airway({}, { sizeMm: 7 }),
  },
  {
    id: 'rate-above-set',
    level: 'note',
    short: 'Rate 28, set 18',
    flagged: readings({ rateTotalPerMin: 28 }),
    quiet: readings({ rateTotalPerMin: 27 }),
  },
  {
    id: 'expiratory-time-short',
    level: 'note',
    short: 'Te 1.4 s short',
    flagged: emptying(31),
    quiet: emptying(30),
  },
  {
    id: 'limit-off-high-pressure',
    level: 'attention',
    short: 'P limit off',
    flagged: limited({ highPressureCmH2O: 'off' }),
    quiet: limited({}),
  },
  {
    id: 'limit-off-low-vt',
    level: 'attention',
    short: 'Vt limit off',
    flagged: limited({ lowVtMl: 'off' }, {}, { mode: 'ac-vtpc' }),
    quiet: limited({ lowVtMl: 'off' }),
  },
  {
    id: 'limit-off-low-minute-volume',
    level: 'attention',
    short: 'MV limit off',
    flagged: limited({ lowMinuteVolumeLMin: 'off' }, {}, { mode: 'aprv' }),
    quiet: limited({ lowMinuteVolumeLMin: 'off' }),
  },
  {
    id: 'limit-off-high-rate',
    level: 'attention',
    short: 'Rate limit off',
    flagged: limited({ highRatePerMin: 'off' }, {}, { mode: 'simv-vc' }),
    quiet: limited({ highRatePerMin: 'off' }),
  },
  {
    id: 'limit-off-apnoea',
    level: 'attention',
    short: 'Apnoea off',
    flagged: limited({ apnoeaS: 'off' }, {}, { mode: 'psv' }),
    quiet: limited({ apnoeaS: 'off' }),
  },
  {
    id: 'limit-off-apnoea',
    level: 'attention',
    short: 'Apnoea off',
    flagged: limited({ apnoeaS: 'off' }, {}, { mode: 'niv-cpap' }),
    quiet: limited({}, {}, { mode: 'niv-cpap' }),
  },
  {
    id: 'limit-passed-high-pressure',
    level: 'attention',
    short: 'P past limit',
    flagged: limited({ highPressureCmH2O: 40 }, { peakCmH2O: 40 }),
    quiet: limited({ highPressureCmH2O: 40 }, { peakCmH2O: 39 }),
  },
  {
    id: 'limit-passed-low-vt',
    level: 'attention',
    short: 'Vt past limit',
    flagged: limited({ lowVtMl: 400 }, { vtExhaledMl: 400 }),
    quiet: limited({ lowVtMl: 400 }, { vtExhaledMl: 401 }),
  },
  {
    id: 'limit-passed-low-minute-volume',
    level: 'attention',
    short: 'MV past limit',
    flagged: limited({ lowMinuteVolumeLMin: 5 }, { minuteVolumeLMin: 5 }),
    quiet: limited({ lowMinuteVolumeLMin: 5 }, { minuteVolumeLMin: 5.1 }),
  },
  {
    id: 'limit-passed-high-minute-volume',
    level: 'attention',
    short: 'MV past limit',
    flagged: limited({ highMinuteVolumeLMin: 12 }, { minuteVolumeLMin: 12 }),
    quiet: limited({ highMinuteVolumeLMin: 12 }, { minuteVolumeLMin: 11.9 }),
  },
  {
    id: 'limit-passed-high-rate',
    level: 'attention',
    short: 'Rate past limit',
    flagged: limited({ highRatePerMin: 30 }, { rateTotalPerMin: 30 }),
    quiet: limited({ highRatePerMin: 30 }, { rateTotalPerMin: 29 }),
  },
  {
    id: 'limits-not-recorded',
    level: 'note',
    short: 'No limits noted',
    flagged: check({ settings: VC, limits: {} }),
    quiet: check({ mode: 'hfov', limits: {} }),
  },
  {
    id: 'limits-not-recorded',
    level: 'note',
    short: 'Limit not noted',
    flagged: check({ mode: 'ac-pc', limits: { lowVtMl: 200 } }),
    quiet: check({ mode: 'ac-pc', limits: { lowVtMl: 200, lowMinuteVolumeLMin: 4 } }),
  },
  {
    id: 'limits-not-recorded',
    level: 'note',
    short: 'Limit not noted',
    flagged: check({ mode: 'simv-vc', limits: { highPressureCmH2O: 40 } }),
    quiet: check({ mode: 'ac-vc', limits: { highPressureCmH2O: 40 } }),
  },
  ...missing('limit-missing-high-pressure', 'P limit missing', 'highPressureCmH2O', [
    'ac-vc',
    'simv-vc',
    'ac-vtpc',
  ]),
  ...missing('limit-missing-low-vt', 'Vt limit missing', 'lowVtMl', ['ac-pc', 'simv-pc', 'psv', 'ac-vtpc']),
  ...missing('limit-missing-low-minute-volume', 'MV limit missing', 'lowMinuteVolumeLMin', [
    'aprv',
    'niv-st',
  ]),
  ...missing('limit-missing-apnoea', 'Apnoea missing', 'apnoeaS', ['psv', 'cpap']),
];

/** All limits recorded but the one; and that one recorded too. */
function missing(id: string, short: string, key: LimitKey, modes: readonly SupportId[]) {
  const others = Object.fromEntries(
    Object.entries(QUIET_LIMITS).filter(([other]) => other !== key && !VOLUMES.includes(other)),
  );
  return modes.map((mode) => ({
    id,
    level: 'attention' as const,
    short,
    flagged: check({ mode, limits: others }),
    quiet: check({ mode, limits: { ...others, [key]: QUIET_LIMITS[key] ?? 'off' } }),
  }));
}

it('names a limit within a sentence with only its first letter small', () => {
  const sentences = flagsOf(check({ mode: 'ac-pc', limits: {} })).map(({ sentence }) => sentence);
  expect(sentences.join(' ')).toContain('low exhaled Vt limit');
});

describe('each rule, at both sides of its edge', () => {
  it.each(EDGES)(
    '$id raises "$short" and keeps quiet one step away',
    ({ id, level, short, flagged, quiet }) => {
      expect(flagsOf(flagged).filter((flag) => flag.id === id)).toMatchObject([{ level, short }]);
      expect(ids(quiet)).not.toContain(id);
    },
  );

  it('has an edge for every rule that can find something', () => {
    const tried = new Set(EDGES.map(({ id }) => id));
    // High minute volume is required by no mode; an apnoea time has no reading to pass it.
    const never = [
      'limit-off-high-minute-volume',
      'limit-missing-high-minute-volume',
      // A high rate limit that is not recorded is noted, not asked for.
      'limit-missing-high-rate',
      'limit-passed-apnoea',
      // Their edges are in time, and stand beside the screen that they follow from.
      'ready-to-try',
      'trial-due',
    ];
    expect(FLAG_RULES.map(({ id }) => id).filter((id) => !tried.has(id))).toEqual(never);
  });

  it('notes a volume below the limit only where the ventilator gives the breath', () => {
    expect(ids(vt(700))).toContain('vt-per-kg-above');
    expect(ids(vt(700, 'psv'))).not.toContain('vt-per-kg-above');
    expect(ids(vt(860, 'psv'))).toContain('vt-per-kg-high');
  });

  it('asks once for a volume limit: the minute volume stands in where the mode wants no other', () => {
    const high = { highPressureCmH2O: 40 };
    expect(ids(check({ mode: 'ac-pc', limits: high }))).toEqual([
      'limit-missing-low-vt',
      'limits-not-recorded',
    ]);
    expect(ids(check({ mode: 'niv-st', limits: { ...high, lowVtMl: 200 } }))).toEqual([
      'limits-not-recorded',
    ]);
  });

  it('only notes limits where none at all was recorded', () => {
    expect(ids(check({ mode: 'ac-pc', limits: {} }))).toEqual(['limits-not-recorded']);
  });

  it('gives with a limit that is off or missing the reading that goes unguarded', () => {
    const stay = check({ mode: 'ac-pc', readings: { vtExhaledMl: 410 }, limits: { highPressureCmH2O: 40 } });
    const found = flagsOf(stay).find(({ id }) => id === 'limit-missing-low-vt');
    expect(found?.inputs.map(({ label, value }) => [label, value])).toEqual([['Exhaled Vt', 410]]);
  });

  it('says P/F once, at its higher level', () => {
    expect(flagsOf(gas({ po2MmHg: 80, fio2Percent: 100 })).map(({ id, level }) => [id, level])).toEqual([
      ['pf-low', 'attention'],
    ]);
  });
});
