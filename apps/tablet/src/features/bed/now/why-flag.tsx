import type { Flag } from '@windrow/ventilation/contract/board';
import { flagWorkedOut } from '@windrow/ventilation/notes/flag-worked-out';
import { noteAddress } from '@windrow/ventilation/notes/worked-out';
import { Link } from 'react-router-dom';
import { useBed } from '../bed-context.ts';

/** The numbers that a flag rests on and where its rule is from. */
export function WhyFlag({ flag }: { flag: Flag }) {
  const { stay } = useBed();
  return (
    <details className="min-w-0 grow basis-32 open:basis-full">
      <summary className="flex min-h-12 w-fit cursor-pointer items-center font-bold underline">
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
      <ul className="flex flex-wrap gap-x-4">
        {flagWorkedOut({ flag, stay }).map(({ label, from }) => (
          <li key={label}>
            <Link to={noteAddress(from)} className="flex min-h-12 items-center font-bold text-ink underline">
              How {label} is worked out
            </Link>
          </li>
        ))}
      </ul>
      <p className="mt-1 text-ink-muted text-sm">Source: {flag.source}</p>
    </details>
  );
}
