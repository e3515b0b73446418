import { describe, expect, it } from 'vitest';
import { loads, nobodyHas } from './loads.ts';

const people = [
  { personId: 'ao', displayName: 'Ama Osei', initials: 'AO', minutesAvailable: 100 },
  { personId: 'mk', displayName: 'Mirek Kolar', initials: 'MK', minutesAvailable: 60 },
];
const minutesByBed = new Map([
  ['b1', 40],
  ['b2', 60],
  ['b3', 25],
  ['b4', 30],
]);
const places = [
  { bedId: 'b2', personId: 'ao' },
  { bedId: 'b1', personId: 'ao' },
  { bedId: 'b3', personId: 'mk' },
  { bedId: 'empty', personId: 'mk' },
  { bedId: 'b4', personId: 'left-the-shift' },
];

describe('loads', () => {
  it('sums each person and says what is over or left, on both sides of the edge', () => {
    const [ao, mk] = loads({ people, places, minutesByBed });
    expect(ao).toMatchObject({ bedIds: ['b1', 'b2'], minutes: 100, over: 0, left: 0 });
    expect(mk).toMatchObject({ bedIds: ['b3'], minutes: 25, over: 0, left: 35 });
    const [more] = loads({
      people,
      places: [...places, { bedId: 'b5', personId: 'ao' }],
      minutesByBed: new Map([...minutesByBed, ['b5', 1]]),
    });
    expect(more).toMatchObject({ minutes: 101, over: 1, left: 0 });
  });

  it('gives a person without beds an empty load', () => {
    expect(loads({ people, places: [], minutesByBed })[0]).toMatchObject({
      bedIds: [],
      minutes: 0,
      left: 100,
    });
  });
});

describe('nobodyHas', () => {
  it('names beds without a person, and those of somebody who is not on the shift', () => {
    expect(nobodyHas({ people, places, minutesByBed })).toEqual(['b4']);
    expect(nobodyHas({ people, places: [], minutesByBed })).toEqual(['b1', 'b2', 'b3', 'b4']);
  });
});
