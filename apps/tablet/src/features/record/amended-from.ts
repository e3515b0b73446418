import type { RecordEntry } from '@windrow/ventilation/contract/observations';

/** For each amended entry the one that amends it, as far as the pages read so far hold it. */
export function amendedFrom(entries: readonly RecordEntry[]): ReadonlyMap<string, RecordEntry> {
  return new Map(entries.flatMap((entry) => (entry.amends ? [[entry.amends.observationId, entry]] : [])));
}

/** Only what counts now and was recorded by hand on the bed's forms; a struck entry holds nothing to mend. */
export function mayBeAmended({
  kind,
  amendedBy,
  amends,
}: Pick<RecordEntry, 'kind' | 'amendedBy' | 'amends'>): boolean {
  const isOfAForm = kind !== 'details' && kind !== 'place' && kind !== 'acknowledgement';
  return isOfAForm && amendedBy === null && amends?.as !== 'struck';
}
