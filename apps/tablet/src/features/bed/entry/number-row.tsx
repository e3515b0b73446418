import { Check } from 'lucide-react';
import type { KeyboardEvent } from 'react';
import type { NumberRow } from './entry-field.ts';
import { valueAlone } from './entry-field.ts';
import type { JudgedRow } from './judge-entry.ts';
import { keypadKeyOf, pressAll } from './press-key.ts';
import { RowBefore } from './row-before.tsx';
import { RowFault } from './row-fault.tsx';
import { ROW_MARGINS, rowId, showRow } from './row-id.ts';
import type { Entry } from './use-entry.ts';

type NumberRowProps = {
  row: NumberRow;
  judgedRow: JudgedRow;
  entry: Pick<Entry, 'draft' | 'dispatch'>;
  fault: string | null;
  now: number;
  timeZone: string;
  onNext: (key: string) => void;
};

/** A value is never only coloured: changed is filled and bold, confirmed carries a tick, the rest is an empty box. */
const LOOKS: Record<JudgedRow['change'], string> = {
  changed: 'border-block-soft bg-block-soft font-bold text-ink',
  new: 'border-block-soft bg-block-soft font-bold text-ink',
  confirmed: 'border-transparent bg-tile text-ink-muted',
  empty: 'border-line-strong border-dashed bg-tile text-ink',
};

const REFUSED = 'border-flag-text bg-tile font-bold text-ink';

/** Label, last value with its age, new value. The field takes the docked pad and a keyboard, never the system's own. */
export function NumberRowView({ row, judgedRow, entry, fault, now, timeZone, onNext }: NumberRowProps) {
  const { draft, dispatch } = entry;
  const isActive = draft.active === row.key;
  const id = rowId(row.key);
  const look = isActive
    ? 'border-focus bg-tile font-bold text-ink'
    : fault === null
      ? LOOKS[judgedRow.change]
      : REFUSED;

  const handleKey = (event: KeyboardEvent) => {
    if (event.ctrlKey || event.metaKey || event.altKey) return;
    if (event.key === 'Enter') {
      event.preventDefault();
      onNext(row.key);
      return;
    }
    const key = keypadKeyOf(event.key, row.field);
    if (key === null) return;
    event.preventDefault();
    dispatch({ type: 'press', row, key });
  };

  return (
    <div className="border-line border-b py-1.5 last:border-b-0">
      <div className="grid grid-cols-[minmax(0,1fr)_8rem] items-center gap-x-3 @xs:grid-cols-[minmax(0,1fr)_auto_8rem]">
        <label
          htmlFor={id}
          className="col-span-2 flex min-h-8 @xs:col-span-1 @xs:min-h-12 flex-wrap items-center gap-x-2 text-lg leading-tight"
        >
          <span>{row.label}</span>
          <span className="text-ink-muted text-sm">
            {row.field.unit}
            {row.needed && <span className="sr-only">, needed</span>}
          </span>
        </label>
        <div className="text-right">
          <RowBefore row={row} now={now} timeZone={timeZone} />
        </div>
        <div className="relative">
          <input
            id={id}
            type="text"
            inputMode="none"
            autoComplete="off"
            enterKeyHint="next"
            aria-required={row.needed}
            aria-invalid={fault !== null}
            aria-describedby={`${id}-fault`}
            className={`${ROW_MARGINS} h-12 w-full rounded-lg border-2 px-3 text-right text-2xl tabular-nums ${look}`}
            value={isActive ? judgedRow.text : shownText(row, judgedRow)}
            onChange={(event) =>
              dispatch({ type: 'set', key: row.key, text: pressAll(event.target.value, row.field) })
            }
            onFocus={() => {
              dispatch({ type: 'focus', key: row.key });
              showRow(row.key);
            }}
            onBlur={() => leaveSoon(() => dispatch({ type: 'leave', key: row.key }))}
            onKeyDown={handleKey}
          />
          {judgedRow.change === 'confirmed' && (
            <Check aria-label="as before" className="absolute top-3.5 left-2 size-5 text-ink-muted" />
          )}
        </div>
      </div>
      <RowFault judgedRow={judgedRow} fault={fault} draft={draft} dispatch={dispatch} />
    </div>
  );
}

/** The value as it will be recorded: oxygen typed as 0.4 reads 40. What cannot be recorded reads as typed. */
function shownText(row: NumberRow, { judgement, text }: JudgedRow): string {
  return judgement.state === 'valid' ? valueAlone(row, judgement.value) : text;
}

/**
 * Words that appear push the page down: not before the press that left this field has found its target,
 * and not so that the field which has the focus now slides under the pad.
 */
function leaveSoon(leave: () => void): void {
  setTimeout(() => {
    leave();
    setTimeout(() => document.activeElement?.closest('input')?.scrollIntoView({ block: 'nearest' }));
  }, 120);
}
