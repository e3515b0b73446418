import { Button } from '@windrow/ui/controls/button';
import type { EntrySection } from './entry-field.ts';
import { repeatableRows } from './repeatable-rows.ts';
import type { Entry } from './use-entry.ts';

/** Says of all settings that are still open that they are as before; each can be changed after that. */
export function RepeatAll({
  section,
  entry: { draft, dispatch },
  onNext,
}: {
  section: EntrySection;
  entry: Pick<Entry, 'draft' | 'dispatch'>;
  onNext: (key: string) => void;
}) {
  const open = repeatableRows(section, draft);
  const last = section.rows.filter(({ kind }) => kind === 'number').at(-1);
  if (open.length === 0 || !last) return null;
  const hasGiven = open.length < repeatableRows(section, { values: {} }).length;
  return (
    <Button
      onClick={() => {
        dispatch({ type: 'repeat-all', rows: open });
        onNext(last.key);
      }}
    >
      {hasGiven ? 'Other settings as before' : 'All settings as before'}
    </Button>
  );
}
