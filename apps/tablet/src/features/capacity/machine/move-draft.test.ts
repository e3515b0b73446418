import { describe, expect, it } from 'vitest';
import { type MoveDraft, moveFrom } from './move-draft.ts';

const draft: MoveDraft = { state: 'cleaning', bedId: 'b1', unitId: 'u1', words: ' Sluice ', note: '' };

describe('moveFrom', () => {
  it('sends the bed only for a machine in use, and nothing else with it', () => {
    expect(moveFrom({ ...draft, state: 'in-use', note: ' cuff test done ' })).toEqual({
      move: { state: 'in-use', bedId: 'b1', unitId: null, words: null, note: 'cuff test done' },
    });
    expect(moveFrom(draft)).toEqual({
      move: { state: 'cleaning', bedId: null, unitId: 'u1', words: 'Sluice' },
    });
  });

  it('needs a bed for in use, and words for a loan', () => {
    expect(moveFrom({ ...draft, state: 'in-use', bedId: '' })).toEqual({
      errors: { bedId: 'choose the bed' },
    });
    expect(moveFrom({ ...draft, state: 'on-loan', words: ' ' })).toMatchObject({
      errors: { words: expect.any(String) },
    });
  });

  it('takes a lent or retired machine out of every unit', () => {
    expect(moveFrom({ ...draft, state: 'on-loan', words: 'St Brannock' })).toMatchObject({
      move: { unitId: null, words: 'St Brannock' },
    });
    expect(moveFrom({ ...draft, state: 'retired', words: '' })).toMatchObject({
      move: { unitId: null, words: null },
    });
  });

  it('refuses words that are too long to stand in a list', () => {
    expect(moveFrom({ ...draft, words: 'x'.repeat(81) })).toMatchObject({
      errors: { words: expect.any(String) },
    });
  });
});
