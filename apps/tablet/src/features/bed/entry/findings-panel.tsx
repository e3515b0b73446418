import { FlagChip } from '@windrow/ui/controls/flag-chip';
import type { DerivedLine } from '../derived-in-words.ts';
import { WorkedOutLink } from '../worked-out-link.tsx';
import type { Findings } from './findings.ts';

/** What the typed values mean, while they are typed. What cannot be had yet shows a dash and no guess. */
export function DerivedLines({ lines }: { lines: readonly DerivedLine[] }) {
  if (lines.length === 0) return null;
  return (
    <dl className="grid grid-cols-2 gap-x-4 gap-y-0.5 sm:grid-cols-3 dock-side:grid-cols-2">
      {lines.map((line) => (
        <div key={line.key} className="relative flex min-h-12 flex-col-reverse justify-end">
          <dt className="text-ink-muted text-sm leading-tight">{line.label}</dt>
          <dd className="leading-tight">
            <DerivedValue line={line} />
          </dd>
        </div>
      ))}
    </dl>
  );
}

function DerivedValue({ line: { label, value, unit, remark, from } }: { line: DerivedLine }) {
  if (value === null) {
    return remark ? (
      <span className="text-ink-muted text-sm">{remark}</span>
    ) : (
      <span className="font-bold">–</span>
    );
  }
  return (
    <>
      <span className="font-bold tabular-nums">
        {from ? (
          <WorkedOutLink from={from} name={`${value} ${unit}: how ${label} is worked out`}>
            {value}
          </WorkedOutLink>
        ) : (
          value
        )}
      </span>
      {unit && <span className="text-ink-muted text-sm"> {unit}</span>}
    </>
  );
}

/** In the dock below the form they take one line, which scrolls: the pad must not grow over the rows. */
export function FindingFlags({ flags, isDocked = false }: Pick<Findings, 'flags'> & { isDocked?: boolean }) {
  const flow = isDocked ? 'overflow-x-auto dock-side:flex-wrap' : 'flex-wrap';
  return (
    <ul aria-label="Flags of these values" aria-live="polite" className={`flex gap-2 empty:hidden ${flow}`}>
      {flags.map(({ id, level, short }) => (
        <li key={id} className="shrink-0">
          <FlagChip level={level}>{short}</FlagChip>
        </li>
      ))}
    </ul>
  );
}
