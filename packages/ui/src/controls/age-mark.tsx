import { ageInWords, formatAge } from '@windrow/ventilation/format/age';
import type { Freshness } from '@windrow/ventilation/freshness/freshness';

/** The shape of each rung: quiet ink, dashes, a solid block. */
const SHAPES: Record<Freshness, string> = {
  current: 'text-ink-muted',
  due: 'border-ink border-b-2 border-dashed text-ink',
  overdue: 'bg-ink px-1.5 text-ground rounded-sm',
  withdrawn: 'bg-ink px-1.5 text-ground rounded-sm',
  never: 'text-ink-muted',
};

/** How old a group of facts is, and on which rung of the ladder: by shape for the eye, in words for the ear. */
export function AgeMark({ state, ageMinutes }: { state: Freshness; ageMinutes: number | null }) {
  if (ageMinutes === null) return <span className="text-ink-muted">–</span>;
  return (
    <span
      data-state={state}
      className={`inline-block whitespace-nowrap font-bold leading-snug ${SHAPES[state]}`}
    >
      <span aria-hidden="true">{formatAge(ageMinutes)}</span>
      <span className="sr-only">
        {ageInWords(ageMinutes)} old{state === 'current' ? '' : `, ${state}`}
      </span>
    </span>
  );
}
