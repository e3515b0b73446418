import type { WorkedOut } from '@windrow/ventilation/notes/worked-out';
import type { NoteLink } from './aid-panel.tsx';

/** Links to the method notes whose numbers are all known. */
export function noteLinks(pairs: readonly (readonly [label: string, from: WorkedOut | null])[]): NoteLink[] {
  return pairs.flatMap(([label, from]) => (from ? [{ label, from }] : []));
}
