import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { infectionRelated } from './infection-related.ts';

/** Ventilation day 1 is 1 March 2024; day 40 is 9 April. */
const dayAt = (ventilationDay: number) =>
  ventilationDay <= 31
    ? `2024-03-${String(ventilationDay).padStart(2, '0')}`
    : `2024-04-${String(ventilationDay - 31).padStart(2, '0')}`;

const event = (onset: number) => ({ onset: dayAt(onset), ventilationDayOne: dayAt(1) });
const FEVER = (onset: number) => [{ day: dayAt(onset), celsius: 38.5 }];

function result(onset: number, agents: Readonly<Record<string, readonly number[]>>) {
  return infectionRelated({
    event: event(onset),
    temperatures: FEVER(onset),
    whiteCells: [],
    antimicrobialDays: Object.entries(agents).map(([agent, days]) => ({ agent, days: days.map(dayAt) })),
  });
}

/** The rule once more, walking the calendar day by day with every agent. */
function walked(onset: number, agents: Readonly<Record<string, readonly number[]>>) {
  const inWindow = (day: number) => day >= 3 && day >= onset - 2 && day <= onset + 2;
  const qualifying: number[] = [];
  const counting = new Set<string>();
  for (let day = 1; day <= 40; day += 1) {
    let qualifies = false;
    for (const [agent, days] of Object.entries(agents)) {
      const given = (which: number) => days.includes(which);
      const starts = given(day) && !given(day - 1) && !given(day - 2);
      if (starts && inWindow(day)) counting.add(agent);
      if (counting.has(agent) && (given(day) || (given(day - 1) && given(day + 1)))) qualifies = true;
    }
    if (qualifies) qualifying.push(day);
  }
  const fourFrom = (day: number) => [0, 1, 2, 3].every((more) => qualifying.includes(day + more));
  return {
    ivac: qualifying.some((day) => inWindow(day) && fourFrom(day)),
    qualifyingDays: qualifying.map(dayAt),
  };
}

describe('infectionRelated', () => {
  it('agrees with walking the calendar, on any antimicrobials', () => {
    const agentDays = fc.uniqueArray(fc.integer({ min: 1, max: 20 }), { maxLength: 12 });
    const cases = fc.record({
      onset: fc.integer({ min: 3, max: 15 }),
      agents: fc.record({ A: agentDays, B: agentDays }),
    });
    const verdicts = new Set<boolean>();
    fc.assert(
      fc.property(cases, ({ onset, agents }) => {
        const expected = walked(onset, agents);
        verdicts.add(expected.ivac);
        expect(result(onset, agents)).toEqual(expected);
      }),
      { numRuns: 3000 },
    );
    expect(verdicts.size).toBe(2);
  });

  it.each([
    ['one missed day of the same agent is filled', { A: [6, 8, 9] }, [6, 7, 8, 9], true],
    ['two missed days are not', { A: [6, 7, 10, 11] }, [6, 7, 10, 11], false],
    ['a missed day between two agents is not filled', { A: [6, 7], B: [9, 10] }, [6, 7, 9, 10], false],
    ['days of two new agents add up', { A: [6, 7], B: [8, 9] }, [6, 7, 8, 9], true],
    [
      'an agent already running does not count, a new one beside it does',
      { A: [3, 4, 5, 6], B: [7, 8] },
      [7, 8],
      false,
    ],
    ['a start on the last window day runs on after it', { A: [9, 10, 11, 12] }, [9, 10, 11, 12], true],
    ['a start after the window is none', { A: [10, 11, 12, 13] }, [], false],
    [
      'four days long after the window do not make up for one in it',
      { A: [9, 15, 16, 17, 18] },
      [9, 15, 16, 17, 18],
      false,
    ],
  ])('%s', (_title, agents, days, ivac) => {
    expect(result(7, agents)).toEqual({ ivac, qualifyingDays: days.map(dayAt) });
  });

  it('takes one agent listed in two rows as one', () => {
    const antimicrobialDays = [
      { agent: 'A', days: [dayAt(6), dayAt(7)] },
      { agent: 'A', days: [dayAt(9), dayAt(9)] },
    ];
    const verdict = infectionRelated({
      event: event(7),
      temperatures: FEVER(7),
      whiteCells: [],
      antimicrobialDays,
    });

    expect(verdict).toEqual({ ivac: true, qualifyingDays: [6, 7, 8, 9].map(dayAt) });
  });

  it('needs a sign in the window: fever, cold, or white cells high or low', () => {
    const antimicrobialDays = [{ agent: 'A', days: [6, 7, 8, 9].map(dayAt) }];
    const signs = (celsius: number, perMm3: number, day: number) =>
      infectionRelated({
        event: event(7),
        temperatures: [{ day: dayAt(day), celsius }],
        whiteCells: [{ day: dayAt(day), perMm3 }],
        antimicrobialDays,
      }).ivac;

    expect([38, 38.1, 36, 35.9].map((celsius) => signs(celsius, 8000, 7))).toEqual([
      false,
      true,
      false,
      true,
    ]);
    expect([11_999, 12_000, 4001, 4000].map((cells) => signs(37, cells, 7))).toEqual([
      false,
      true,
      false,
      true,
    ]);
    expect([4, 5, 9, 10].map((day) => signs(39, 15_000, day))).toEqual([false, true, true, false]);
  });
});
