import { describe, expect, it } from 'vitest';
import { ACID_BASE } from './covered/acid-base.ts';
import { MECHANICS } from './covered/mechanics.ts';
import { OXYGENATION } from './covered/oxygenation.ts';
import { READINESS } from './covered/readiness.ts';
import { SCORES_AND_SUPPLY } from './covered/scores-and-supply.ts';
import { SURVEILLANCE } from './covered/surveillance.ts';
import { NOT_COVERED, PARTLY_COVERED } from './not-covered.ts';
import { ROWS, type Row } from './rows.ts';

/** Row ids, as patterns of the whole id, with the call that must give the row's numbers. */
const COVERED: readonly (readonly [RegExp, (row: Row) => void])[] = [
  ...MECHANICS,
  ...OXYGENATION,
  ...ACID_BASE,
  ...SURVEILLANCE,
  ...SCORES_AND_SUPPLY,
  ...READINESS,
];

const reasons = new Map(NOT_COVERED.flatMap(({ ids, reason }) => ids.map((id) => [id, reason] as const)));

describe('published examples', () => {
  for (const row of ROWS) {
    const checks = COVERED.filter(([pattern]) => pattern.test(row.id));
    for (const [, check] of checks) it(`${row.id}: ${row.source}`, () => check(row));
  }
});

describe('the list of examples', () => {
  it('covers each row once, or gives the reason why not', () => {
    const counts = ROWS.map(({ id }) => {
      const covered = COVERED.filter(([pattern]) => pattern.test(id)).length;
      return { id, times: covered + (reasons.has(id) ? 1 : 0) };
    });

    expect(counts.filter(({ times }) => times !== 1)).toEqual([]);
  });

  it('has no pattern and no reason without a row', () => {
    const ids = ROWS.map(({ id }) => id);

    expect(COVERED.filter(([pattern]) => !ids.some((id) => pattern.test(id))).map(String)).toEqual([]);
    expect([...reasons.keys()].filter((id) => !ids.includes(id))).toEqual([]);
    expect(Object.keys(PARTLY_COVERED).filter((id) => !ids.includes(id) || reasons.has(id))).toEqual([]);
  });

  it('names no row twice', () => {
    expect(new Set(ROWS.map(({ id }) => id)).size).toBe(ROWS.length);
  });
});
