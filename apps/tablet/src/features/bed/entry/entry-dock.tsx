import { Keypad } from '@windrow/ui/controls/keypad';
import { formatNumber } from '@windrow/ventilation/format/number';
import { TIME_KEY } from './entry-draft.ts';
import { type NumberRow, valueAlone } from './entry-field.ts';
import { shownDigits } from './entry-time.ts';
import type { JudgedRow } from './judge-entry.ts';
import type { Entry } from './use-entry.ts';

type EntryDockProps = { entry: Entry; onNext: (key: string) => void };

/** What the pad writes into now: the time, a row with its judgement, or nothing. */
export function padFor({ draft, judged }: Entry): 'time' | { row: NumberRow; judgedRow: JudgedRow } | null {
  if (draft.active === TIME_KEY) return draft.time === null ? null : 'time';
  const judgedRow = judged.rows.find(({ row }) => row.key === draft.active);
  return judgedRow?.row.kind === 'number' ? { row: judgedRow.row, judgedRow } : null;
}

/** The keypad for the row that is being filled; nothing while none is. */
export function EntryDock({ entry, onNext }: EntryDockProps) {
  const { draft, dispatch, plan } = entry;
  if (draft.active === TIME_KEY && draft.time !== null) {
    return (
      <Keypad
        label={plan.timeLabel ?? ''}
        echo={shownDigits(draft.time.digits)}
        unit="hh:mm"
        hasPoint={false}
        repeat={null}
        special={null}
        onPress={(key) => dispatch({ type: 'press-time', key })}
        onNext={() => onNext(TIME_KEY)}
        onHide={() => dispatch({ type: 'focus', key: null })}
      />
    );
  }
  const active = padFor(entry);
  if (active === null || active === 'time') return null;
  return <NumberDock row={active.row} judgedRow={active.judgedRow} dispatch={dispatch} onNext={onNext} />;
}

function NumberDock({
  row,
  judgedRow,
  dispatch,
  onNext,
}: { row: NumberRow; judgedRow: JudgedRow } & Pick<Entry, 'dispatch'> & Pick<EntryDockProps, 'onNext'>) {
  const { repeat } = row;
  return (
    <Keypad
      label={row.label}
      echo={
        judgedRow.judgement.state === 'valid' ? valueAlone(row, judgedRow.judgement.value) : judgedRow.text
      }
      unit={judgedRow.text === 'off' ? '' : row.field.unit}
      aside={asideOf(row, judgedRow)}
      hasPoint
      repeat={
        repeat && {
          label: `${repeat.label} ${repeat.value === 'off' ? 'off' : formatNumber(repeat.value, row.field)}`,
          onPress: () => {
            dispatch({ type: 'repeat', row });
            onNext(row.key);
          },
        }
      }
      special={specialOf(row, dispatch)}
      onPress={(key) => dispatch({ type: 'press', row, key })}
      onNext={() => onNext(row.key)}
      onHide={() => dispatch({ type: 'focus', key: null })}
    />
  );
}

function specialOf(row: NumberRow, dispatch: Entry['dispatch']) {
  if (row.mayBeOff)
    return {
      label: 'off',
      name: 'limit is off',
      onPress: () => dispatch({ type: 'set', key: row.key, text: 'off' }),
    };
  if (row.field.hard[0] < 0)
    return {
      label: '±',
      name: 'change the sign',
      onPress: () => dispatch({ type: 'press', row, key: 'sign' }),
    };
  return null;
}

/** What the eye should catch while typing: how oxygen was understood, how far it is from the last value. */
function asideOf(row: NumberRow, { judgement, text }: JudgedRow): string | undefined {
  if (judgement.state !== 'valid' || typeof judgement.value !== 'number') return undefined;
  if (row.key === 'fio2Percent' && text.includes('.')) return `from ${text}`;
  if (row.before.state !== 'shown' || typeof row.before.value !== 'number') return undefined;
  const moved = judgement.value - row.before.value;
  if (moved === 0) return 'as before';
  return `${moved > 0 ? '+' : ''}${formatNumber(moved, row.field)} since last`;
}
