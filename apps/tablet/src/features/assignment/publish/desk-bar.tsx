import { Button } from '@windrow/ui/controls/button';
import { Redo2, Undo2 } from 'lucide-react';
import type { AssignmentDraft } from '../draft/use-assignment-draft.ts';
import { beds } from '../words.ts';
import type { Publishing } from './use-publish.ts';

/** Where the draft stands, and what can be done with it. */
export function DeskBar({
  draft,
  changedCount,
  standing,
  isPublished,
  publishing,
  onPublish,
}: {
  draft: AssignmentDraft;
  changedCount: number;
  /** How it stands on the server, in words. */
  standing: string;
  isPublished: boolean;
  publishing: Publishing;
  onPublish: () => void;
}) {
  const { isSending, wasPublishing } = publishing;
  return (
    <div className="flex flex-wrap items-center gap-3">
      <p role="status" className="min-w-0 flex-1 basis-full sm:basis-72">
        <span className="font-bold">
          {draft.unsaved ? `${beds(changedCount)} changed, not published` : standing}
        </span>
        {draft.unsaved && <span className="block text-ink-muted text-sm">before: {standing}</span>}
      </p>
      <Button tone="quiet" disabled={!draft.canUndo} onClick={draft.undo}>
        <Undo2 aria-hidden="true" size={20} /> <span className="sr-only sm:not-sr-only">Undo</span>
      </Button>
      <Button tone="quiet" disabled={!draft.canRedo} onClick={draft.redo}>
        <Redo2 aria-hidden="true" size={20} /> <span className="sr-only sm:not-sr-only">Redo</span>
      </Button>
      <Button disabled={!draft.unsaved || isSending} onClick={() => publishing.send(false)}>
        {isSending && !wasPublishing ? 'Saving …' : 'Save draft'}
      </Button>
      <Button tone="main" disabled={(isPublished && !draft.unsaved) || isSending} onClick={onPublish}>
        {isSending && wasPublishing
          ? 'Publishing …'
          : isPublished && !draft.unsaved
            ? 'Published'
            : 'Publish'}
      </Button>
    </div>
  );
}
