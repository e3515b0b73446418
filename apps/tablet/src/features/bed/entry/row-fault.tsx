import { Button } from '@windrow/ui/controls/button';
import { FieldError } from '@windrow/ui/controls/field-frame';
import { formatNumber } from '@windrow/ventilation/format/number';
import type { JudgedRow } from './judge-entry.ts';
import { focusRow, rowId } from './row-id.ts';
import type { Entry } from './use-entry.ts';

/** Below a row: why its value cannot be recorded, or the one question about a value that is only unusual. */
export function RowFault({
  judgedRow,
  fault,
  draft,
  dispatch,
}: { judgedRow: JudgedRow; fault: string | null } & Pick<Entry, 'draft' | 'dispatch'>) {
  const { row, judgement, isKept } = judgedRow;
  const unusual = judgement.state === 'valid' ? judgement.unusual : null;
  const asks = fault === null && unusual !== null && !isKept && draft.left.includes(row.key);
  return (
    <div id={`${rowId(row.key)}-fault`} aria-live="polite">
      {fault !== null && <FieldError>{fault}</FieldError>}
      {asks && (
        <div className="flex flex-wrap items-center gap-3 py-1">
          <p className="font-bold">
            {unusual} Keep{' '}
            {judgement.state === 'valid' && row.kind === 'number' && typeof judgement.value === 'number'
              ? formatNumber(judgement.value, row.field)
              : 'it'}
            ?
          </p>
          <Button onClick={() => dispatch({ type: 'keep', key: row.key })}>Keep</Button>
          <Button
            tone="quiet"
            onClick={() => {
              dispatch({ type: 'set', key: row.key, text: '' });
              focusRow(row.key);
            }}
          >
            Change
          </Button>
        </div>
      )}
      {isKept && <p className="text-ink-muted text-sm">unusual, kept</p>}
    </div>
  );
}
