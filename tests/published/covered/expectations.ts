import { expect } from 'vitest';
import { numberAt, type Row, toleranceFor } from '../rows.ts';

export type Check = readonly [pattern: RegExp, check: (row: Row) => void];

/** The result lies within the row's own tolerance of its printed number. */
export function expectNear(row: Row, key: string, actual: number | null): void {
  const expected = numberAt(row.expected, key);
  expect(actual, key).not.toBeNull();
  expect(
    Math.abs(Number(actual) - expected),
    `${row.id} ${key}: ${actual}, printed ${expected}`,
  ).toBeLessThanOrEqual(toleranceFor(row, key) + 1e-9);
}
