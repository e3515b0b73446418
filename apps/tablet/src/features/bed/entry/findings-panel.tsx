import { FlagChip } from '@windrow/ui/controls/flag-chip';
import type { DerivedLine } from '../derived-in-words.ts';
import type { Findings } from './findings.ts';

/** What the typed values mean, while they are typed. What cannot be had yet shows a dash and no guess. */
export function DerivedLines({ lines }: { lines: readonly DerivedLine[] }) {
  if (lines.length === 0) return null;
  return (
    <dl className="grid gap-x-8 gap-y-0.5 sm:grid-cols-2 dock-side:grid-cols-1">
      {lines.map(({ key, label, value, unit }) => (
        <div key={key} className="flex items-baseline justify-between gap-2">
          <dt className="min-w-0 text-ink-muted text-sm leading-tight">{label}</dt>
          <dd className="whitespace-nowrap">
            <span className="font-bold tabular-nums">{value ?? '–'}</span>
            {value !== null && unit && <span className="text-ink-muted text-sm"> {unit}</span>}
          </dd>
        </div>
      ))}
    </dl>
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
