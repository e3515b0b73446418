import { ProblemError } from '@windrow/client/http';
import { Notice } from '@windrow/ui/controls/notice';

/** Why a change did not go through, in the server's words, or that nobody answered. */
export function NotSaved({ error, title = 'Not saved' }: { error: Error; title?: string }) {
  const isRefused = error instanceof ProblemError;
  return (
    <Notice tone="attention" isNews title={isRefused ? title : 'No answer from the server'}>
      <p>
        {isRefused
          ? error.message
          : 'Whether it was saved is not known. What you entered is kept; look before you save again.'}
      </p>
    </Notice>
  );
}
