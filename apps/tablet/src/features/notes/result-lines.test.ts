import { describe, expect, it } from 'vitest';
import { fullNumber, resultLines } from './result-lines.ts';

const PLAIN = { unit: 'mL/kg', words: 'mL/kg.', parts: [] };

describe('resultLines', () => {
  it.each([
    [5.75, [{ label: null, value: '5.75', unit: 'mL/kg' }]],
    [null, [{ label: null, value: 'no value', unit: '' }]],
    ['moderate', [{ label: null, value: 'moderate', unit: 'mL/kg' }]],
    [[], [{ label: null, value: 'none', unit: '' }]],
    [
      [0.5, 0.5],
      [
        { label: '0', value: '0.5', unit: '' },
        { label: '1', value: '0.5', unit: '' },
      ],
    ],
    [
      [{ onset: '2026-03-03', by: ['peep', 'fio2'] }],
      [{ label: '1', value: 'onset 2026-03-03 · by peep, fio2', unit: '' }],
    ],
  ])('tells %j', (value, lines) => {
    expect(resultLines({ result: PLAIN, value })).toEqual(lines);
  });

  it('names the parts of a record with their units, and none without a value', () => {
    const parts = [
      { key: 'onLadder', label: 'on the ladder', unit: '' },
      { key: 'peepRange', label: 'PEEP here', unit: 'cmH2O' },
    ];
    const result = { unit: '', words: '', parts };
    expect(resultLines({ result, value: { onLadder: true, peepRange: [8, 10] } })).toEqual([
      { label: 'on the ladder', value: 'yes', unit: '' },
      { label: 'PEEP here', value: '8, 10', unit: 'cmH2O' },
    ]);
    expect(resultLines({ result, value: { onLadder: false, peepRange: null } })[1]).toEqual({
      label: 'PEEP here',
      value: 'no value',
      unit: '',
    });
  });
});

it('shows all digits of a number but those of its binary form', () => {
  expect([0.1 + 0.2, 420 / 73, -0.013, 25, 1e-7].map(fullNumber)).toEqual([
    '0.3',
    '5.75342465753425',
    '−0.013',
    '25',
    '1e-7',
  ]);
});
