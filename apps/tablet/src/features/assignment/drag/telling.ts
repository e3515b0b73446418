import { type Load, loads } from '@windrow/ventilation/assignment/loads';
import { giveBed, holderOf } from '@windrow/ventilation/assignment/places';
import type { AssignmentPlace, ShiftPerson } from '@windrow/ventilation/contract/shifts';
import type { BedWork } from '../bed-work.ts';
import { inMinutes, sumOf } from '../words.ts';
import type { Telling } from './announcements.ts';
import { personOf } from './place-id.ts';

/** The words for a bed that is carried: what it weighs, and what each person has or would have with it. */
export function tellingOf(area: {
  people: readonly ShiftPerson[];
  places: readonly AssignmentPlace[];
  work: readonly BedWork[];
}): Telling {
  const { people, places, work } = area;
  const minutesByBed = new Map(work.map(({ bedId, minutes }) => [bedId, minutes.total]));

  function loadWith(bedId: string, placeId: string): Load | null {
    const then = giveBed(places, bedId, personOf(placeId));
    return (
      loads({ people, places: then, minutesByBed }).find(({ person }) => person.personId === placeId) ?? null
    );
  }
  function bed(bedId: string): string {
    const each = work.find((one) => one.bedId === bedId);
    return each ? `bed ${each.label}, ${inMinutes(each.minutes.total)}` : 'the bed';
  }
  return {
    bed,
    place: (bedId, placeId) => {
      const load = loadWith(bedId, placeId);
      if (!load) return 'nobody';
      const verb = holderOf(places, bedId) === placeId ? 'has' : 'would have';
      return `${load.person.displayName}, who ${verb} ${sumOf(load)}`;
    },
    given: (bedId, placeId) => {
      const load = loadWith(bedId, placeId);
      if (!load) return `${capital(bed(bedId))}, is now with nobody.`;
      return `${capital(bed(bedId))}, given to ${load.person.displayName}, who now has ${sumOf(load)}.`;
    },
  };
}

function capital(words: string): string {
  return words.charAt(0).toUpperCase() + words.slice(1);
}
