import { describe, expect, it } from 'vitest';
import { failureSigns, type TrialMeasurements } from './trial-failure.ts';

describe('failureSigns', () => {
  it.each<[string, TrialMeasurements, TrialMeasurements, string[]]>([
    ['a rate of 35', { ratePerMin: 35 }, {}, []],
    ['a rate of 36', { ratePerMin: 36 }, {}, ['rate']],
    ['a rate up by half exactly', { ratePerMin: 33 }, { ratePerMin: 22 }, ['rate']],
    ['a rate up by less than half', { ratePerMin: 32 }, { ratePerMin: 22 }, []],
    ['a saturation of 90', { sao2Percent: 90 }, {}, []],
    ['a saturation of 89', { sao2Percent: 89 }, {}, ['oxygenation']],
    ['a PaO2 of 60 on half oxygen', { pao2MmHg: 60, fio2Percent: 50 }, {}, ['oxygenation']],
    ['a PaO2 of 60 on less oxygen', { pao2MmHg: 60, fio2Percent: 49 }, {}, []],
    ['a PaO2 of 61', { pao2MmHg: 61, fio2Percent: 60 }, {}, []],
    ['a CO2 of 50', { paco2MmHg: 50 }, {}, []],
    ['a CO2 of 50 that rose by 8', { paco2MmHg: 50 }, { paco2MmHg: 42 }, []],
    ['a CO2 of 50 that rose by 9', { paco2MmHg: 50 }, { paco2MmHg: 41 }, ['carbon-dioxide']],
    ['a pH of 7.32', { ph: 7.32 }, {}, []],
    ['a pH down by 0.07 exactly', { ph: 7.35 }, { ph: 7.42 }, ['ph']],
    ['a pH down by 0.06', { ph: 7.36 }, { ph: 7.42 }, []],
    ['a heart rate of 140', { heartRatePerMin: 140 }, {}, []],
    ['a heart rate up by a fifth', { heartRatePerMin: 120 }, { heartRatePerMin: 100 }, ['heart-rate']],
    ['a systolic pressure of 180', { systolicMmHg: 180 }, {}, []],
    ['a systolic pressure of 89', { systolicMmHg: 89 }, {}, ['blood-pressure']],
    ['an index of 105', { rsbiPerMinL: 105 }, {}, []],
    ['nothing measured', {}, { ratePerMin: 20 }, []],
  ])('of %s says what it should', (_, now, start, expected) => {
    expect(failureSigns({ now, start })).toEqual(expected);
  });
});
