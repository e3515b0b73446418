import { AIRWAY_FIELDS, GAS_FIELDS, READING_FIELDS, SETTING_FIELDS } from '@windrow/ventilation/entry/fields';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { interpretNumber } from './interpret-number.ts';

const oxygen = (text: string) =>
  interpretNumber({ key: 'fio2Percent', text, field: SETTING_FIELDS.fio2Percent });

describe('oxygen', () => {
  it.each([
    ['40', 40],
    ['0.4', 40],
    ['0.21', 21],
    ['21', 21],
    ['100', 100],
    ['1.0', 100],
    ['1.00', 100],
    ['0.29', 29],
    ['0.57', 57],
  ])('understands %s as %i %%', (text, percent) => {
    expect(oxygen(text)).toEqual({ state: 'valid', value: percent });
  });

  it('asks about a bare 1, which can be read two ways', () => {
    expect(oxygen('1')).toMatchObject({
      state: 'refused',
      message: expect.stringContaining('type 100 or 1.0'),
    });
  });

  it.each(['0.2', '0.20', '20', '4', '1.5', '101', '0', '40.5'])('refuses %s', (text) => {
    expect(oxygen(text).state).toBe('refused');
  });

  it('gives the same percentage for every fraction and its percentage', () => {
    fc.assert(
      fc.property(fc.integer({ min: 21, max: 99 }), (percent) => {
        expect(oxygen((percent / 100).toFixed(2))).toEqual(oxygen(String(percent)));
      }),
    );
  });
});

describe('other fields', () => {
  it('refuses outside the hard limits and names the range', () => {
    const refused = interpretNumber({ key: 'peepCmH2O', text: '50', field: SETTING_FIELDS.peepCmH2O });
    expect(refused).toEqual({ state: 'refused', message: 'PEEP must be 0 to 40 cmH2O, not 50' });
  });

  it.each([
    ['0', 'valid'],
    ['40', 'valid'],
    ['41', 'refused'],
  ])('judges PEEP %s as %s at the edge', (text, state) => {
    expect(interpretNumber({ key: 'peepCmH2O', text, field: SETTING_FIELDS.peepCmH2O }).state).toBe(state);
  });

  it('refuses a decimal in a whole-number field', () => {
    expect(
      interpretNumber({ key: 'plateauCmH2O', text: '24.5', field: READING_FIELDS.plateauCmH2O }),
    ).toEqual({
      state: 'refused',
      message: 'Plateau is recorded in whole numbers, not 24.5',
    });
  });

  it('accepts tube sizes by halves only', () => {
    const size = (text: string) =>
      interpretNumber({ key: 'sizeMm', text, field: AIRWAY_FIELDS.sizeMm }).state;
    expect([size('7.5'), size('7'), size('7.3')]).toEqual(['valid', 'valid', 'refused']);
  });

  it('refuses an entry that stops at its point or sign', () => {
    expect(interpretNumber({ key: 'ph', text: '7.', field: GAS_FIELDS.ph }).state).toBe('refused');
    expect(
      interpretNumber({ key: 'baseExcessMmolL', text: '-', field: GAS_FIELDS.baseExcessMmolL }).state,
    ).toBe('refused');
  });

  it('knows an empty entry from zero', () => {
    expect(interpretNumber({ key: 'rateSetPerMin', text: '', field: SETTING_FIELDS.rateSetPerMin })).toEqual({
      state: 'empty',
    });
    expect(interpretNumber({ key: 'rateSetPerMin', text: '0', field: SETTING_FIELDS.rateSetPerMin })).toEqual(
      { state: 'valid', value: 0 },
    );
  });
});
