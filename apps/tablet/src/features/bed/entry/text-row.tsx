import { TextField } from '@windrow/ui/controls/text-field';
import { formatDay } from '@windrow/ventilation/format/clock';
import type { TextRow } from './entry-field.ts';
import { rowId } from './row-id.ts';

/** The contract's longest note. */
const LONGEST = 500;

/** Each device writes a date in its own order, so the day is said again in words that no country reads otherwise. */
function dayHint(hint: string, text: string): string {
  const day = /^\d{4}-\d{2}-\d{2}$/.test(text) ? formatDay(text) : '';
  return [hint, day].filter((part) => part !== '').join(' · ');
}

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
        hint={row.isDay ? dayHint(row.hint, text) : row.hint}
        error={fault ?? undefined}
        type={row.isDay ? 'date' : 'text'}
        aria-required={row.needed}
        maxLength={LONGEST}
        value={text}
        onFocus={onFocus}
        onChange={(event) => onSet(event.target.value)}
      />
    </div>
  );
}
