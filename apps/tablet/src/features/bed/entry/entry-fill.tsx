import { Button } from '@windrow/ui/controls/button';
import { Notice } from '@windrow/ui/controls/notice';
import { useEffect, useState } from 'react';
import { EntryDock, padFor } from './entry-dock.tsx';
import { TIME_KEY } from './entry-draft.ts';
import { EntrySections } from './entry-sections.tsx';
import { faultsOf } from './faults.ts';
import type { Findings } from './findings.ts';
import { DerivedLines, FindingFlags } from './findings-panel.tsx';
import { obstaclesOf } from './judge-entry.ts';
import { MayStand } from './may-stand.tsx';
import { Obstacles } from './obstacles.tsx';
import { progressInWords } from './review.ts';
import { focusRow } from './row-id.ts';
import type { Entry } from './use-entry.ts';
import type { Refused } from './use-entry-flow.ts';

type EntryFillProps = {
  entry: Entry;
  findings: Findings;
  refused: Refused;
  /** How often the person wanted to record; from the first time on, what is missing is told. */
  tries: number;
  verb: string;
  /** Somebody recorded the same kind of fact since this form was begun. */
  hasNewer: boolean;
  now: number;
  timeZone: string;
  onReview: () => void;
};

/** The rows, the docked pad, and what the values mean; at the side of each other, or one above the other. */
export function EntryFill({
  entry,
  findings,
  refused,
  tries,
  verb,
  hasNewer,
  now,
  timeZone,
  onReview,
}: EntryFillProps) {
  const { judged, draft, time, dispatch } = entry;
  const faults = faultsOf({ judged, draft, time, refusals: refused.refusals, wasTried: tries > 0 });
  const obstacles = tries > 0 ? [...timeObstacle(entry), ...obstaclesOf(judged)] : [];

  useFirstRow(entry);

  const goNext = (key: string) => {
    const order = [
      ...(draft.time === null ? [] : [TIME_KEY]),
      ...judged.rows.filter(({ row }) => row.kind === 'number').map(({ row }) => row.key),
    ];
    const next = order[order.indexOf(key) + 1];
    if (next) focusRow(next);
    else {
      dispatch({ type: 'focus', key: null });
      document.getElementById('review')?.focus();
    }
  };

  return (
    <div className="flex flex-col gap-3 dock-side:grid dock-side:grid-cols-[minmax(0,1fr)_clamp(17.5rem,33vw,24rem)] dock-side:items-start">
      <div className="flex min-w-0 flex-col gap-3">
        {draft.mayStand && <MayStand takesFocus />}
        {hasNewer && (
          <Notice
            tone="note"
            isNews
            title={`Another ${entry.plan.title.toLowerCase()} was recorded while you were at this one`}
          >
            <p>The last values beside each field are from it.</p>
          </Notice>
        )}
        <Obstacles obstacles={obstacles} others={refused.others} tries={tries} />
        <EntrySections entry={entry} faults={faults} now={now} timeZone={timeZone} onNext={goNext} />
        <div className="rounded-xl bg-tile p-4 empty:hidden dock-side:hidden">
          <DerivedLines lines={findings.derived} />
        </div>
      </div>
      <Dock entry={entry} findings={findings} onNext={goNext} />
      <div className="@container sticky bottom-0 z-10 flex min-h-18 items-center gap-x-4 bg-ground py-1">
        <Button
          id="review"
          tone="main"
          className="min-h-14 px-4 text-lg sm:px-6 @xs:shrink-0"
          onClick={onReview}
        >
          Review and {verb.toLowerCase()}
        </Button>
        <p className="hidden min-w-0 text-ink-muted leading-tight @xs:block">{progressInWords(judged)}</p>
      </div>
    </div>
  );
}

/**
 * The pad and what the values mean. Below the form it is one plate over it, and only there while there is
 * something in it; at the side it has a place of its own.
 */
function Dock({
  entry,
  findings,
  onNext,
}: Pick<EntryFillProps, 'entry' | 'findings'> & { onNext: (key: string) => void }) {
  const hasPad = padFor(entry) !== null;
  const isEmpty = !hasPad && findings.flags.length === 0;
  return (
    <aside
      aria-label="Keypad and what the values mean"
      className={`sticky bottom-18 z-10 flex-col gap-2 rounded-xl border-2 border-line bg-tile p-1.5 dock-side:top-2 short:top-0 dock-side:in-data-[live=not-live]:top-14 dock-side:in-data-[live=withdrawn]:top-14 dock-side:bottom-auto dock-side:flex dock-side:max-h-dvh dock-side:gap-3 dock-side:overflow-y-auto dock-side:border-0 dock-side:bg-transparent dock-side:p-0 ${isEmpty ? 'hidden' : 'flex'}`}
    >
      {hasPad && (
        <div className="order-last dock-side:order-first dock-side:rounded-xl dock-side:bg-tile dock-side:p-3 short:p-1">
          <EntryDock entry={entry} onNext={onNext} />
        </div>
      )}
      {findings.derived.length > 0 && (
        <div className="hidden rounded-xl bg-tile p-3 dock-side:block">
          <DerivedLines lines={findings.derived} />
        </div>
      )}
      <FindingFlags flags={findings.flags} isDocked />
    </aside>
  );
}

/** The pad is open from the start, where everything before the first number is given already, and nothing is to be read first. */
function useFirstRow({ judged, draft }: Entry): void {
  const index = judged.rows.findIndex(({ row }) => row.kind === 'number');
  const isReady = judged.rows.slice(0, index).every(({ judgement }) => judgement.state === 'valid');
  const first = isReady ? judged.rows[index]?.row.key : undefined;
  const [opensAt] = useState(draft.mayStand ? undefined : first);
  useEffect(() => {
    if (opensAt !== undefined) focusRow(opensAt);
  }, [opensAt]);
}

function timeObstacle({ time, plan }: Entry) {
  return time.state === 'refused'
    ? [{ key: TIME_KEY, label: plan.timeLabel ?? '', message: time.message }]
    : [];
}
