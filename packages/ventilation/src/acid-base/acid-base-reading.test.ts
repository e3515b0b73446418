import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { acidBaseInWords } from './acid-base-in-words.ts';
import { acidBaseReading } from './acid-base-reading.ts';
import { bicarbonate } from './bicarbonate.ts';

const read = (ph: number, paco2MmHg: number) => acidBaseReading({ ph, paco2MmHg });

describe('acidBaseReading', () => {
  it.each([
    ['no disorder', 7.4, 40, 'usual', [], null],
    ['a metabolic acidosis that is breathed out', 7.25, 26, 'acidaemia', ['metabolic acidosis'], null],
    [
      'a metabolic acidosis with too little breathing',
      7.1,
      40,
      'acidaemia',
      ['metabolic acidosis'],
      'respiratory acidosis',
    ],
    [
      'a metabolic acidosis with more breathing than it asks for',
      7.34,
      25,
      'acidaemia',
      ['metabolic acidosis'],
      'respiratory alkalosis',
    ],
    ['a metabolic alkalosis', 7.5, 46, 'alkalaemia', ['metabolic alkalosis'], null],
    ['a respiratory acidosis of hours', 7.24, 60, 'acidaemia', ['respiratory acidosis'], null],
    ['a respiratory acidosis of days', 7.34, 60, 'acidaemia', ['respiratory acidosis'], null],
    ['a respiratory alkalosis of hours', 7.56, 24, 'alkalaemia', ['respiratory alkalosis'], null],
    ['both acidoses', 7.1, 60, 'acidaemia', ['metabolic acidosis', 'respiratory acidosis'], null],
    ['both alkaloses', 7.6, 30, 'alkalaemia', ['metabolic alkalosis', 'respiratory alkalosis'], null],
  ] as const)('finds %s', (_, ph, paco2, state, primary, second) => {
    const reading = read(ph, paco2);
    expect(reading).toMatchObject({ ph: state, second });
    expect(reading.primary).toEqual(primary);
  });

  it.each([
    [7.24, 60, 'acute'],
    [7.34, 60, 'chronic'],
    [7.3, 60, 'between'],
    [7.36, 46, 'either'],
    [7.56, 24, 'acute'],
  ] as const)('tells hours from days at pH %d and PaCO2 %d: %s', (ph, paco2, stage) => {
    expect(read(ph, paco2).compensation?.stage).toBe(stage);
  });

  it('names nothing where the three numbers cannot belong to one sample', () => {
    const reading = acidBaseReading({ ph: 7.25, paco2MmHg: 40, bicarbonateMmolL: 24 });
    expect(reading).toMatchObject({ primary: [], compensation: null, consistency: { consistent: false } });
    expect(acidBaseInWords(reading)[0]).toContain('cannot belong to one sample');
  });

  it('takes the side of pH where the usual range hides a disorder', () => {
    expect(read(7.36, 60).primary).toEqual(['respiratory acidosis']);
    expect(read(7.44, 55).primary).toEqual(['metabolic alkalosis']);
    expect(acidBaseInWords(read(7.36, 60))[1]).toContain('look for a second one');
  });

  it('calls neither of two opposite disorders the first at 7.40 itself', () => {
    expect(read(7.4, 60).primary).toEqual(['respiratory acidosis', 'metabolic alkalosis']);
  });

  it('reckons bicarbonate where none is given, and says so', () => {
    const reading = read(7.3, 30);
    expect(reading).toMatchObject({ isBicarbonateGiven: false, consistency: null });
    expect(reading.bicarbonateMmolL).toBe(bicarbonate({ ph: 7.3, paco2MmHg: 30 }));
  });

  it('refuses what is no gas', () => {
    expect(() => read(Number.NaN, 40)).toThrow(/^ph must/);
    expect(() => acidBaseReading({ ph: 7.4, paco2MmHg: 40, bicarbonateMmolL: -1 })).toThrow(
      /^bicarbonateMmolL must/,
    );
  });
});

describe('a gas that the entry form lets in', () => {
  it('is read, or said to be unreadable, and never throws', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 6.5, max: 8, noNaN: true }),
        fc.double({ min: 5, max: 250, noNaN: true }),
        (ph, paco2MmHg) => {
          const reading = acidBaseReading({ ph, paco2MmHg });
          if (!reading.isReadable) expect(reading.primary).toEqual([]);
          expect(acidBaseInWords(reading).length).toBeGreaterThan(0);
        },
      ),
    );
    expect(acidBaseReading({ ph: 6.5, paco2MmHg: 5 }).isReadable).toBe(false);
  });
});

describe('acidBaseInWords', () => {
  it('says what pH is, what is primary, and whether the rest fits', () => {
    expect(acidBaseInWords(acidBaseReading({ ph: 7.25, paco2MmHg: 26, bicarbonateMmolL: 11 }))).toEqual([
      'Acidaemia.',
      'Metabolic acidosis.',
      'PaCO2 expected 23 to 27 mmHg, found 26: as expected.',
    ]);
    expect(acidBaseInWords(acidBaseReading({ ph: 7.1, paco2MmHg: 40, bicarbonateMmolL: 12 })).at(-1)).toBe(
      'PaCO2 expected 24 to 28 mmHg, found 40: above it, so respiratory acidosis as well.',
    );
  });
});
