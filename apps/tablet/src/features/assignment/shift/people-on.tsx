import { CheckField } from '@windrow/ui/controls/check-field';
import { FieldError } from '@windrow/ui/controls/field-frame';
import { FIELD_CLASS } from '@windrow/ui/controls/text-field';
import type { Colleague } from '@windrow/ventilation/contract/shifts';

/** Who is on, and how many minutes each has. */
export function PeopleOn({
  colleagues,
  people,
  minutes,
  error,
  minuteErrors,
  onChange,
}: {
  colleagues: readonly Colleague[];
  people: Readonly<Record<string, string>>;
  /** What a person who is put on begins with. */
  minutes: number;
  error: string | undefined;
  minuteErrors: Readonly<Record<string, string>>;
  onChange: (people: Readonly<Record<string, string>>) => void;
}) {
  function put(personId: string, typed: string | null): void {
    const { [personId]: _, ...others } = people;
    onChange(typed === null ? others : { ...others, [personId]: typed });
  }
  return (
    <fieldset className="flex flex-col gap-2">
      <legend className="mb-1 font-bold">Who is on</legend>
      {colleagues.length === 0 && (
        <p>Nobody has a therapist’s role in this unit yet. Whoever sets up Windrow can give it.</p>
      )}
      <ul className="flex flex-col gap-1">
        {colleagues.map(({ personId, displayName }) => {
          const typed = people[personId];
          const isOn = typed !== undefined;
          const wrong = minuteErrors[personId];
          return (
            <li
              key={personId}
              className="flex flex-wrap items-center justify-between gap-x-4 border-line border-b py-1"
            >
              <CheckField
                label={displayName}
                checked={isOn}
                onChange={() => put(personId, isOn ? null : String(minutes))}
              />
              {isOn && (
                <label className="flex items-center gap-2 text-ink-muted">
                  <span className="sr-only">Minutes of {displayName}</span>
                  <input
                    className={`${FIELD_CLASS} max-w-24 text-right`}
                    inputMode="numeric"
                    autoComplete="off"
                    value={typed}
                    aria-invalid={wrong ? true : undefined}
                    aria-describedby={wrong ? `${personId}-wrong` : undefined}
                    onChange={(event) => put(personId, event.target.value)}
                  />
                  min
                </label>
              )}
              {wrong && (
                <div className="w-full">
                  <FieldError id={`${personId}-wrong`}>{wrong}</FieldError>
                </div>
              )}
            </li>
          );
        })}
      </ul>
      {error && <FieldError>{error}</FieldError>}
    </fieldset>
  );
}
