import { ChoiceGroup } from '@windrow/ui/controls/choice-group';
import { FieldError } from '@windrow/ui/controls/field-frame';
import { FIELD_CLASS } from '@windrow/ui/controls/text-field';
import type { ChoiceRow } from './entry-field.ts';
import { RowBefore } from './row-before.tsx';
import { ROW_MARGINS, rowId } from './row-id.ts';

const UNSAID = '';

type ChoiceRowProps = {
  row: ChoiceRow;
  text: string;
  fault: string | null;
  now: number;
  timeZone: string;
  onSet: (text: string) => void;
  onFocus: () => void;
};

/** One of a few words side by side, or of many in a list. What need not be said can be left unsaid again. */
export function ChoiceRowView(props: ChoiceRowProps) {
  const { row, now, timeZone, fault } = props;
  return (
    <div id={rowId(row.key)} className={`${ROW_MARGINS} border-line border-b py-2 last:border-b-0`}>
      {row.asList ? (
        <ChoiceList {...props} />
      ) : (
        <div className="flex flex-wrap items-end justify-between gap-x-4 gap-y-1">
          <ChoiceChips {...props} />
          <RowBefore row={row} now={now} timeZone={timeZone} />
        </div>
      )}
      <div aria-live="polite">{fault !== null && <FieldError>{fault}</FieldError>}</div>
    </div>
  );
}

function ChoiceChips({ row, text, onSet, onFocus }: ChoiceRowProps) {
  const options = row.needed ? row.options : [...row.options, { value: UNSAID, label: 'Not recorded' }];
  return (
    <ChoiceGroup
      label={row.label}
      options={options}
      value={text === UNSAID && row.needed ? null : text}
      onChoose={onSet}
      onFocus={onFocus}
    />
  );
}

function ChoiceList({ row, text, fault, now, timeZone, onSet, onFocus }: ChoiceRowProps) {
  const id = `${rowId(row.key)}-list`;
  return (
    <div className="grid grid-cols-[minmax(0,1fr)_auto] items-center gap-x-3 gap-y-1 @md:grid-cols-[auto_auto_minmax(0,1fr)]">
      <label htmlFor={id} className="text-lg">
        {row.label}
      </label>
      <RowBefore row={row} now={now} timeZone={timeZone} />
      <select
        id={id}
        className={`${FIELD_CLASS} col-span-2 font-bold @md:col-span-1`}
        value={text}
        aria-required={row.needed}
        aria-invalid={fault !== null}
        onFocus={onFocus}
        onChange={(event) => onSet(event.target.value)}
      >
        {text === UNSAID && <option value={UNSAID}>Choose</option>}
        {row.options.map(({ value, label }) => (
          <option key={value} value={value}>
            {label}
          </option>
        ))}
      </select>
    </div>
  );
}
