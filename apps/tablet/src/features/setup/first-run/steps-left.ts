import type { Unit } from '@windrow/ventilation/contract/board';
import type { Person } from '@windrow/ventilation/contract/setup';

export type Step = { id: 'unit' | 'beds' | 'people' | 'ventilators'; isDone: boolean };

/** What a new house still lacks, in the order in which one thing needs the other. */
export function stepsLeft({
  units,
  people,
}: {
  units: readonly Pick<Unit, 'bedCount'>[];
  people: readonly Pick<Person, 'grants' | 'disabled'>[];
}): Step[] {
  const hasRole = (roles: readonly string[]) =>
    people.some(({ disabled, grants }) => !disabled && grants.some(({ role }) => roles.includes(role)));
  return [
    { id: 'unit', isDone: units.length > 0 },
    { id: 'beds', isDone: units.length > 0 && units.every(({ bedCount }) => bedCount > 0) },
    { id: 'people', isDone: hasRole(['charge']) && hasRole(['therapist', 'charge']) },
    // Whoever sets up sees no fleet; that somebody can fill it is all that can be known here.
    { id: 'ventilators', isDone: hasRole(['supervisor', 'biomedical']) },
  ];
}
