import { Button } from '@windrow/ui/controls/button';
import { Notice } from '@windrow/ui/controls/notice';
import { useEffect, useRef } from 'react';
import type { Findings } from './findings.ts';
import { FindingFlags } from './findings-panel.tsx';
import { MayStand } from './may-stand.tsx';
import { leavesBoardInWords, type Review, type ReviewLine } from './review.ts';
import type { Recording } from './use-recording.ts';

type ReviewPanelProps = {
  title: string;
  /** Two identifiers, and the bed. */
  who: string;
  when: string | null;
  statement?: string | undefined;
  review: Review;
  flags: Findings['flags'];
  verb: string;
  recording: Pick<Recording, 'state' | 'problem'>;
  wasSent: boolean;
  /** A try was not answered: only stopping leads back to the values. */
  isOpen: boolean;
  mayStand: boolean;
  onRecord: () => void;
  onBack: () => void;
  onStop: () => void;
};

/** Exactly what will stand in the record, before it does. */
export function ReviewPanel({
  title,
  who,
  when,
  statement,
  review,
  flags,
  verb,
  recording,
  wasSent,
  isOpen,
  mayStand,
  onRecord,
  onBack,
  onStop,
}: ReviewPanelProps) {
  const heading = useRef<HTMLHeadingElement>(null);
  useEffect(() => heading.current?.focus(), []);
  const isSending = recording.state === 'sending' || recording.state === 'sending-again';

  return (
    <section aria-labelledby="review-title" className="mx-auto flex w-full max-w-3xl flex-col gap-4">
      <div className="flex flex-col gap-4 rounded-xl bg-tile p-5">
        <h2 id="review-title" ref={heading} tabIndex={-1} className="font-bold text-2xl outline-none">
          {title}
        </h2>
        <p className="text-lg">{who}</p>
        {when !== null && <p className="font-bold text-lg">{when}</p>}
        {statement && <p className="text-lg">{statement}</p>}
        <ReviewLines title="Changed" lines={review.changed} isStrong />
        <ReviewLines title="New" lines={review.added} isStrong />
        <ReviewLines
          title={verb === 'Record' ? 'As before, confirmed' : 'Unchanged'}
          lines={review.confirmed}
        />
        {review.leftOut.length > 0 && (
          <p className="text-ink-muted">
            <span className="font-bold">Left out, nothing is recorded for: </span>
            {review.leftOut.join(', ')}
          </p>
        )}
        {review.leavesBoard.length > 0 && (
          <p className="font-bold">{leavesBoardInWords(review.leavesBoard)}</p>
        )}
        <FindingFlags flags={flags} />
      </div>
      <div className="sticky bottom-0 flex flex-col gap-2 bg-ground py-3">
        {wasSent && recording.state === 'idle' && (
          <Notice tone="attention" title="This was sent before, and no answer came">
            <p>Send it again as it is: whatever became of it, it is recorded once.</p>
          </Notice>
        )}
        {mayStand && recording.state === 'idle' && <MayStand />}
        <RecordingWords recording={recording} isOpen={isOpen} />
        <div className="flex flex-wrap gap-3">
          <Button tone="main" className="min-h-16 px-8 text-lg" disabled={isSending} onClick={onRecord}>
            {isSending ? 'Sending …' : recording.state === 'no-network' ? 'Send again now' : verb}
          </Button>
          <Button className="min-h-16" disabled={isSending} onClick={isOpen ? onStop : onBack}>
            {isOpen ? 'Stop sending and change' : 'Back to the values'}
          </Button>
        </div>
      </div>
    </section>
  );
}

function ReviewLines({
  title,
  lines,
  isStrong = false,
}: {
  title: string;
  lines: readonly ReviewLine[];
  isStrong?: boolean;
}) {
  if (lines.length === 0) return null;
  return (
    <div>
      <h3 className="font-bold text-ink-muted">{title}</h3>
      <dl className="flex flex-col">
        {lines.map(({ key, label, before, now, isUnusual }) => (
          <div
            key={key}
            className="flex flex-wrap items-baseline justify-between gap-x-4 border-line border-b py-1.5"
          >
            <dt>{label}</dt>
            <dd className={`wrap-break-word text-right text-lg tabular-nums ${isStrong ? 'font-bold' : ''}`}>
              {before !== null && (
                <>
                  <span className="font-normal text-ink-muted">{before}</span>
                  <span aria-hidden="true"> → </span>
                  <span className="sr-only"> becomes </span>
                </>
              )}
              {now}
              {isUnusual && <span className="font-normal text-ink-muted text-sm"> · unusual, kept</span>}
            </dd>
          </div>
        ))}
      </dl>
    </div>
  );
}

function RecordingWords({
  recording: { state, problem },
  isOpen,
}: Pick<ReviewPanelProps, 'recording' | 'isOpen'>) {
  return (
    <div role="status">
      {state === 'sending-again' && <p>No answer yet. It is being sent again; it will be recorded once.</p>}
      {state === 'no-network' && (
        <Notice tone="attention" title="Not recorded yet: the server does not answer">
          <p>
            Everything you typed is kept here, and is sent again every few seconds. Stay on this page, or send
            it now. To change a value, stop the sending first.
          </p>
        </Notice>
      )}
      {state === 'refused' && problem?.problem.status === 401 && (
        <Notice
          tone="attention"
          title={isOpen ? 'No answer yet: your session had ended' : 'Not recorded: your session had ended'}
        >
          <p>What you typed is kept. You are signed in again, so record it now.</p>
        </Notice>
      )}
      {state === 'refused' && problem && problem.problem.status !== 401 && (
        <Notice tone="attention" title={problem.problem.title}>
          <p>
            {problem.problem.detail} {isOpen ? 'A try may have been recorded' : 'Nothing was recorded'}; what
            you typed is kept.
          </p>
        </Notice>
      )}
    </div>
  );
}
