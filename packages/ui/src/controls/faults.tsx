import { Notice } from './notice.tsx';
import { ErrorState, OfflineState } from './states.tsx';

type Words = { title: string; detail: string };

/**
 * What the server said, if it said anything: an error of the client package carries the problem document.
 * Known by its shape, since what is drawn here knows nothing of how it was fetched.
 */
function problemOf(error: unknown): Words | null {
  if (!(error instanceof Error) || !('problem' in error)) return null;
  const { problem } = error;
  if (typeof problem !== 'object' || problem === null || !('title' in problem) || !('detail' in problem))
    return null;
  return { title: String(problem.title), detail: String(problem.detail) };
}

/** In place of what could not be read: the server's own words, or that it cannot be reached. */
export function ReadFault({ error, what, onRetry }: { error: unknown; what: string; onRetry: () => void }) {
  const problem = problemOf(error);
  if (problem) return <ErrorState title={problem.title} detail={problem.detail} onRetry={onRetry} />;
  return <OfflineState what={what} onRetry={onRetry} />;
}

/** Why a deed was not done, above the button that was pressed. The place is always there, so that it is heard. */
export function WriteFault({ error }: { error: unknown }) {
  const problem = problemOf(error);
  return (
    <div role="alert">
      {Boolean(error) && (
        <Notice tone="attention" title={problem ? problem.title : 'The server cannot be reached'}>
          <p>{problem ? problem.detail : 'What you typed is kept. Try again.'}</p>
        </Notice>
      )}
    </div>
  );
}
