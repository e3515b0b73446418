import * as ventilation from '@windrow/ventilation';
import { describe, expect, it } from 'vitest';
import { callWith, EXAMPLE_ENTRIES, EXAMPLES } from './valid-inputs.ts';

const ANY_NUMBER = [
  Number.NaN,
  Number.POSITIVE_INFINITY,
  Number.NEGATIVE_INFINITY,
  -1,
  -1e-9,
  1e9,
  '5',
  '',
  {},
  true,
];
const ANY_WORD = ['elephant', '', 'toString', 'constructor', 7, {}, null];
const ANY_DAY = [
  '2024-02-30',
  '2023-02-29',
  '2024-13-01',
  '24-01-01',
  '2024-3-1',
  '2024-03-01T00:00:00Z',
  20240301,
  '',
];
const ANY_INSTANT = [
  '2024-03-01T10:00:00',
  '2024-02-30T10:00:00Z',
  '2024-03-01',
  '2024-03-01T25:00:00Z',
  'now',
  0,
  '',
];

/** The refusal names the key and the value; a range or the accepted words are checked below. */
function expectRefusal(call: () => unknown, key: string, value: unknown): void {
  const shown = typeof value === 'string' ? JSON.stringify(value) : String(value);
  expect(call, `${key}: ${shown}`).toThrow(RangeError);
  expect(call).toThrow(new RegExp(`^${escaped(key)} must .*not ${escaped(shown)}$`));
}

function escaped(text: string): string {
  return text.replace(/[.*+?^${}()|[\]\\]/g, '\\$&');
}

describe.each(EXAMPLE_ENTRIES)('%s', (name, { input, optional = [] }) => {
  it('accepts the example, and the same again', () => {
    expect(callWith(name, input)).toEqual(callWith(name, structuredClone(input)));
  });

  it('leaves its input as it was', () => {
    const frozen = JSON.stringify(input);
    callWith(name, input);
    expect(JSON.stringify(input)).toBe(frozen);
  });

  for (const [key, value] of Object.entries(input)) {
    if (!optional.includes(key)) {
      it(`refuses a missing ${key}`, () => {
        const { [key]: _, ...rest } = input;
        expect(() => callWith(name, { ...rest })).toThrow(RangeError);
        expect(() => callWith(name, { ...rest })).toThrow(new RegExp(`^${key}\\b.*not undefined$`));
      });
    }

    if (optional.includes(key)) {
      it(`works without ${key}`, () => {
        const { [key]: _, ...rest } = input;
        expect(() => callWith(name, rest)).not.toThrow();
      });
    }

    if (typeof value === 'number') {
      it(`refuses text, not-a-number and impossible values for ${key}`, () => {
        for (const wrong of ANY_NUMBER)
          expectRefusal(() => callWith(name, { ...input, [key]: wrong }), key, wrong);
      });
    }

    if (typeof value === 'boolean') {
      it(`refuses anything but true and false for ${key}`, () => {
        for (const wrong of ANY_WORD)
          expectRefusal(() => callWith(name, { ...input, [key]: wrong }), key, wrong);
      });
    }
  }
});

describe('null', () => {
  const nullable = ['murrayScore.complianceMlCmH2O', 'freshness.observedAt'];

  it.each(EXAMPLE_ENTRIES)(
    'is refused by %s wherever missing is not a word of the contract',
    (name, { input }) => {
      for (const key of Object.keys(input).filter((each) => !nullable.includes(`${name}.${each}`))) {
        expect(() => callWith(name, { ...input, [key]: null }), key).toThrow(RangeError);
        expect(() => callWith(name, { ...input, [key]: null }), key).toThrow(key);
      }
    },
  );
});

describe('words', () => {
  it.each([
    ['predictedBodyWeight', 'sex', 'male, female'],
    ['alveolarOxygen', 'form', 'simplified, full'],
    ['alveolarArterialGradient', 'form', 'simplified, full'],
    ['globalArdsClass', 'support', 'invasive, mask, high-flow, none'],
    ['peepFio2Step', 'ladder', 'lower, higher'],
    ['cylinderDuration', 'cylinder', 'D, E, M, G, H'],
    ['liquidOxygenGas', 'kind', 'litres, pounds'],
    ['freshness', 'kind', 'check'],
  ] as const)('of %s.%s are %s and no other', (name, key, words) => {
    for (const wrong of ANY_WORD) {
      const call = () => callWith(name, { ...EXAMPLES[name].input, [key]: wrong });
      expectRefusal(call, key, wrong);
      expect(call).toThrow(`one of ${words}`);
    }
  });
});

describe('days, instants, zones and lists', () => {
  const daily = EXAMPLES.dailyMinimum.input;
  const infection = EXAMPLES.infectionRelated.input;
  const [listed] = EXAMPLES.ventilatorEvents.input.days;
  const fresh = EXAMPLES.freshness.input;

  it('refuses what is no calendar day', () => {
    for (const day of ANY_DAY) {
      expectRefusal(() => callWith('dailyMinimum', { ...daily, day }), 'day', day);
      expectRefusal(
        () => callWith('ventilatorEvents', { days: [listed, { ...listed, day }] }),
        'days[1].day',
        day,
      );
      for (const key of ['onset', 'ventilationDayOne']) {
        const event = { ...infection.event, [key]: day };
        expectRefusal(() => callWith('infectionRelated', { ...infection, event }), `event.${key}`, day);
      }
      for (const key of ['temperatures', 'whiteCells'] as const) {
        const rows = [{ ...infection[key][0], day }];
        expectRefusal(
          () => callWith('infectionRelated', { ...infection, [key]: rows }),
          `${key}[0].day`,
          day,
        );
      }
      const antimicrobialDays = [{ agent: 'A', days: ['2024-03-01', day] }];
      expectRefusal(
        () => callWith('infectionRelated', { ...infection, antimicrobialDays }),
        'antimicrobialDays[0].days[1]',
        day,
      );
    }
  });

  it('refuses what is no instant with its offset', () => {
    for (const at of ANY_INSTANT) {
      const samples = [{ at, value: 5 }];
      expectRefusal(() => callWith('dailyMinimum', { ...daily, samples }), 'samples[0].at', at);
      expectRefusal(() => callWith('freshness', { ...fresh, now: at }), 'now', at);
      expectRefusal(() => callWith('freshness', { ...fresh, observedAt: at }), 'observedAt', at);
    }
  });

  it('refuses an unknown time zone instead of taking the machine’s', () => {
    for (const timeZone of ['Mars/Olympus', '', undefined, null, 2]) {
      expectRefusal(() => callWith('dailyMinimum', { ...daily, timeZone }), 'timeZone', timeZone);
    }
  });

  it('refuses what is no list, and rows that are no rows', () => {
    expectRefusal(() => callWith('dailyMinimum', { ...daily, samples: 'none' }), 'samples', 'none');
    expectRefusal(() => callWith('ventilatorEvents', { days: 'none' }), 'days', 'none');
    expectRefusal(() => callWith('poissonBinomial', { probabilities: 0.5 }), 'probabilities', 0.5);
    for (const key of ['temperatures', 'whiteCells', 'antimicrobialDays']) {
      expectRefusal(() => callWith('infectionRelated', { ...infection, [key]: 'none' }), key, 'none');
      expect(() => callWith('infectionRelated', { ...infection, [key]: [null] })).toThrow(RangeError);
    }
    expect(() => callWith('ventilatorEvents', { days: [null] })).toThrow(RangeError);
    expect(() => callWith('dailyMinimum', { ...daily, samples: [null] })).toThrow(RangeError);
  });

  it('refuses impossible numbers inside lists, naming the place', () => {
    for (const wrong of [Number.NaN, -1, '5', undefined, 1e9]) {
      const refuse = (name: keyof typeof ventilation, input: Record<string, unknown>, key: string) =>
        expectRefusal(() => callWith(name, input), key, wrong);
      refuse('poissonBinomial', { probabilities: [0.5, wrong] }, 'probabilities[1]');
      refuse(
        'dailyMinimum',
        { ...daily, samples: [{ at: '2024-03-01T10:00:00Z', value: wrong }] },
        'samples[0].value',
      );
      refuse('ventilatorEvents', { days: [{ ...listed, minPeep: wrong }] }, 'days[0].minPeep');
      refuse('ventilatorEvents', { days: [{ ...listed, minFio2Percent: wrong }] }, 'days[0].minFio2Percent');
      const temperatures = [{ day: '2024-03-08', celsius: wrong }];
      refuse('infectionRelated', { ...infection, temperatures }, 'temperatures[0].celsius');
      const whiteCells = [{ day: '2024-03-08', perMm3: wrong }];
      refuse('infectionRelated', { ...infection, whiteCells }, 'whiteCells[0].perMm3');
    }
  });

  it('refuses a day listed twice, an onset before the third day, and a nameless agent', () => {
    expect(() => callWith('ventilatorEvents', { days: [listed, listed] })).toThrow(
      /^days\[1\]\.day .*2024-03-01/,
    );
    const event = { ...infection.event, onset: '2024-03-02' };
    expect(() => callWith('infectionRelated', { ...infection, event })).toThrow(
      /^event\.onset .*2024-03-03 or later/,
    );
    const antimicrobialDays = [{ agent: '', days: [] }];
    expect(() => callWith('infectionRelated', { ...infection, antimicrobialDays })).toThrow(
      /^antimicrobialDays\[0\]/,
    );
  });

  it('refuses ages that do not ascend', () => {
    const policy = { check: { dueFrom: 240, overdueFrom: 210, withdrawFrom: 480 } };
    expect(() => callWith('freshness', { ...fresh, policy })).toThrow(
      /^policy\.check\.overdueFrom .*from 240 /,
    );
  });
});

describe('values that contradict each other', () => {
  it.each([
    ['airwayResistance', { peakCmH2O: 20, plateauCmH2O: 20.1, inspiratoryFlowLMin: 60 }, 'plateauCmH2O'],
    [
      'mechanicalPowerVolumeControl',
      { ...EXAMPLES.mechanicalPowerVolumeControl.input, plateauCmH2O: 7 },
      'plateauCmH2O',
    ],
    [
      'mechanicalPowerWithoutPlateau',
      { ...EXAMPLES.mechanicalPowerWithoutPlateau.input, peepCmH2O: 31 },
      'peepCmH2O',
    ],
    ['deadSpaceFraction', { paco2MmHg: 40, mixedExpiredPco2MmHg: 41 }, 'mixedExpiredPco2MmHg'],
    ['breathTiming', { ratePerMin: 30, inspiratoryTimeS: 2 }, 'inspiratoryTimeS'],
    ['blendedFio2', { airLMin: 0, oxygenLMin: 0 }, 'oxygenLMin'],
    ['alveolarOxygen', { fio2: 0.21, paco2MmHg: 150 }, 'paco2MmHg'],
    ['predictedBodyWeight', { sex: 'female', heightCm: 102 }, 'heightCm'],
    ['globalArdsClass', { support: 'invasive', spo2Percent: 92 }, 'fio2'],
    ['globalArdsClass', { support: 'invasive' }, 'pfMmHg'],
    ['globalArdsClass', { support: 'invasive', fio2: 0.4 }, 'spo2Percent'],
    ['hacorScore', { ...EXAMPLES.hacorScore.input, glasgowComaScale: 13.5 }, 'glasgowComaScale'],
    ['murrayScore', { ...EXAMPLES.murrayScore.input, quadrants: 1.5 }, 'quadrants'],
    ['erlangB', { servers: 2.5, offeredErlangs: 1 }, 'servers'],
  ] as const)('%s refuses %o, naming %s', (name, input, key) => {
    expect(() => callWith(name, input)).toThrow(RangeError);
    expect(() => callWith(name, input)).toThrow(key);
  });
});

describe('the list of examples', () => {
  it('has one for each exported calculation', () => {
    expect(EXAMPLE_ENTRIES.map(([name]) => name).sort()).toEqual(Object.keys(ventilation).sort());
  });
});
