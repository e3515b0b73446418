import { ChoiceRowView } from './choice-row.tsx';
import { TIME_KEY } from './entry-draft.ts';
import type { EntryRow } from './entry-field.ts';
import type { JudgedRow } from './judge-entry.ts';
import { NumberRowView } from './number-row.tsx';
import { RepeatAll } from './repeat-all.tsx';
import { TextRowView } from './text-row.tsx';
import { TimeRow } from './time-row.tsx';
import type { Entry } from './use-entry.ts';

type EntrySectionsProps = {
  entry: Entry;
  /** What is to be said at a row, by its key; rows that are well are not in it. */
  faults: Readonly<Record<string, string>>;
  now: number;
  timeZone: string;
  onNext: (key: string) => void;
};

const PLATE = '@container rounded-xl bg-tile px-4 py-1';

/** All rows of a plan, by its sections, under the time that they hold for. */
export function EntrySections({ entry, faults, now, timeZone, onNext }: EntrySectionsProps) {
  const rows = new Map(entry.judged.rows.map((judgedRow) => [judgedRow.row.key, judgedRow]));
  return (
    <div className="flex flex-col gap-3">
      {entry.plan.timeLabel !== null && (
        <div className={PLATE}>
          <TimeRow
            entry={entry}
            fault={faults[TIME_KEY] ?? null}
            now={now}
            timeZone={timeZone}
            onNext={onNext}
          />
        </div>
      )}
      {entry.plan.sections.map((section) => (
        <div key={section.title} className={PLATE}>
          {section.rows.length > 1 && (
            <div className="flex flex-wrap items-center justify-between gap-x-4 gap-y-1 pt-2">
              <h2 className="font-bold text-ink-muted">{section.title}</h2>
              <RepeatAll section={section} entry={entry} onNext={onNext} />
            </div>
          )}
          {section.rows.map((row) => {
            const judgedRow = rows.get(row.key);
            return (
              judgedRow && (
                <RowView
                  key={row.key}
                  row={row}
                  judgedRow={judgedRow}
                  entry={entry}
                  fault={faults[row.key] ?? null}
                  now={now}
                  timeZone={timeZone}
                  onNext={onNext}
                />
              )
            );
          })}
        </div>
      ))}
    </div>
  );
}

type RowViewProps = { row: EntryRow; judgedRow: JudgedRow; fault: string | null } & Pick<
  EntrySectionsProps,
  'entry' | 'now' | 'timeZone' | 'onNext'
>;

function RowView({ row, judgedRow, entry, fault, now, timeZone, onNext }: RowViewProps) {
  const { dispatch } = entry;
  // The pad follows the field; a row that needs none puts it away.
  const set = (text: string) => dispatch({ type: 'set', key: row.key, text });
  const focus = () => dispatch({ type: 'focus', key: null });
  switch (row.kind) {
    case 'number':
      return (
        <NumberRowView
          row={row}
          judgedRow={judgedRow}
          entry={entry}
          fault={fault}
          now={now}
          timeZone={timeZone}
          onNext={onNext}
        />
      );
    case 'choice':
      return (
        <ChoiceRowView
          row={row}
          text={judgedRow.text}
          fault={fault}
          now={now}
          timeZone={timeZone}
          onSet={set}
          onFocus={focus}
        />
      );
    case 'text':
      return <TextRowView row={row} text={judgedRow.text} fault={fault} onSet={set} onFocus={focus} />;
  }
}
