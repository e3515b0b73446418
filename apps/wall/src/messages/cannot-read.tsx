import { ProblemError } from '@windrow/client/http';
import { Button } from './button.tsx';
import { Message } from './message.tsx';

/** The first reading failed: say why, try again by itself, and let somebody press. */
export function CannotRead({ error, onRetry }: { error: Error; onRetry: () => void }) {
  const refused = error instanceof ProblemError;
  return (
    <Message
      title={refused ? 'The server does not show this board' : 'The server cannot be reached'}
      sentence={refused ? error.problem.detail : 'Nothing is shown until it answers. Go by the bedside.'}
    >
      <p className="text-label text-ink-muted" role="status">
        Trying again every 5 seconds.
      </p>
      <div>
        <Button onPress={onRetry}>Try now</Button>
      </div>
    </Message>
  );
}
