import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { callWith, EXAMPLE_ENTRIES } from './valid-inputs.ts';

const SOURCE = new URL('../../packages/ventilation/src/', import.meta.url);
const BARREL = readFileSync(new URL('index.ts', SOURCE), 'utf8');

/** A second value narrows these further than their own range. */
const NARROWED = new Set([
  'airwayResistance.plateauCmH2O',
  'mechanicalPowerVolumeControl.plateauCmH2O',
  'mechanicalPowerWithoutPlateau.peepCmH2O',
  'deadSpaceFraction.mixedExpiredPco2MmHg',
]);

function docblockOf(name: string): string {
  const path = new RegExp(`export \\{[^}]*\\b${name}\\b[^}]*\\} from '\\./([^']+)'`).exec(BARREL)?.[1];
  const text = readFileSync(new URL(path ?? '', SOURCE), 'utf8');
  const before = text.slice(0, text.indexOf(`export function ${name}`));
  return before.slice(before.lastIndexOf('/**'));
}

describe.each(EXAMPLE_ENTRIES)('the docblock of %s', (name, { input, bare }) => {
  const docblock = docblockOf(name);

  it('stands right above it and says result, errors and source', () => {
    expect(docblock).toMatch(/^\/\*\*[\s\S]*\*\/\s*$/);
    for (const tag of ['@returns', '@throws RangeError', '@source']) expect(docblock).toContain(tag);
  });

  for (const [key, value] of Object.entries(input)) {
    const line = new RegExp(`@param ${bare ? '' : 'input\\.'}${key} ([^@]*)`).exec(docblock)?.[1];

    it(`explains ${key}`, () => {
      expect(line).toBeTruthy();
    });

    if (typeof value !== 'number') continue;

    it(`gives the range of ${key} that the calculation enforces`, () => {
      const [, low, high] = /\(([\d.e-]+) to ([\d.e-]+)\)/.exec(line ?? '') ?? [];
      const refused = (number: number) => () => callWith(name, { ...input, [key]: number });
      expect(refused(Number(low) - 1e-3)).toThrow(key);
      expect(refused(Number(high) + 1e-3)).toThrow(key);
      const range = NARROWED.has(`${name}.${key}`) ? ' number from ' : `number from ${low} to ${high},`;
      expect(refused(Number(high) + 1e-3)).toThrow(range);
    });
  }
});
