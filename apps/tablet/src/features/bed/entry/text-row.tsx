import { TextField } from '@windrow/ui/controls/text-field';
import type { TextRow } from './entry-field.ts';
import { rowId } from './row-id.ts';

/** The contract's longest note. */
const LONGEST = 500;

export function TextRowView({
  row,
  text,
  fault,
  onSet,
  onFocus,
}: {
  row: TextRow;
  text: string;
  fault: string | null;
  onSet: (text: string) => void;
  onFocus: () => void;
}) {
  return (
    <div className="py-2">
      <TextField
        id={rowId(row.key)}
        label={row.label}
        hint={row.hint}
        error={fault ?? undefined}
        aria-required={row.needed}
        maxLength={LONGEST}
        value={text}
        onFocus={onFocus}
        onChange={(event) => onSet(event.target.value)}
      />
    </div>
  );
}
