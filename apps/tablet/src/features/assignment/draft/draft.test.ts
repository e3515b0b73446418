import { giveBed, samePlaces } from '@windrow/ventilation/assignment/places';
import type { Assignment, AssignmentPlace } from '@windrow/ventilation/contract/shifts';
import { describe, expect, it } from 'vitest';
import { isUnsaved, moved, putOnTop, redone, saved, startDraft, takeTheirs, undone } from './draft.ts';

const place = (bedId: string, personId: string): AssignmentPlace => ({
  bedId,
  personId,
  coverPersonId: null,
});

function assignment(version: number, places: AssignmentPlace[]): Assignment {
  const shift = {
    shiftId: 's1',
    unitId: 'u1',
    name: 'Day',
    startsAt: '2026-03-05T07:00:00Z',
    endsAt: '2026-03-05T19:00:00Z',
    version,
    publishedVersion: null,
    people: [],
  };
  return { shift, places, version, publishedVersion: null, changedBy: null, changedAt: null };
}

const first = assignment(3, [place('b1', 'ao'), place('b2', 'mk')]);
const give = (draft: ReturnType<typeof startDraft>, bedId: string, personId: string | null) =>
  moved(draft, giveBed(draft.present, bedId, personId));

describe('a draft', () => {
  it('has nothing unsaved until a bed is moved, and again once it is moved back', () => {
    const draft = startDraft(first);
    expect(isUnsaved(draft)).toBe(false);
    const there = give(draft, 'b1', 'mk');
    expect(isUnsaved(there)).toBe(true);
    expect(isUnsaved(give(there, 'b1', 'ao'))).toBe(false);
  });

  it('goes back and forward step by step, and forgets the way forward at a new move', () => {
    const two = give(give(startDraft(first), 'b1', 'mk'), 'b2', 'ao');
    const back = undone(two);
    expect(samePlaces(redone(back).present, two.present)).toBe(true);
    expect(samePlaces(undone(back).present, first.places)).toBe(true);
    expect(give(back, 'b2', null).future).toEqual([]);
    expect(undone(startDraft(first)).past).toEqual([]);
  });

  it('is saved with the moves made while it was on its way still unsaved', () => {
    const sent = give(startDraft(first), 'b1', 'mk');
    const later = give(sent, 'b2', 'ao');
    const after = saved(later, assignment(4, [...sent.present]));
    expect(after.base.version).toBe(4);
    expect(isUnsaved(after)).toBe(true);
    expect(samePlaces(after.present, later.present)).toBe(true);
  });
});

describe('two hands', () => {
  const mine = give(startDraft(first), 'b1', 'tr');
  const theirs = assignment(4, [place('b1', 'mk'), place('b2', 'ao')]);

  it('puts my moves on theirs, and one step back leads to theirs, not to what neither has', () => {
    const both = putOnTop(mine, theirs);
    expect(both.base.version).toBe(4);
    expect(samePlaces(both.present, [place('b1', 'tr'), place('b2', 'ao')])).toBe(true);
    expect(samePlaces(undone(both).present, theirs.places)).toBe(true);
  });

  it('takes theirs with nothing unsaved, and one step forward brings my moves back', () => {
    const taken = takeTheirs(mine, theirs);
    expect(isUnsaved(taken)).toBe(false);
    expect(samePlaces(redone(taken).present, [place('b1', 'tr'), place('b2', 'ao')])).toBe(true);
  });

  it('takes theirs where both came to the same', () => {
    const same = assignment(4, [place('b1', 'tr'), place('b2', 'mk')]);
    expect(samePlaces(takeTheirs(mine, same).present, same.places)).toBe(true);
  });
});
