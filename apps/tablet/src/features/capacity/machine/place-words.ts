import type { Ventilator } from '@windrow/ventilation/contract/fleet';

export type UnitNames = ReadonlyMap<string, string>;

/** Where a machine stands, in words: "bed 03, Harbour ICU", "Workshop". */
export function placeInWords({
  place,
  units,
}: {
  place: Pick<Ventilator['place'], 'unitId' | 'bedLabel' | 'words'>;
  units: UnitNames;
}): string {
  const said = [
    place.bedLabel ? `bed ${place.bedLabel}` : null,
    place.unitId ? (units.get(place.unitId) ?? 'a unit') : null,
    place.words,
  ].filter((part) => part !== null && part !== '');
  return said.join(', ') || 'place not recorded';
}
