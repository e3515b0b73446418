import { Button } from '@windrow/ui/controls/button';
import { FieldError } from '@windrow/ui/controls/field-frame';
import { formatDay, formatTime } from '@windrow/ventilation/format/clock';
import { dayIn, dayMoved } from '@windrow/ventilation/format/zoned-time';
import { ChevronLeft, ChevronRight } from 'lucide-react';
import type { KeyboardEvent } from 'react';
import { TIME_KEY } from './entry-draft.ts';
import { isLate, pressTime, shownDigits, timeFrom } from './entry-time.ts';
import { timeKeyOf } from './press-key.ts';
import { focusRow, rowId } from './row-id.ts';
import type { Entry } from './use-entry.ts';

type TimeRowProps = {
  entry: Entry;
  fault: string | null;
  now: number;
  timeZone: string;
  onNext: (key: string) => void;
};

/** When it was so: now, unless the person sets the clock back. */
export function TimeRow({ entry, fault, now, timeZone, onNext }: TimeRowProps) {
  const { plan, draft, dispatch } = entry;
  if (plan.timeLabel === null) return null;
  if (draft.time === null) {
    return (
      <div className="flex flex-wrap items-center gap-3 py-1">
        <p className="text-lg">
          {plan.timeLabel} <span className="font-bold tabular-nums">now, {formatTime(now, timeZone)}</span>
        </p>
        <Button
          tone="quiet"
          onClick={() => {
            dispatch({ type: 'time', time: timeFrom(now, timeZone) });
            // The field exists only after this press has been drawn.
            setTimeout(() => focusRow(TIME_KEY));
          }}
        >
          Set the time
        </Button>
      </div>
    );
  }
  return (
    <SetTime entry={entry} time={draft.time} fault={fault} now={now} timeZone={timeZone} onNext={onNext} />
  );
}

function SetTime({
  entry,
  time,
  fault,
  now,
  timeZone,
  onNext,
}: TimeRowProps & { time: { day: string; digits: string } }) {
  const { plan, draft, dispatch } = entry;
  const id = rowId(TIME_KEY);
  const today = dayIn(now, timeZone);
  const move = (by: number) => dispatch({ type: 'time', time: { ...time, day: dayMoved(time.day, by) } });
  const isActive = draft.active === TIME_KEY;

  const handleKey = (event: KeyboardEvent) => {
    if (event.key === 'Enter') onNext(TIME_KEY);
    const key = timeKeyOf(event.key);
    if (key === null || event.ctrlKey || event.metaKey) return;
    event.preventDefault();
    dispatch({ type: 'press-time', key });
  };

  return (
    <div className="flex flex-col gap-1 py-1">
      <div className="flex flex-wrap items-center gap-2">
        <label htmlFor={id} className="text-lg">
          {plan.timeLabel}
        </label>
        <Button tone="quiet" aria-label="The day before" onClick={() => move(-1)}>
          <ChevronLeft aria-hidden="true" />
        </Button>
        <p className="min-w-24 text-center font-bold">{time.day === today ? 'today' : formatDay(time.day)}</p>
        <Button tone="quiet" aria-label="The day after" disabled={time.day >= today} onClick={() => move(1)}>
          <ChevronRight aria-hidden="true" />
        </Button>
        <input
          id={id}
          type="text"
          inputMode="none"
          autoComplete="off"
          placeholder="hh:mm"
          aria-invalid={fault !== null}
          aria-describedby={`${id}-fault`}
          className={`h-12 w-28 rounded-lg border-2 px-3 text-center font-bold text-2xl tabular-nums ${isActive ? 'border-focus' : 'border-line-strong'} bg-tile text-ink`}
          value={shownDigits(time.digits)}
          onChange={(event) =>
            dispatch({
              type: 'time',
              time: { ...time, digits: [...event.target.value].reduce(typedInto, '') },
            })
          }
          onFocus={() => dispatch({ type: 'focus', key: TIME_KEY })}
          onBlur={() => dispatch({ type: 'leave', key: TIME_KEY })}
          onKeyDown={handleKey}
        />
        <Button tone="quiet" onClick={() => dispatch({ type: 'time', time: null })}>
          Now
        </Button>
      </div>
      <div id={`${id}-fault`} aria-live="polite">
        {fault !== null && <FieldError>{fault}</FieldError>}
        {entry.time.state === 'set' && isLate({ observedAt: entry.time.at, recordedAt: now }) && (
          <p className="text-ink-muted">A late entry: the record will show both times.</p>
        )}
      </div>
    </div>
  );
}

function typedInto(digits: string, character: string): string {
  const key = timeKeyOf(character);
  return key === null ? digits : pressTime(digits, key);
}
