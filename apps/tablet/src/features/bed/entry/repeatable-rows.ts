import type { EntryDraft } from './entry-draft.ts';
import type { EntrySection, NumberRow } from './entry-field.ts';

/** The numbers of a section that one press says to be as before: recorded last, and not given yet. */
export function repeatableRows(
  { rows, mayRepeat = false }: EntrySection,
  { values }: Pick<EntryDraft, 'values'>,
): readonly NumberRow[] {
  if (!mayRepeat) return [];
  return rows.filter(
    (row): row is NumberRow => row.kind === 'number' && row.repeat !== null && (values[row.key] ?? '') === '',
  );
}
