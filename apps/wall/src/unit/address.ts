import { useSyncExternalStore } from 'react';

const readers = new Set<() => void>();

/** A parameter of the page's address, which is where a wall remembers what it shows. */
export function useAddress(name: 'unit' | 'theme'): string | null {
  return useSyncExternalStore(subscribe, () => new URLSearchParams(window.location.search).get(name));
}

/** Goes to a unit; `null` goes back to the choice. What else is in the address stays. */
export function showUnit(unitId: string | null, { replace = false }: { replace?: boolean } = {}): void {
  const url = new URL(window.location.href);
  if (unitId === null) url.searchParams.delete('unit');
  else url.searchParams.set('unit', unitId);
  if (replace) window.history.replaceState(null, '', url);
  else window.history.pushState(null, '', url);
  for (const reader of readers) reader();
}

function subscribe(reader: () => void): () => void {
  readers.add(reader);
  window.addEventListener('popstate', reader);
  return () => {
    readers.delete(reader);
    window.removeEventListener('popstate', reader);
  };
}
