import * as ventilation from '@windrow/ventilation';
import { parseDocblock } from '@windrow/ventilation/notes/parse-docblock';
import { describe, expect, it } from 'vitest';
import { CALCULATIONS, type Listed, sourceOf } from './note-sources.ts';
import { openingTexts, runNote, type Texts } from './run-note.ts';
import { subjectsOf, subjectTitle } from './subjects.ts';

const listed: Listed[] = await Promise.all(
  CALCULATIONS.map(async ({ path, subject }) => ({ subject, note: parseDocblock(await sourceOf(path)) })),
);

const FUNCTIONS: Readonly<Record<string, unknown>> = { ...ventilation };

function runnable(name: string) {
  const note = listed.find((each) => each.note.name === name)?.note;
  if (!note) throw new Error(`no note ${name}`);
  return { note, calculation: FUNCTIONS[name] as (input: unknown) => unknown };
}

function run(name: string, texts: Texts) {
  return runNote({ ...runnable(name), texts });
}

describe('the notes', () => {
  it('are one for each exported calculation, read from the code', () => {
    expect(listed.map(({ note }) => note.name).sort()).toEqual(Object.keys(ventilation).sort());
  });

  it('stand under a subject with a name of its own', () => {
    for (const { subject } of listed) expect(subjectTitle(subject).toLowerCase()).not.toBe(subject.slice(1));
    expect(subjectTitle('some-folder')).toBe('Some folder');
  });

  it('are found by title, input, formula or source, all words together', () => {
    const names = (search: string) =>
      subjectsOf({ listed, search }).flatMap(({ notes }) => notes.map(({ name }) => name));
    expect(names('').length).toBe(listed.length);
    expect(names('plateau power')).toContain('mechanicalPowerVolumeControl');
    expect(names('Roca')).toEqual(['roxIndex']);
    expect(names('no such word')).toEqual([]);
  });

  it('open on an example that runs, wherever a list or a text is asked for', () => {
    for (const { note } of listed.filter(({ note: each }) => each.example)) {
      const outcome = run(note.name, openingTexts({ note, query: new URLSearchParams() }));
      expect(outcome.state, note.name).toBe('result');
    }
  });
});

describe('runNote', () => {
  it('gives the very value of the calculation for the numbers of an address', () => {
    const { note } = runnable('tidalVolumePerKg');
    const query = new URLSearchParams('tidalVolumeMl=420&predictedBodyWeightKg=73.0440944881889');
    expect(run('tidalVolumePerKg', openingTexts({ note, query }))).toEqual({
      state: 'result',
      value: 420 / 73.0440944881889,
    });
  });

  it('waits while something is missing, and says what', () => {
    expect(run('pfRatio', { pao2MmHg: '80', fio2: ' ' })).toEqual({
      state: 'wanting',
      message: 'Still wanting: inspired oxygen.',
    });
  });

  it.each([
    ['40', 'fio2 must be a number from 0.21 to 1, not 40'],
    ['abc', 'fio2 must be a number from 0.21 to 1, not "abc"'],
    ['0,4', 'fio2 must be a number from 0.21 to 1, not "0,4"'],
  ])('tells at the field what the calculation says of %s', (fio2, message) => {
    expect(run('pfRatio', { pao2MmHg: '80', fio2 })).toEqual({ state: 'refused', key: 'fio2', message });
  });

  it('refuses what no single field is to blame for', () => {
    expect(run('blendedFio2', { airLMin: '0', oxygenLMin: '0' })).toMatchObject({
      state: 'refused',
      key: 'airLMin',
    });
  });

  it('leaves out what may be left out, and takes choices, answers and lists', () => {
    expect(run('alveolarOxygen', { fio2: '0.4', paco2MmHg: '40', form: 'full' })).toMatchObject({
      state: 'result',
    });
    expect(run('respiratorySofa', { pfMmHg: '180', supported: 'false' })).toEqual({
      state: 'result',
      value: 2,
    });
    expect(run('poissonBinomial', { probabilities: '[0.5]' })).toEqual({
      state: 'result',
      value: [0.5, 0.5],
    });
    expect(run('poissonBinomial', { probabilities: '[0.5' })).toMatchObject({
      state: 'refused',
      key: 'probabilities',
    });
    expect(run('globalArdsClass', { support: 'invasive' })).toMatchObject({ state: 'wanting' });
  });

  it('calls a calculation of one bare number with it', () => {
    expect(run('hPaFromCmH2O', { cmH2O: '30' })).toEqual({ state: 'result', value: 30 * 0.980665 });
  });

  it('takes nothing from an address but the inputs of the calculation', () => {
    const { note } = runnable('pfRatio');
    const query = new URLSearchParams('pao2MmHg=80&patient=Varga');
    expect(openingTexts({ note, query })).toEqual({ pao2MmHg: '80', fio2: '' });
  });
});
