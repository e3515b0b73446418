import { serverNow } from '@windrow/client/clock/server-clock';
import { Button } from '@windrow/ui/controls/button';
import { WriteFault } from '@windrow/ui/controls/faults';
import { Notice } from '@windrow/ui/controls/notice';
import { TextField } from '@windrow/ui/controls/text-field';
import type { Flag } from '@windrow/ventilation/contract/board';
import { type FormEvent, useEffect, useRef, useState } from 'react';
import { useAcknowledge } from './use-acknowledge.ts';

type AcknowledgeFlagProps = {
  flag: Flag;
  stayId: string;
  /** The flag is quiet now, and this form gone with it: the focus needs a place. */
  onDone: () => void;
};

/** What was looked at, and when: of values that come in while the note is written nobody has looked at anything. */
type Looked = { fingerprint: string; at: string };

/** "Acknowledge", and in its place the note that belongs to it. */
export function AcknowledgeFlag({ flag, stayId, onDone }: AcknowledgeFlagProps) {
  const [looked, setLooked] = useState<Looked | null>(null);
  const look = () => setLooked({ fingerprint: flag.fingerprint, at: new Date(serverNow()).toISOString() });
  if (looked === null) {
    return (
      <Button tone="quiet" aria-label={`Acknowledge: ${flag.short}`} onClick={look}>
        Acknowledge
      </Button>
    );
  }
  return (
    <NoteForm
      flag={flag}
      stayId={stayId}
      looked={looked}
      onLookAgain={look}
      onCancel={() => setLooked(null)}
      onDone={onDone}
    />
  );
}

const SHORTEST_NOTE = 3;

function NoteForm({
  flag,
  stayId,
  looked,
  onLookAgain,
  onCancel,
  onDone,
}: AcknowledgeFlagProps & { looked: Looked; onLookAgain: () => void; onCancel: () => void }) {
  const [note, setNote] = useState('');
  const [wasTried, setTried] = useState(false);
  const field = useRef<HTMLInputElement>(null);
  // It was opened by a press, and the note is what is asked for.
  useEffect(() => field.current?.focus(), []);
  const acknowledge = useAcknowledge({ stayId, short: flag.short, onDone });
  const isTooShort = note.trim().length < SHORTEST_NOTE;
  const hasChanged = flag.fingerprint !== looked.fingerprint;

  const handleSubmit = (event: FormEvent) => {
    event.preventDefault();
    setTried(true);
    if (isTooShort || hasChanged) return;
    acknowledge.mutate({
      observedAt: looked.at,
      flagId: flag.id,
      fingerprint: looked.fingerprint,
      note: note.trim(),
    });
  };
  const lookAgain = () => {
    acknowledge.reset();
    onLookAgain();
  };

  return (
    <form noValidate onSubmit={handleSubmit} className="flex w-full flex-col gap-2">
      <TextField
        ref={field}
        label="Note: what was found or done"
        hint="The flag leaves the wall and comes back when its values change."
        value={note}
        maxLength={500}
        aria-required
        error={wasTried && isTooShort ? 'A note of at least 3 letters is needed.' : undefined}
        onChange={(event) => setNote(event.target.value)}
      />
      {hasChanged ? (
        <Notice tone="note" isNews title="Its values changed while you were writing">
          <p>Read the sentence above again; your note is kept.</p>
        </Notice>
      ) : (
        <WriteFault error={acknowledge.error} />
      )}
      <div className="flex flex-wrap gap-2">
        {hasChanged ? (
          <Button tone="main" onClick={lookAgain}>
            I have read it
          </Button>
        ) : (
          <Button tone="main" type="submit" disabled={acknowledge.isPending}>
            {acknowledge.isPending ? 'Sending …' : 'Save note'}
          </Button>
        )}
        <Button tone="quiet" onClick={onCancel}>
          Cancel
        </Button>
      </div>
    </form>
  );
}
