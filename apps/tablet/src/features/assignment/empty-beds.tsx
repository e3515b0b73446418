import { holderOf } from '@windrow/ventilation/assignment/places';
import type { AssignmentPlace, ShiftPerson } from '@windrow/ventilation/contract/shifts';
import type { EmptyBed } from './bed-work.ts';

/** Beds without a patient: nothing to carry, but whoever had one gets the next patient in it. */
export function EmptyBeds({
  empty,
  places,
  people,
}: {
  empty: readonly EmptyBed[];
  places: readonly AssignmentPlace[];
  people: readonly ShiftPerson[];
}) {
  if (empty.length === 0) return null;
  const initials = new Map(people.map((person) => [person.personId, person.initials]));
  const said = empty.map(({ bedId, label, isOpen }) => {
    const holder = initials.get(holderOf(places, bedId) ?? '');
    return `${label}${isOpen ? '' : ' closed'}${holder ? ` (${holder})` : ''}`;
  });
  return (
    <p className="text-ink-muted">
      Empty beds: <span className="text-ink">{said.join(' · ')}</span>. A patient who comes to one appears
      here at once.
    </p>
  );
}
