import { NetworkError } from '@windrow/client/http';
import { Notice } from '@windrow/ui/controls/notice';
import type { Assignment } from '@windrow/ventilation/contract/shifts';
import { useState } from 'react';
import type { Desk } from '../use-desk.ts';
import { standingOf } from '../words.ts';
import { ConflictPanel } from './conflict-panel.tsx';
import { DeskBar } from './desk-bar.tsx';
import { PublishQuestion } from './publish-question.tsx';

/** Where the draft stands, what was refused or changed by others, and the way to every screen. */
export function DeskHead({
  desk,
  assignment,
  timeZone,
}: {
  desk: Desk;
  assignment: Assignment;
  timeZone: string;
}) {
  const { draft, publishing, now } = desk;
  const [asking, setAsking] = useState(false);
  const [comparing, setComparing] = useState(false);

  function publish(): void {
    if (draft.newer) setComparing(true);
    else if (desk.doubts.length > 0) setAsking(true);
    else publishing.send(true);
  }

  /** From the newest there is: it may have changed again while the two were compared. */
  async function resolve(how: 'takeTheirs' | 'putOnTop'): Promise<void> {
    const theirs = await publishing.readNewest().catch(() => draft.newer);
    if (!theirs) return;
    draft[how](theirs);
    publishing.forget();
    setComparing(false);
  }

  return (
    <>
      <DeskBar
        draft={draft}
        changedCount={desk.changedCount}
        standing={standingOf({ assignment, now, timeZone })}
        isPublished={desk.isPublished}
        publishing={publishing}
        onPublish={publish}
      />
      {publishing.error && <NotSent error={publishing.error} />}
      {draft.newer && (
        <ConflictPanel
          theirs={draft.newer}
          mine={draft.places}
          now={now}
          timeZone={timeZone}
          labelOf={desk.labelOf}
          isOpen={comparing || publishing.wasStale}
          onOpen={() => setComparing(true)}
          onTakeTheirs={() => void resolve('takeTheirs')}
          onPutMineOnTop={() => void resolve('putOnTop')}
        />
      )}
      {asking && (
        <PublishQuestion
          doubts={desk.doubts}
          onClose={() => setAsking(false)}
          onPublish={() => {
            setAsking(false);
            publishing.send(true);
          }}
        />
      )}
    </>
  );
}

function NotSent({ error }: { error: Error }) {
  const isLost = error instanceof NetworkError;
  return (
    <Notice tone="attention" isNews title={isLost ? 'No answer from the server' : 'Not published'}>
      <p>
        {isLost
          ? 'Whether it arrived is not known. Your moves are kept; press again, it is never published twice.'
          : error.message}
      </p>
    </Notice>
  );
}
