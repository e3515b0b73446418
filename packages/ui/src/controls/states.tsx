import type { ReactNode } from 'react';
import { Button } from './button.tsx';

/** Nothing there, and that is right: says so, and what can be done. */
export function EmptyState({ title, children }: { title: string; children?: ReactNode }) {
  return (
    <div className="flex flex-col items-start gap-3 rounded-xl border-2 border-line border-dashed p-6">
      <p className="font-bold text-lg">{title}</p>
      {children}
    </div>
  );
}

/** On its way. Still, and said once to those who listen. */
export function LoadingState({ what }: { what: string }) {
  return (
    <p role="status" className="p-6 text-ink-muted text-lg">
      Reading {what} …
    </p>
  );
}

/** The server said no, or broke: what, in its own words, and a way to ask again. */
export function ErrorState({
  title,
  detail,
  onRetry,
}: {
  title: string;
  detail?: string;
  onRetry?: () => void;
}) {
  return (
    <div role="alert" className="flex flex-col items-start gap-3 rounded-xl border-2 border-flag p-6">
      <p className="font-bold text-lg">
        <span aria-hidden="true" className="mr-2 text-flag-text">
          ▲
        </span>
        {title}
      </p>
      {detail && <p>{detail}</p>}
      {onRetry && <Button onClick={onRetry}>Read again</Button>}
    </div>
  );
}

/** No answer from the server, and nothing kept to show. */
export function OfflineState({ what, onRetry }: { what: string; onRetry?: () => void }) {
  return (
    <div
      role="alert"
      className="flex flex-col items-start gap-3 rounded-xl border-2 border-ink border-dashed p-6"
    >
      <p className="font-bold text-lg">No connection to the server</p>
      <p>{what} cannot be read until it answers. It is asked again by itself.</p>
      {onRetry && <Button onClick={onRetry}>Ask now</Button>}
    </div>
  );
}
