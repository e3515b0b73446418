import { Button } from '@windrow/ui/controls/button';
import { Notice } from '@windrow/ui/controls/notice';

/** Somebody else corrected the same stay: who and when by the server's words, and what. Nothing typed is lost. */
export function ChangedMeanwhile({
  detail,
  changes,
  onTake,
}: {
  detail: string | null;
  changes: readonly { label: string; before: string; after: string }[];
  onTake: () => void;
}) {
  return (
    <Notice tone="attention" isNews title="The details were changed while you were at them">
      {detail !== null && <p>{detail}</p>}
      <ul>
        {changes.map(({ label, before, after }) => (
          <li key={label}>
            {label}: <span className="text-ink-muted">{before}</span> →{' '}
            <span className="font-bold">{after}</span>
          </li>
        ))}
      </ul>
      <p>What you typed is kept; all else is set to what stands now.</p>
      <div>
        <Button onClick={onTake}>I have seen it, go on</Button>
      </div>
    </Notice>
  );
}
