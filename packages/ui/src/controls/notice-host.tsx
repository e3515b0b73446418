import { useEffect, useSyncExternalStore } from 'react';

type Told = { id: number; text: string };

const STAYS_MS = 8_000;
let told: Told | null = null;
const listeners = new Set<() => void>();

function put(next: Told | null): void {
  told = next;
  for (const listener of listeners) listener();
}

/** Says once, on any page, that something has been done: "Recorded 11:20". Never for what must not be missed. */
export function announce(text: string): void {
  put({ id: (told?.id ?? 0) + 1, text });
}

function subscribe(listener: () => void): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}

/** The place for these words. It is always there, so that screen readers hear what is put into it. */
export function NoticeHost() {
  const now = useSyncExternalStore(subscribe, () => told);

  useEffect(() => {
    if (!now) return;
    const timer = setTimeout(() => put(null), STAYS_MS);
    return () => clearTimeout(timer);
  }, [now]);

  return (
    <div role="status" className="pointer-events-none fixed inset-x-0 top-2 z-30 flex justify-center px-4">
      {now && (
        <p key={now.id} className="rounded-lg bg-ink px-5 py-3 font-bold text-ground text-lg">
          {now.text}
        </p>
      )}
    </div>
  );
}
