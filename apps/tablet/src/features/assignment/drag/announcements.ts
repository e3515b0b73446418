import type { Announcements, UniqueIdentifier } from '@dnd-kit/core';

/** What those who listen to the screen are told while a bed is carried. `say` answers about one bed over one place. */
export type Telling = {
  bed: (bedId: string) => string;
  /** "Tove Ravn, who would have 615 of 690 min". */
  place: (bedId: string, placeId: string) => string;
  given: (bedId: string, placeId: string) => string;
};

export const CARRY_INSTRUCTIONS = {
  draggable:
    'Press space to lift the bed, up and down arrows to choose a person, space again to give it, Escape to put it back. Press enter to see its minutes and a list of people.',
};

export function announcementsFrom(tell: Telling): Announcements {
  const id = (of: { id: UniqueIdentifier }) => String(of.id);
  const putBack = (bedId: string) => `Put back where it was: ${tell.bed(bedId)}.`;
  return {
    onDragStart: ({ active }) => `Lifted ${tell.bed(id(active))}.`,
    onDragOver: ({ active, over }) => (over ? `Over ${tell.place(id(active), id(over))}.` : 'Over no one.'),
    onDragEnd: ({ active, over }) => (over ? tell.given(id(active), id(over)) : putBack(id(active))),
    onDragCancel: ({ active }) => putBack(id(active)),
  };
}
