import { FlagChip } from '@windrow/ui/controls/flag-chip';
import type { Flag } from '@windrow/ventilation/contract/board';

/** Every flag in a sentence; behind "Why" the numbers that it rests on and where the rule is from. */
export function FlagList({ flags }: { flags: readonly Flag[] }) {
  return (
    <section aria-labelledby="flags-title" className="rounded-xl bg-tile px-4 py-3">
      <h2 id="flags-title" className="font-bold text-lg">
        Flags
      </h2>
      {flags.length === 0 && (
        <p className="text-ink-muted">
          None from what is current. That is no clearance: look at the patient.
        </p>
      )}
      <ul className="flex flex-col divide-y-2 divide-line">
        {flags.map((flag) => (
          <li key={flag.id} className="flex flex-col items-start gap-1 py-2">
            <FlagChip level={flag.level}>{flag.short}</FlagChip>
            <p>{flag.sentence}</p>
            <Why flag={flag} />
          </li>
        ))}
      </ul>
    </section>
  );
}

function Why({ flag }: { flag: Flag }) {
  return (
    <details className="w-full">
      <summary className="flex min-h-12 w-fit min-w-12 cursor-pointer items-center font-bold underline">
        Why<span className="sr-only">: {flag.short}</span>
      </summary>
      <dl className="grid grid-cols-[auto_auto] justify-start gap-x-4">
        {flag.inputs.map(({ label, value, unit, decimals }) => (
          <div key={label} className="contents">
            <dt className="text-ink-muted">{label}</dt>
            <dd className="tabular-nums">
              {value.toFixed(decimals)} {unit}
            </dd>
          </div>
        ))}
      </dl>
      <p className="mt-1 text-ink-muted text-sm">Source: {flag.source}</p>
    </details>
  );
}
