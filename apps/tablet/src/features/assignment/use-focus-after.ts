import { useEffect, useRef } from 'react';

/** A block that was given away is drawn anew in another row; the keyboard's place must go with it. */
export function useFocusAfter(isClosed: boolean): (id: string) => void {
  const wanted = useRef<string | null>(null);
  useEffect(() => {
    if (!isClosed || wanted.current === null) return;
    const id = wanted.current;
    wanted.current = null;
    // After the dialog has handed the focus back to where it came from, which is gone.
    const timer = setTimeout(() => document.getElementById(id)?.focus(), 0);
    return () => clearTimeout(timer);
  }, [isClosed]);
  return (id) => {
    wanted.current = id;
  };
}
