import { RecordEntry } from '@windrow/ventilation/contract/observations';

/** What goes along from the record to the form that amends: the entry, and whose it is. */
export function amendState({ stayId, entry }: { stayId: string; entry: RecordEntry }) {
  return { stayId, entry };
}

/**
 * The entry that came along. The browser keeps it over a reload, and by then another patient may lie in the
 * bed: an entry of another stay is none.
 */
export function entryIn({ state, stayId }: { state: unknown; stayId: string }): RecordEntry | null {
  if (typeof state !== 'object' || state === null || !('entry' in state) || !('stayId' in state)) return null;
  if (state.stayId !== stayId) return null;
  const parsed = RecordEntry.safeParse(state.entry);
  return parsed.success ? parsed.data : null;
}
