import { buttonClass } from '@windrow/ui/controls/button';
import { EmptyState } from '@windrow/ui/controls/states';
import { Link } from 'react-router-dom';

export function NotFound() {
  return (
    <EmptyState title="There is no page at this address">
      <Link to="/" className={buttonClass()}>
        To the start
      </Link>
    </EmptyState>
  );
}
