import { useSyncExternalStore } from 'react';

type Store = { keys: () => readonly string[]; clear: () => void };

const stores = new Set<Store>();
const listeners = new Set<() => void>();
let unfinished: readonly string[] = [];

function changed(): void {
  unfinished = [...new Set([...stores].flatMap((store) => store.keys()))];
  for (const listener of listeners) listener();
}

function subscribe(listener: () => void): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}

/**
 * What was typed and is not recorded yet. It outlives the page it was typed on, so that an interruption
 * costs nothing; it never outlives the person's session, and is never written to the device.
 * Keys begin with the id of the stay that the draft is about.
 */
export function draftStore<Draft>() {
  const held = new Map<string, Draft>();
  const clear = () => {
    held.clear();
    changed();
  };
  stores.add({ keys: () => [...held.keys()], clear });

  return {
    get: (key: string): Draft | undefined => held.get(key),
    set: (key: string, draft: Draft): void => {
      held.set(key, draft);
      changed();
    },
    drop: (key: string): void => {
      if (held.delete(key)) changed();
    },
    clear,
    useDraft: (key: string): Draft | undefined => useSyncExternalStore(subscribe, () => held.get(key)),
  };
}

/** The keys of all drafts, in every store. */
export function useUnfinished(): readonly string[] {
  return useSyncExternalStore(subscribe, () => unfinished);
}

export function hasUnfinished(): boolean {
  return unfinished.length > 0;
}

/** At sign-out, and when somebody else signs in on the same device. */
export function clearAllDrafts(): void {
  for (const store of stores) store.clear();
}
