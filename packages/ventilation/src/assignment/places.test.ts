import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { coverBed, differences, giveBed, holderOf, onTop, samePlaces } from './places.ts';

const place = (bedId: string, personId: string, coverPersonId: string | null = null) => ({
  bedId,
  personId,
  coverPersonId,
});

describe('giveBed', () => {
  it('gives a bed to a person, and takes it from whoever had it', () => {
    const places = giveBed([place('b1', 'ao'), place('b2', 'mk')], 'b1', 'mk');
    expect(holderOf(places, 'b1')).toBe('mk');
    expect(places).toHaveLength(2);
  });

  it('leaves a bed with nobody', () => {
    expect(giveBed([place('b1', 'ao')], 'b1', null)).toEqual([]);
    expect(giveBed([], 'b1', null)).toEqual([]);
  });

  it('keeps the cover, unless the cover gets the bed', () => {
    expect(giveBed([place('b1', 'ao', 'tr')], 'b1', 'mk')).toEqual([place('b1', 'mk', 'tr')]);
    expect(giveBed([place('b1', 'ao', 'tr')], 'b1', 'tr')).toEqual([place('b1', 'tr')]);
  });

  it('changes nothing when the person has the bed already', () => {
    const places = [place('b1', 'ao', 'tr')];
    expect(giveBed(places, 'b1', 'ao')).toEqual(places);
  });
});

describe('coverBed', () => {
  it('sets and takes off a second name, never the holder, never on a bed that nobody has', () => {
    expect(coverBed([place('b1', 'ao')], 'b1', 'mk')).toEqual([place('b1', 'ao', 'mk')]);
    expect(coverBed([place('b1', 'ao', 'mk')], 'b1', null)).toEqual([place('b1', 'ao')]);
    expect(coverBed([place('b1', 'ao')], 'b1', 'ao')).toEqual([place('b1', 'ao')]);
    expect(coverBed([], 'b1', 'mk')).toEqual([]);
  });
});

describe('differences', () => {
  it('names beds on which person or cover differ, and no others', () => {
    const theirs = [place('b1', 'ao'), place('b2', 'mk'), place('b3', 'tr')];
    const mine = [place('b3', 'tr', 'ao'), place('b2', 'mk'), place('b4', 'ao')];
    expect(differences({ theirs, mine }).map(({ bedId }) => bedId)).toEqual(['b1', 'b3', 'b4']);
  });

  it('finds none between the same places in another order, with or without an empty cover', () => {
    expect(
      samePlaces(
        [place('b1', 'ao'), place('b2', 'mk')],
        [{ bedId: 'b2', personId: 'mk' }, place('b1', 'ao')],
      ),
    ).toBe(true);
  });
});

describe('onTop', () => {
  it('keeps my moves, and theirs on beds that I did not touch', () => {
    const base = [place('b1', 'ao'), place('b2', 'mk'), place('b3', 'tr')];
    const mine = [place('b1', 'tr'), place('b2', 'mk')]; // b1 to TR, b3 to nobody
    const theirs = [place('b1', 'mk'), place('b2', 'ao'), place('b3', 'tr'), place('b4', 'ao')];
    expect(
      samePlaces(onTop({ base, mine, theirs }), [place('b1', 'tr'), place('b2', 'ao'), place('b4', 'ao')]),
    ).toBe(true);
  });

  const places = fc.uniqueArray(
    fc.record({
      bedId: fc.constantFrom('b1', 'b2', 'b3', 'b4'),
      personId: fc.constantFrom('ao', 'mk', 'tr'),
    }),
    { selector: (each) => each.bedId },
  );

  it('is theirs where I moved nothing, and mine where they moved nothing', () => {
    fc.assert(
      fc.property(places, places, (base, other) => {
        expect(samePlaces(onTop({ base, mine: base, theirs: other }), other)).toBe(true);
        expect(samePlaces(onTop({ base, mine: other, theirs: base }), other)).toBe(true);
      }),
    );
  });
});
