import { CheckField } from '@windrow/ui/controls/check-field';
import type { Round } from './round-order.ts';

/** How far the round has come, and the switch between one's own beds and all. */
export function RoundHeading({
  round,
  person,
  showsAll,
  onShowAll,
}: {
  round: Round;
  person: string;
  showsAll: boolean;
  /** Null: there are no own beds, so all are shown anyway. */
  onShowAll: ((all: boolean) => void) | null;
}) {
  const words = onShowAll
    ? `${round.done} of ${round.mine.length} ${round.mine.length === 1 ? 'bed' : 'beds'} done`
    : 'No bed is yours in the shift that runs now';
  return (
    <div className="flex flex-wrap items-center gap-x-5 gap-y-1">
      <h1 className="font-bold text-2xl">Round</h1>
      <p className="text-ink-muted">
        {words} · {person}
      </p>
      {onShowAll && (
        <div className="ml-auto">
          <CheckField
            label="All beds"
            checked={showsAll}
            onChange={(event) => onShowAll(event.target.checked)}
          />
        </div>
      )}
    </div>
  );
}
