import { ChoiceGroup } from '@windrow/ui/controls/choice-group';
import { FieldError } from '@windrow/ui/controls/field-frame';
import { TextField } from '@windrow/ui/controls/text-field';
import { formatTime } from '@windrow/ventilation/format/clock';
import { instantIn } from '@windrow/ventilation/format/zoned-time';
import { clockFromTyping, dayFromTyping } from './form-values.ts';

/** Now, or a day and a clock of the unit: a unit that begins with Windrow has patients already. */
export type AdmittedAt = { is: 'now' } | { is: 'earlier'; day: string; time: string };

const AHEAD_MS = 120_000;

/** The instant, or in words why there is none. */
export function judgeAdmitted({
  admitted,
  now,
  timeZone,
}: {
  admitted: AdmittedAt;
  now: number;
  timeZone: string;
}): { at: number } | { fault: string } {
  if (admitted.is === 'now') return { at: now };
  const isWhole = /^\d{4}-\d{2}-\d{2}$/.test(admitted.day) && /^([01]\d|2[0-3]):[0-5]\d$/.test(admitted.time);
  const isReal = isWhole && !Number.isNaN(Date.parse(admitted.day));
  const at = isReal
    ? instantIn({ day: admitted.day, time: admitted.time, timeZone, notAfter: now + AHEAD_MS })
    : null;
  if (at === null) return { fault: 'Admitted needs a day such as 2026-03-05 and a time such as 09:40' };
  return at > now + AHEAD_MS
    ? {
        fault: `${admitted.time} on that day is ahead of the clock, which shows ${formatTime(now, timeZone)}`,
      }
    : { at };
}

export function AdmittedAtFields({
  admitted,
  today,
  fault,
  onChange,
}: {
  admitted: AdmittedAt;
  today: string;
  fault: string | null;
  onChange: (admitted: AdmittedAt) => void;
}) {
  return (
    <div className="flex flex-col gap-3 rounded-xl bg-tile p-5">
      <ChoiceGroup
        label="Admitted"
        options={[
          { value: 'now', label: 'Now' },
          { value: 'earlier', label: 'Earlier' },
        ]}
        value={admitted.is}
        onChoose={(is) => onChange(is === 'now' ? { is } : { is, day: today, time: '' })}
      />
      {admitted.is === 'earlier' && (
        <div className="grid gap-4 sm:grid-cols-2">
          <TextField
            label="Day"
            inputMode="numeric"
            placeholder="yyyy-mm-dd"
            value={admitted.day}
            onChange={(event) => onChange({ ...admitted, day: dayFromTyping(event.target.value) })}
          />
          <TextField
            label="Time, 24-hour"
            inputMode="numeric"
            placeholder="hh:mm"
            value={admitted.time}
            onChange={(event) => onChange({ ...admitted, time: clockFromTyping(event.target.value) })}
          />
        </div>
      )}
      {fault !== null && <FieldError>{fault}</FieldError>}
    </div>
  );
}
