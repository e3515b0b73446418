import { AgeMark } from '@windrow/ui/controls/age-mark';
import type { AidInput, AidRule } from '@windrow/ventilation/aids/aid';
import { formatMoment } from '@windrow/ventilation/format/clock';
import type { Freshness } from '@windrow/ventilation/freshness/freshness';
import { noteAddress, type WorkedOut } from '@windrow/ventilation/notes/worked-out';
import { type ReactNode, useId } from 'react';
import { Link } from 'react-router-dom';

export type Clock = {
  now: number;
  timeZone: string;
  /** The rung of the age ladder on which the fact of this time stands. */
  stateAt: (observedAt: string) => Freshness;
};

/** A method note that a panel rests on, opened on the very numbers. */
export type NoteLink = { label: string; from: WorkedOut };

/** One aid: its result or what is missing, and under it how it is reckoned, from what, how old, and by whom published. */
export function AidPanel({
  title,
  rule,
  inputs,
  missing,
  notes = [],
  clock,
  children,
}: {
  title: string;
  rule: AidRule;
  inputs: readonly AidInput[];
  missing: readonly string[];
  notes?: readonly NoteLink[];
  clock: Clock;
  children: ReactNode;
}) {
  const id = useId();
  return (
    <section aria-labelledby={id} className="flex min-w-0 flex-col gap-2 rounded-xl bg-tile px-4 py-3">
      <h2 id={id} className="font-bold text-lg">
        {title}
      </h2>
      {children}
      <Missing missing={missing} />
      <details>
        <summary className="flex min-h-12 w-fit cursor-pointer items-center font-bold underline">
          How and from what<span className="sr-only">: {title}</span>
        </summary>
        <p>{rule.rule}</p>
        <Inputs inputs={inputs} clock={clock} />
        <p className="mt-1 text-ink-muted text-sm">Source: {rule.source}</p>
        {notes.length > 0 && (
          <ul aria-label={`Method notes: ${title}`} className="flex flex-wrap gap-x-4">
            {notes.map(({ label, from }) => (
              <li key={from.name + label}>
                <Link
                  to={noteAddress(from)}
                  className="inline-flex min-h-12 items-center font-bold text-ink underline"
                >
                  Method note: {label}
                </Link>
              </li>
            ))}
          </ul>
        )}
      </details>
    </section>
  );
}

function Missing({ missing }: { missing: readonly string[] }) {
  if (missing.length === 0) return null;
  return (
    <div className="rounded-lg border-2 border-line border-dashed px-3 py-2">
      <p className="font-bold">Missing</p>
      <ul className="list-disc pl-5">
        {missing.map((what) => (
          <li key={what}>{what}</li>
        ))}
      </ul>
    </div>
  );
}

function Inputs({ inputs, clock }: { inputs: readonly AidInput[]; clock: Clock }) {
  if (inputs.length === 0) return <p className="mt-1 text-ink-muted">Nothing current to reckon with.</p>;
  return (
    <ul className="mt-1 flex flex-col gap-1">
      {inputs.map((input) => (
        <li key={`${input.label} ${input.observedAt}`} className="flex flex-wrap items-baseline gap-x-3">
          <span className="text-ink-muted">{input.label}</span>
          <span className="font-bold tabular-nums">{input.words}</span>
          <InputAge input={input} clock={clock} />
        </li>
      ))}
    </ul>
  );
}

function InputAge({
  input: { observedAt, changedSinceAt },
  clock: { now, timeZone, stateAt },
}: {
  input: AidInput;
  clock: Clock;
}) {
  if (observedAt === null) return null;
  const ageMinutes = Math.max(0, (now - Date.parse(observedAt)) / 60_000);
  return (
    <span className="flex flex-wrap items-baseline gap-x-2 text-ink-muted text-sm">
      {formatMoment(observedAt, now, timeZone)}
      <AgeMark state={stateAt(observedAt)} ageMinutes={ageMinutes} />
      {changedSinceAt && (
        <span className="font-bold text-ink">
          before change {formatMoment(changedSinceAt, now, timeZone)}
        </span>
      )}
    </span>
  );
}
