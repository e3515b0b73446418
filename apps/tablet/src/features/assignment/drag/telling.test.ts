import { describe, expect, it } from 'vitest';
import type { BedWork } from '../bed-work.ts';
import { announcementsFrom } from './announcements.ts';
import { NOBODY } from './place-id.ts';
import { tellingOf } from './telling.ts';

const work = (bedId: string, label: string, total: number): BedWork => ({
  bedId,
  label,
  support: 'PSV',
  minutes: { total, parts: [] },
  nowWith: null,
});
const tell = tellingOf({
  people: [
    { personId: 'ao', displayName: 'Ama Osei', initials: 'AO', minutesAvailable: 690 },
    { personId: 'mk', displayName: 'Mirek Kolar', initials: 'MK', minutesAvailable: 100 },
  ],
  places: [
    { bedId: 'b1', personId: 'ao' },
    { bedId: 'b2', personId: 'mk' },
  ],
  work: [work('b1', '01', 130), work('b2', '02', 86)],
});

describe('tellingOf', () => {
  it('says what a person would have, and by how much that is over', () => {
    expect(tell.place('b1', 'mk')).toBe('Mirek Kolar, who would have 216 of 100 min, 116 over');
    expect(tell.place('b1', 'ao')).toBe('Ama Osei, who has 130 of 690 min');
    expect(tell.place('b1', NOBODY)).toBe('nobody');
  });

  it('says what has been done', () => {
    expect(tell.given('b2', 'ao')).toBe('Bed 02, 86 min, given to Ama Osei, who now has 216 of 690 min.');
    expect(tell.given('b2', NOBODY)).toBe('Bed 02, 86 min, is now with nobody.');
  });
});

describe('announcementsFrom', () => {
  it('tells a carry from lifting to putting back', () => {
    const says = announcementsFrom(tell);
    const active = { id: 'b1' } as never;
    expect(says.onDragStart({ active })).toBe('Lifted bed 01, 130 min.');
    expect(says.onDragOver({ active, over: { id: 'ao' } as never })).toBe(
      'Over Ama Osei, who has 130 of 690 min.',
    );
    expect(says.onDragOver({ active, over: null })).toBe('Over no one.');
    expect(says.onDragCancel({ active, over: null })).toBe('Put back where it was: bed 01, 130 min.');
  });
});
