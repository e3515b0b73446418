import { describe, expect, it } from 'vitest';
import { clockFromTyping, dayFromTyping, intervalOptions, numberOrNull, textOrNull } from './form-values.ts';

describe('typing', () => {
  it('puts the dashes of a day in, whatever was typed between', () => {
    expect(['1', '19610', '19610304', '1961-03-04', '1961/03/04x', '196103045'].map(dayFromTyping)).toEqual([
      '1',
      '1961-0',
      '1961-03-04',
      '1961-03-04',
      '1961-03-04',
      '1961-03-04',
    ]);
  });

  it('puts the colon of a clock in', () => {
    expect(['9', '094', '0940', '09:405'].map(clockFromTyping)).toEqual(['9', '09:4', '09:40', '09:40']);
  });

  it('takes an empty input for nothing, never for zero', () => {
    expect([numberOrNull(''), numberOrNull(' '), numberOrNull('0'), numberOrNull('178')]).toEqual([
      null,
      null,
      0,
      178,
    ]);
    expect([textOrNull(''), textOrNull('  '), textOrNull('Contact')]).toEqual([null, null, 'Contact']);
  });
});

describe('intervalOptions', () => {
  it('keeps an interval that stands and is not one of the usual', () => {
    expect(intervalOptions(90).map(({ label }) => label)).toContain('every 90 min');
    expect(intervalOptions(60)).toHaveLength(intervalOptions(null).length);
  });
});
