import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { useNow } from '@windrow/client/clock/use-now';
import { ProblemError } from '@windrow/client/http';
import { write } from '@windrow/client/writes/write';
import { Button } from '@windrow/ui/controls/button';
import { ChoiceGroup } from '@windrow/ui/controls/choice-group';
import { Notice } from '@windrow/ui/controls/notice';
import { Reading } from '@windrow/ui/controls/reading';
import { SelectField } from '@windrow/ui/controls/select-field';
import { TextField } from '@windrow/ui/controls/text-field';
import { localMoment, SHIFT_PRESETS } from '@windrow/ventilation/assignment/shift-span';
import type { Unit } from '@windrow/ventilation/contract/board';
import type { NewShift, Shift } from '@windrow/ventilation/contract/shifts';
import { formatDay } from '@windrow/ventilation/format/clock';
import { type FormEvent, useState } from 'react';
import { colleaguesQuery, shiftsKey } from '../shift-queries.ts';
import { spanOf } from '../words.ts';
import { PeopleOn } from './people-on.tsx';
import {
  daysAround,
  type ShiftDraft,
  type ShiftErrors,
  shiftFrom,
  spanOfDraft,
  usualMinutes,
} from './shift-draft.ts';

const KINDS = [
  { value: 'day', label: `Day ${SHIFT_PRESETS.day.from}–${SHIFT_PRESETS.day.to}` },
  { value: 'night', label: `Night ${SHIFT_PRESETS.night.from}–${SHIFT_PRESETS.night.to}` },
  { value: 'other', label: 'Other times' },
] as const;

/** Makes a shift: when it is, and who is on. */
export function ShiftForm({
  unit,
  onMade,
  onCancel,
}: {
  unit: Unit;
  onMade: (shift: Shift) => void;
  onCancel: (() => void) | null;
}) {
  const now = useNow(60_000);
  const queryClient = useQueryClient();
  const colleagues = useQuery(colleaguesQuery(unit.unitId));
  const today = localMoment(now, unit.timeZone).slice(0, 10);
  const [draft, setDraft] = useState<ShiftDraft>(() => ({
    kind: 'day',
    name: '',
    day: today,
    from: '',
    to: '',
    people: {},
  }));
  const [errors, setErrors] = useState<ShiftErrors>({ minutes: {} });
  const span = spanOfDraft({ draft, now, timeZone: unit.timeZone });
  const change = (part: Partial<ShiftDraft>) => setDraft((before) => ({ ...before, ...part }));

  const make = useMutation({
    mutationFn: (body: NewShift) =>
      write<Shift>({ method: 'POST', path: `/api/units/${encodeURIComponent(unit.unitId)}/shifts`, body }),
    onSuccess: async (shift) => {
      await queryClient.invalidateQueries({ queryKey: shiftsKey(unit.unitId) });
      onMade(shift);
    },
  });

  function submit(event: FormEvent): void {
    event.preventDefault();
    const result = shiftFrom({ draft, span });
    setErrors('errors' in result ? result.errors : { minutes: {} });
    if ('shift' in result) make.mutate(result.shift);
  }

  return (
    <form
      noValidate
      onSubmit={submit}
      aria-labelledby="new-shift"
      className="flex max-w-2xl flex-col gap-5 rounded-xl bg-tile p-5"
    >
      <h2 id="new-shift" className="font-bold text-xl">
        New shift
      </h2>
      <ChoiceGroup
        label="When"
        options={KINDS}
        value={draft.kind}
        onChoose={(kind) => change({ kind })}
        error={errors.span}
      />
      {draft.kind === 'other' && <OtherTimes draft={draft} today={today} errors={errors} onChange={change} />}
      {span && <p className="text-ink-muted">{spanOf(span, unit.timeZone)}, by the clock of the unit</p>}
      <Reading asked={colleagues} what="the people of the unit">
        {({ items }) => (
          <PeopleOn
            colleagues={items}
            people={draft.people}
            minutes={usualMinutes(span)}
            error={errors.people}
            minuteErrors={errors.minutes}
            onChange={(people) => change({ people })}
          />
        )}
      </Reading>
      <p className="text-ink-muted text-sm">
        Minutes begin at the length of the shift less half an hour; change them for whoever comes later or
        leaves earlier.
      </p>
      {make.error && <NotMade error={make.error} />}
      <div className="flex flex-wrap gap-3">
        <Button type="submit" tone="main" disabled={make.isPending}>
          {make.isPending ? 'Making …' : 'Make this shift'}
        </Button>
        {onCancel && <Button onClick={onCancel}>Cancel</Button>}
      </div>
    </form>
  );
}

function OtherTimes({
  draft,
  today,
  errors,
  onChange,
}: {
  draft: ShiftDraft;
  today: string;
  errors: ShiftErrors;
  onChange: (part: Partial<ShiftDraft>) => void;
}) {
  // Plain text and a list: the browser's own fields follow the device, with a.m. and p.m. and months first.
  return (
    <div className="grid grid-cols-2 gap-4 sm:grid-cols-4">
      <TextField
        label="Name"
        value={draft.name}
        error={errors.name}
        maxLength={40}
        onChange={(event) => onChange({ name: event.target.value })}
      />
      <SelectField
        label="Day"
        options={daysAround(today).map((day) => ({ value: day, label: formatDay(day) }))}
        value={draft.day}
        onChange={(event) => onChange({ day: event.target.value })}
      />
      <TextField
        label="Start"
        inputMode="numeric"
        placeholder="07:00"
        value={draft.from}
        onChange={(event) => onChange({ from: event.target.value })}
      />
      <TextField
        label="End"
        inputMode="numeric"
        placeholder="19:00"
        value={draft.to}
        onChange={(event) => onChange({ to: event.target.value })}
      />
    </div>
  );
}

function NotMade({ error }: { error: Error }) {
  const isRefused = error instanceof ProblemError;
  return (
    <Notice
      tone="attention"
      isNews
      title={isRefused ? 'The shift was not made' : 'No answer from the server'}
    >
      <p>
        {isRefused
          ? error.message
          : 'What you entered is kept. Look at the list of shifts before you make it again.'}
      </p>
    </Notice>
  );
}
