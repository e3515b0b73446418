import type { RecordEntry } from '@windrow/ventilation/contract/observations';
import { describe, expect, it } from 'vitest';
import { amendState, entryIn } from './amend-state.ts';

const entry: RecordEntry = {
  observationId: 'o',
  kind: 'airway-check',
  observedAt: '2026-03-05T09:40:21.000Z',
  recordedAt: '2026-03-05T09:41:00.000Z',
  recordedBy: { personId: 'p', displayName: 'Ama Osei', initials: 'AO' },
  source: 'hand',
  amends: null,
  amendedBy: null,
  body: { cuffCmH2O: 27 },
};

describe('entryIn', () => {
  it('gives the entry of this stay, and none of another', () => {
    const state = amendState({ stayId: 's1', entry });
    expect(entryIn({ state, stayId: 's1' })).toEqual(entry);
    expect(entryIn({ state, stayId: 's2' })).toBeNull();
  });

  it.each([null, undefined, 'o', { entry }, { stayId: 's1' }, { stayId: 's1', entry: { kind: 'gas' } }])(
    'finds none in %j',
    (state) => expect(entryIn({ state, stayId: 's1' })).toBeNull(),
  );
});
