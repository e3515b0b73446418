import type { ReactNode } from 'react';
import { ReadFault } from './faults.tsx';
import { LoadingState } from './states.tsx';

type Asked<T> = { data: T | undefined; error: Error | null; refetch: () => unknown };

/** What was asked for, once it is there; until then why not. A failed re-read leaves the last answer in place. */
export function Reading<T>({
  asked: { data, error, refetch },
  what,
  children,
}: {
  asked: Asked<T>;
  what: string;
  children: (data: T) => ReactNode;
}) {
  if (data !== undefined) return children(data);
  if (error) return <ReadFault error={error} what={capital(what)} onRetry={() => void refetch()} />;
  return <LoadingState what={what} />;
}

function capital(words: string): string {
  return words.charAt(0).toUpperCase() + words.slice(1);
}
