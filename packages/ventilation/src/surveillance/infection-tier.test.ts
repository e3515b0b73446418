import { describe, expect, it } from 'vitest';
import type { EnteredSigns, SurveillanceEvent } from '../contract/surveillance.ts';
import { infectionTier } from './infection-tier.ts';

const event: SurveillanceEvent = {
  onset: '2026-03-08',
  kind: 'VAC',
  by: ['peep'],
  ventilationDay: 7,
  ventilationDayOne: '2026-03-02',
  window: { first: '2026-03-06', last: '2026-03-10' },
  period: { first: '2026-03-08', last: '2026-03-21' },
  isFirm: true,
  why: [],
};
const NOTHING: EnteredSigns = {
  temperatures: [],
  whiteCells: [],
  antimicrobialDays: [],
  extracorporealDays: [],
};
const tier = (entered: Partial<EnteredSigns>) =>
  infectionTier({ event, entered: { ...NOTHING, ...entered } });
const given = (...days: number[]) => [
  { agent: 'A', days: days.map((day) => `2026-03-${String(day).padStart(2, '0')}`) },
];

describe('infectionTier', () => {
  it('names what is missing while nothing is entered', () => {
    expect(tier({})).toMatchObject({ ivac: false, signs: [], longestRun: 0 });
    expect(tier({}).missing).toEqual([
      'A sign of infection: no temperature and no white cells are entered from 06-Mar-2026 to 10-Mar-2026.',
      'A new antimicrobial: none is entered that was first given from 06-Mar-2026 to 10-Mar-2026 and not on the two days before.',
    ]);
  });

  it('is met by a sign in the window and four qualifying days, and then misses nothing', () => {
    const met = tier({
      temperatures: [{ day: '2026-03-07', celsius: 38.4 }],
      antimicrobialDays: given(8, 9, 10, 11),
    });
    expect(met).toMatchObject({ ivac: true, longestRun: 4, missing: [] });
    expect(met.signs).toEqual(['38.4\u00a0°C on 07-Mar-2026, above 38.0']);
  });

  it('says how far the antimicrobial days have come, and that what was entered is no sign', () => {
    const part = tier({ whiteCells: [{ day: '2026-03-07', perMm3: 9000 }], antimicrobialDays: given(8, 9) });
    expect(part.ivac).toBe(false);
    expect(part.missing[0]).toContain('nothing entered from 06-Mar-2026');
    expect(part.missing[1]).toContain('2 of the 4 in a row');
  });

  it('agrees with its own verdict on any combination: met exactly where nothing is missing', () => {
    for (const celsius of [35.9, 36, 38, 38.1])
      for (const perMm3 of [4000, 4001, 11_999, 12_000])
        for (const days of [
          [5, 6, 7, 8],
          [6, 7, 8, 9],
          [8, 10, 11],
          [8, 9, 10],
        ]) {
          const result = tier({
            temperatures: [{ day: '2026-03-06', celsius }],
            whiteCells: [{ day: '2026-03-10', perMm3 }],
            antimicrobialDays: given(...days),
          });
          expect(result.ivac).toBe(result.missing.length === 0);
        }
  });
});
