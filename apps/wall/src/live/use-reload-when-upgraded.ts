import { useEffect } from 'react';

/** A server of another version may send what this page does not understand; the page that it serves does. */
export function useReloadWhenUpgraded(isUpgraded: boolean): void {
  useEffect(() => {
    if (isUpgraded) window.location.reload();
  }, [isUpgraded]);
}
