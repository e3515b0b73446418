import { describe, expect, it } from 'vitest';
import { exportedCalculations } from './exported-calculations.ts';
import { noteArgument } from './note-argument.ts';
import { noteResult } from './note-result.ts';
import { parseDocblock } from './parse-docblock.ts';

const TAGS = {
  title: '@title Work of a pump',
  formula: '@formula `flow × head`',
  valid: '@valid for water.',
  param: '@param input.flowLMin flow, L/min (0 to 10), as read.',
  returns: '@returns J/min; `null` when dry.',
  throws: '@throws RangeError on anything else.',
  source: '@source a book; and its second edition.',
};

function fileWith({
  meaning = 'What a pump does\n * in a minute.',
  tags = Object.values(TAGS),
} = {}): string {
  return `import { a } from './a.ts';

/** Not the calculation. */
export function helper(): void {}

/**
 * ${meaning}
 *
 * ${tags.join('\n * ')}
 */
export function pump({ flowLMin }: { flowLMin: number }): number {
  return flowLMin;
}

/** Below it, and not the calculation either. */
export function another(): void {}
`;
}

describe('parseDocblock', () => {
  it('reads a note out of the code, wrapped lines joined', () => {
    expect(parseDocblock(fileWith())).toEqual({
      name: 'pump',
      title: 'Work of a pump',
      meaning: 'What a pump does in a minute.',
      formula: '`flow × head`',
      validity: 'for water.',
      arguments: [
        { key: 'flowLMin', kind: 'number', label: 'flow', unit: 'L/min', range: [0, 10], words: 'as read' },
      ],
      isBare: false,
      result: { unit: 'J/min', words: 'J/min; `null` when dry.', parts: [] },
      errors: 'RangeError on anything else.',
      sources: ['a book; and its second edition.'],
      example: null,
    });
  });

  it.each(Object.keys(TAGS).filter((tag) => !['param', 'formula'].includes(tag)))(
    'refuses a docblock without @%s, naming the calculation',
    (missing) => {
      const tags = Object.entries(TAGS).flatMap(([tag, text]) => (tag === missing ? [] : [text]));
      expect(() => parseDocblock(fileWith({ tags }))).toThrow(`pump: the docblock has no @${missing}`);
    },
  );

  it('refuses a file in which nothing has a formula, and a docblock without a meaning', () => {
    expect(() => parseDocblock('/** A thing. */\nexport function thing() {}')).toThrow('no docblock');
    expect(() => parseDocblock(fileWith({ meaning: '' }))).toThrow('what the calculation means');
  });

  it('wants an example where an argument is a list or a text', () => {
    const param = '@param input.days list of days, in order.';
    const tags = Object.values({ ...TAGS, param });
    expect(() => parseDocblock(fileWith({ tags }))).toThrow('pump: @example gives no days');
    expect(parseDocblock(fileWith({ tags: [...tags, '@example { "days": [] }'] })).example).toEqual({
      days: [],
    });
  });

  it('knows a calculation of one bare number', () => {
    const tags = Object.values({ ...TAGS, param: '@param kpa pressure, kPa (0 to 100).' });
    expect(parseDocblock(fileWith({ tags }))).toMatchObject({ isBare: true, arguments: [{ key: 'kpa' }] });
  });
});

describe('noteArgument', () => {
  it.each([
    ['pH (6.5 to 8).', { kind: 'number', label: 'pH', unit: '', range: [6.5, 8], words: '' }],
    [
      'airway resistance, cmH2O/(L/s) (0 to 500).',
      { kind: 'number', label: 'airway resistance', unit: 'cmH2O/(L/s)', range: [0, 500] },
    ],
    ['chance, probability (1e-12 to 1).', { kind: 'number', unit: 'probability', range: [1e-12, 1] }],
    ['change, cmH2O (-5 to 5).', { kind: 'number', range: [-5, 5] }],
    [
      'reserve, psi (0 to 5000); 200 unless given.',
      { kind: 'number', label: 'reserve', unlessGiven: '200', words: '200 unless given' },
    ],
    [
      "form: 'short' or 'full'; 'full' unless given.",
      { kind: 'choice', options: ['short', 'full'], unlessGiven: 'full' },
    ],
    [
      "cylinder: 'D', 'E' or 'M'; M is large.",
      { kind: 'choice', options: ['D', 'E', 'M'], words: 'M is large' },
    ],
    [
      'whether it is so; false unless given.',
      { kind: 'yes-no', label: 'whether it is so', unlessGiven: 'false' },
    ],
    ['flow, L/min (0 to 300); may be left out.', { kind: 'number', unlessGiven: null }],
    ['zone, text, an IANA name.', { kind: 'text', label: 'zone', words: 'an IANA name' }],
    ['list of days, in any order.', { kind: 'json', label: 'list of days', words: 'in any order' }],
  ])('reads %s', (text, argument) => {
    expect(noteArgument('key', text)).toMatchObject({ key: 'key', ...argument });
  });

  it('refuses words without a kind, naming the key', () => {
    expect(() => noteArgument('heightCm', 'how tall.')).toThrow(
      '@param heightCm has no kind that can be read',
    );
  });
});

describe('noteResult', () => {
  it('finds the unit, or that there is none', () => {
    const units = [
      'kg, always above zero.',
      'cmH2O/(L/s).',
      'min; 0 below it.',
      'index without unit.',
      'L/min of oxygen.',
    ];
    expect(units.map((text) => noteResult(text).unit)).toEqual([
      'kg',
      'cmH2O/(L/s)',
      'min',
      '',
      'L/min of oxygen',
    ]);
  });

  it('finds the parts of a record', () => {
    expect(
      noteResult('record: `cycleS` a breath, s; `ratio` E in 1:E; `null` for the ratio means no time.').parts,
    ).toEqual([
      { key: 'cycleS', label: 'a breath', unit: 's' },
      { key: 'ratio', label: 'E in 1:E', unit: '' },
    ]);
  });
});

it('lists what a barrel exports, without its types', () => {
  const barrel = `export { a } from './one/a.ts';
export type { B } from './one/b.ts';
export {
  type C,
  c,
} from './two-words/c-d.ts';`;
  expect(exportedCalculations(barrel)).toEqual([
    { name: 'a', path: './one/a.ts', subject: 'one' },
    { name: 'c', path: './two-words/c-d.ts', subject: 'two-words' },
  ]);
});
