import { describe, expect, it } from 'vitest';
import type { EntryDraft } from './entry-draft.ts';
import { NOTHING_BEFORE } from './entry-field.ts';
import { faultsOf, refusalsOf } from './faults.ts';
import { judgeEntry } from './judge-entry.ts';
import { gasPlan } from './plans/gas-plan.ts';

const none = () => NOTHING_BEFORE;
const plan = gasPlan({ earlier: none, asSet: none });

function faults(
  values: Record<string, string>,
  {
    left = [],
    active = null,
    wasTried = false,
    refusals = {},
  }: Partial<EntryDraft> & { wasTried?: boolean; refusals?: Parameters<typeof faultsOf>[0]['refusals'] } = {},
) {
  const draft: EntryDraft = {
    values,
    kept: {},
    left,
    active,
    typing: null,
    time: null,
    mayStand: false,
    startedFrom: null,
  };
  return faultsOf({
    judged: judgeEntry({ plan, draft, weightKg: null }),
    draft,
    time: { state: 'now' },
    refusals,
    wasTried,
  });
}

describe('faultsOf', () => {
  it('says that a value cannot be once its row was left, and not while it is typed', () => {
    expect(faults({ ph: '9' }, { active: 'ph' })).toEqual({});
    expect(faults({ ph: '9' }, { left: ['ph'], active: 'ph' })).toEqual({});
    expect(faults({ ph: '9' }, { left: ['ph'], active: 'pco2MmHg' })).toEqual({
      ph: 'pH must be 6.5 to 8, not 9',
    });
  });

  it('says what is missing only after the person wanted to record', () => {
    expect(faults({}, { left: ['ph'] })).toEqual({});
    expect(Object.keys(faults({}, { wasTried: true }))).toEqual(['site', 'ph', 'pco2MmHg', 'po2MmHg']);
  });

  it('repeats a refusal of the server for the text that was refused, and for no other', () => {
    const refusals = { ph: { text: '7.4', message: 'not accepted' } };
    expect(faults({ ph: '7.4' }, { refusals })).toEqual({ ph: 'not accepted' });
    expect(faults({ ph: '7.3' }, { refusals })).toEqual({});
  });
});

describe('refusalsOf', () => {
  it('keeps what belongs to no row for the entry as a whole', () => {
    const judged = judgeEntry({
      plan,
      draft: {
        values: { ph: '7.4' },
        kept: {},
        left: [],
        active: null,
        typing: null,
        time: null,
        mayStand: false,
        startedFrom: null,
      },
      weightKg: null,
    });
    const errors = [
      { key: 'ph', message: 'not accepted' },
      { key: 'stayId', message: 'the stay has ended' },
    ];
    expect(refusalsOf({ errors, judged })).toEqual({
      refusals: { ph: { text: '7.4', message: 'not accepted' } },
      others: ['the stay has ended'],
    });
  });
});
