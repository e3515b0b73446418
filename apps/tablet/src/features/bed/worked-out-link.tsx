import { noteAddress, type WorkedOut } from '@windrow/ventilation/notes/worked-out';
import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';

/**
 * A value that leads to how it was worked out, from the very numbers that made it. The whole cell around it is
 * the target, so that cell must be `relative` and at least 48 px high. It goes to a page and not to a window of
 * its own: what is half filled in is kept beside the page, and Back leads to it.
 */
export function WorkedOutLink({
  from,
  name,
  children,
}: {
  from: WorkedOut;
  /** "5.8 mL/kg: how Vt per kg is worked out", for those who hear it without what stands around it. */
  name: string;
  children: ReactNode;
}) {
  return (
    <Link
      to={noteAddress(from)}
      aria-label={name}
      className="text-ink underline decoration-2 decoration-line-strong underline-offset-4 after:absolute after:inset-0"
    >
      {children}
    </Link>
  );
}
