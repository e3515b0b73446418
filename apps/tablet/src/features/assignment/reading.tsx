import { NetworkError, ProblemError } from '@windrow/client/http';
import { ErrorState, LoadingState, OfflineState } from '@windrow/ui/controls/states';
import type { ReactNode } from 'react';

type Asked<T> = { data: T | undefined; error: Error | null; refetch: () => unknown };

/** What was asked for, once it is there; until then why not. A failed re-read leaves the last answer in place. */
export function Reading<T>({
  asked,
  what,
  children,
}: {
  asked: Asked<T>;
  what: string;
  children: (data: T) => ReactNode;
}) {
  const { data, error, refetch } = asked;
  if (data !== undefined) return children(data);
  if (error instanceof NetworkError)
    return <OfflineState what={capital(what)} onRetry={() => void refetch()} />;
  if (error) {
    const detail = error instanceof ProblemError ? error.problem.detail : error.message;
    return (
      <ErrorState
        title={`${capital(what)} could not be read`}
        detail={detail}
        onRetry={() => void refetch()}
      />
    );
  }
  return <LoadingState what={what} />;
}

function capital(words: string): string {
  return words.charAt(0).toUpperCase() + words.slice(1);
}
