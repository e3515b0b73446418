import { Button, buttonClass } from '@windrow/ui/controls/button';
import { Link, useRouteError } from 'react-router-dom';

/** In place of a page that broke. What was typed elsewhere is kept; reading the page again starts it afresh. */
export function RouteError() {
  const error = useRouteError();
  const isUnread = error instanceof TypeError && /import|fetch/i.test(error.message);
  return (
    <div
      role="alert"
      className="m-4 flex flex-col items-start gap-3 rounded-xl border-2 border-flag bg-tile p-6 text-ink"
    >
      <h1 className="font-bold text-xl">
        {isUnread ? 'This page could not be fetched' : 'This page has broken'}
      </h1>
      <p>
        {isUnread
          ? 'The server did not answer, or Windrow was renewed meanwhile. Load it again.'
          : 'Nothing that was recorded is lost. Load the page again; if it breaks again, tell whoever looks after Windrow what you did.'}
      </p>
      {error instanceof Error && !isUnread && <p className="text-ink-muted text-sm">{error.message}</p>}
      <p className="flex flex-wrap gap-3">
        <Button tone="main" onClick={() => window.location.reload()}>
          Load again
        </Button>
        <Link to="/" className={buttonClass()}>
          To the start
        </Link>
      </p>
    </div>
  );
}
