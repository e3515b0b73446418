import { readFileSync } from 'node:fs';
import { exportedCalculations } from '@windrow/ventilation/notes/exported-calculations';
import { type MethodNote, parseDocblock } from '@windrow/ventilation/notes/parse-docblock';
import { describe, expect, it } from 'vitest';
import { callWith, EXAMPLE_ENTRIES } from './valid-inputs.ts';

const SOURCE = new URL('../../packages/ventilation/src/', import.meta.url);
const CALCULATIONS = exportedCalculations(readFileSync(new URL('index.ts', SOURCE), 'utf8'));

/** A second value narrows these further than their own range. */
const NARROWED = new Set([
  'airwayResistance.plateauCmH2O',
  'mechanicalPowerVolumeControl.plateauCmH2O',
  'mechanicalPowerWithoutPlateau.peepCmH2O',
  'deadSpaceFraction.mixedExpiredPco2MmHg',
]);

function noteOf(name: string): MethodNote {
  const path = CALCULATIONS.find((calculation) => calculation.name === name)?.path ?? '';
  return parseDocblock(readFileSync(new URL(path, SOURCE), 'utf8'));
}

it('finds every exported calculation in the barrel', () => {
  expect(CALCULATIONS.map(({ name }) => name).sort()).toEqual(EXAMPLE_ENTRIES.map(([name]) => name).sort());
});

it('gives each calculation a title of its own', () => {
  const titles = EXAMPLE_ENTRIES.map(([name]) => noteOf(name).title);
  expect(titles.filter((title, at) => titles.indexOf(title) !== at)).toEqual([]);
});

describe.each(EXAMPLE_ENTRIES)('the docblock of %s', (name, { input, bare, optional = [] }) => {
  const note = noteOf(name);

  it('says meaning, formula, validity, result, errors and sources', () => {
    expect(note.name).toBe(name);
    for (const said of [note.title, note.meaning, note.formula, note.validity, note.result.words]) {
      expect(said.length).toBeGreaterThan(1);
    }
    expect(note.errors).toMatch(/^RangeError /);
    expect(note.sources.length).toBeGreaterThan(0);
    expect(note.isBare).toBe(bare === true);
  });

  it('explains every key, and says which may be left out', () => {
    const explained = new Map(note.arguments.map((argument) => [argument.key, argument]));
    for (const key of Object.keys(input)) expect([...explained.keys()]).toContain(key);
    const mayMiss = note.arguments
      .filter(({ unlessGiven }) => unlessGiven !== undefined)
      .map(({ key }) => key);
    for (const key of optional) expect(mayMiss).toContain(key);
    for (const key of mayMiss) {
      const { [key]: _, ...rest } = input;
      // Where one of several will do, the example gives only one of them.
      if (optional.includes(key) || !(key in input)) expect(() => callWith(name, rest)).not.toThrow();
    }
  });

  it('gives an unasked value that changes nothing when it is given', () => {
    for (const { key, kind, unlessGiven } of note.arguments) {
      if (unlessGiven === undefined || unlessGiven === null) continue;
      const { [key]: _, ...rest } = input;
      const given =
        kind === 'number' ? Number(unlessGiven) : kind === 'yes-no' ? unlessGiven === 'true' : unlessGiven;
      expect(callWith(name, { ...rest, [key]: given })).toEqual(callWith(name, rest));
    }
  });

  it('has an example that runs, if it has one', () => {
    const example = note.example;
    if (example) expect(() => callWith(name, example)).not.toThrow();
  });

  it('names every part of a record that it gives', () => {
    const result = callWith(name, input);
    const isRecord = typeof result === 'object' && result !== null && !Array.isArray(result);
    expect(note.result.parts.map(({ key }) => key)).toEqual(isRecord ? Object.keys(result) : []);
  });

  for (const argument of note.arguments) {
    const { key } = argument;
    if (!(key in input)) continue;

    it(`tells the kind of ${key} as the calculation takes it`, () => {
      const kinds = { number: ['number'], boolean: ['yes-no'], string: ['choice', 'text'], object: ['json'] };
      expect(Object.entries(kinds).find(([type]) => type === typeof input[key])?.[1]).toContain(
        argument.kind,
      );
    });

    if (argument.kind === 'choice') {
      it(`lists the words of ${key}, and no other is taken`, () => {
        for (const word of argument.options)
          expect(() => callWith(name, { ...input, [key]: word })).not.toThrow(key);
        expect(() => callWith(name, { ...input, [key]: 'elephant' })).toThrow(argument.options.join(', '));
      });
    }

    if (argument.kind === 'number') {
      it(`gives the range of ${key} that the calculation enforces`, () => {
        const [low, high] = argument.range;
        const refused = (number: number) => () => callWith(name, { ...input, [key]: number });
        expect(refused(low - 1e-3)).toThrow(key);
        expect(refused(high + 1e-3)).toThrow(key);
        const range = NARROWED.has(`${name}.${key}`) ? ' number from ' : `number from ${low} to ${high},`;
        expect(refused(high + 1e-3)).toThrow(range);
      });
    }
  }
});
