import type { KeypadKey } from '@windrow/ui/controls/keypad';
import { GAS_FIELDS, READING_FIELDS, SETTING_FIELDS } from '@windrow/ventilation/entry/fields';
import { describe, expect, it } from 'vitest';
import { keypadKeyOf, pressAll, pressKey } from './press-key.ts';

const PEEP = SETTING_FIELDS.peepCmH2O;

describe('pressKey', () => {
  it.each([
    ['7.', 'point', '7.'],
    ['7.3', 'point', '7.3'],
    ['', 'point', '0.'],
    ['0', '0', '0'],
    ['0', '5', '5'],
    ['7.36', '5', '7.36'],
    ['7.3', 'erase', '7.'],
    ['7.3', 'clear', ''],
    ['off', '7', '7'],
  ] as [string, KeypadKey, string][])('turns %j and %s into %j', (text, key, after) => {
    expect(pressKey({ text, key, field: GAS_FIELDS.ph, from: null })).toBe(after);
  });

  it('steps from the value before when nothing is typed', () => {
    expect(pressKey({ text: '', key: 'plus', field: PEEP, from: 8 })).toBe('9');
    expect(pressKey({ text: '', key: 'minus', field: PEEP, from: null })).toBe('');
  });

  it('steps in the precision of the field and stays within its limits', () => {
    expect(pressKey({ text: '0.2', key: 'plus', field: SETTING_FIELDS.tHighS, from: null })).toBe('0.3');
    expect(pressKey({ text: '40', key: 'plus', field: PEEP, from: null })).toBe('40');
    expect(pressKey({ text: '7.40', key: 'minus', field: GAS_FIELDS.ph, from: null })).toBe('7.39');
  });

  it('turns the sign where values below zero exist', () => {
    expect(pressKey({ text: '4', key: 'sign', field: GAS_FIELDS.baseExcessMmolL, from: null })).toBe('-4');
    expect(pressKey({ text: '-4', key: 'sign', field: GAS_FIELDS.baseExcessMmolL, from: null })).toBe('4');
  });

  it('lets a point into a whole-number field, so that 7.5 is never read as 75', () => {
    expect(pressAll('7.5', PEEP)).toBe('7.5');
  });
});

describe('pressAll', () => {
  it('reads a pasted number key by key', () => {
    expect(pressAll(' 7,36 ', GAS_FIELDS.ph)).toBe('7.36');
    expect(pressAll('1.2.3', READING_FIELDS.minuteVolumeLMin)).toBe('1.2');
    expect(pressAll('abc', PEEP)).toBe('');
    expect(pressAll('OFF', PEEP)).toBe('off');
    expect(pressAll('-6.5', GAS_FIELDS.baseExcessMmolL)).toBe('-6.5');
  });
});

describe('keypadKeyOf', () => {
  it('takes digits, point, steps and erasers of a keyboard and leaves all else alone', () => {
    expect(keypadKeyOf('5', PEEP)).toBe('5');
    expect(keypadKeyOf(',', PEEP)).toBe('point');
    expect(keypadKeyOf('ArrowDown', PEEP)).toBe('minus');
    expect(keypadKeyOf('Tab', PEEP)).toBeNull();
    expect(keypadKeyOf('e', PEEP)).toBeNull();
  });
});
