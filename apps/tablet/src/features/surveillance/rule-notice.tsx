import { Notice } from '@windrow/ui/controls/notice';
import type { SurveillanceEdition } from '@windrow/ventilation/contract/surveillance';

/** What this is and is not, which definition it follows, and which parts of that are still to be checked. */
export function RuleNotice({ edition }: { edition: SurveillanceEdition }) {
  return (
    <Notice tone="note" title="A screening aid, not a diagnosis">
      <p>{edition.purpose.replace(/^A screening aid: it/, 'It')}</p>
      <p>
        <span className="text-ink-muted">Definition followed: </span>
        {edition.name}
      </p>
      <details>
        <summary className="flex min-h-12 w-fit cursor-pointer items-center font-bold underline">
          To be checked against the current manual ({edition.toBeChecked.length})
        </summary>
        <ul className="list-disc pl-6">
          {edition.toBeChecked.map((part) => (
            <li key={part}>{part}</li>
          ))}
        </ul>
      </details>
    </Notice>
  );
}
