import { readFileSync } from 'node:fs';

type Values = Readonly<Record<string, unknown>>;

/** One published (or recomputed) example: `provenance` says whether its number was read or is from memory. */
export type Row = {
  id: string;
  topic: string;
  inputs: Values;
  expected: Values;
  tolerance: number | Readonly<Record<string, number>>;
  source: string;
};

export const ROWS = JSON.parse(
  readFileSync(new URL('./checks.json', import.meta.url), 'utf8'),
) as readonly Row[];

export function numberAt(values: Values, key: string): number {
  const value = values[key];
  if (typeof value === 'number') return value;
  throw new Error(`no number at ${key}: ${String(value)}`);
}

export function textAt(values: Values, key: string): string {
  const value = values[key];
  if (typeof value === 'string') return value;
  throw new Error(`no text at ${key}: ${String(value)}`);
}

export function numbersAt(values: Values, key: string): number[] {
  const value = values[key];
  if (Array.isArray(value)) return value.map(Number);
  throw new Error(`no list at ${key}: ${String(value)}`);
}

export function toleranceFor(row: Row, key: string): number {
  if (typeof row.tolerance === 'number') return row.tolerance;
  const family = key.startsWith('vt_') ? 'vt_ml' : key;
  return numberAt(row.tolerance, family);
}
