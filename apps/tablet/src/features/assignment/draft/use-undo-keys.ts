import { useEffect } from 'react';

/** Ctrl or ⌘ with Z goes back, with shift forward, as everywhere; not while somebody types. */
export function useUndoKeys({
  undo,
  redo,
  isActive,
}: {
  undo: () => void;
  redo: () => void;
  isActive: boolean;
}): void {
  useEffect(() => {
    if (!isActive) return;
    const press = (event: KeyboardEvent) => {
      const isTyping =
        event.target instanceof HTMLInputElement || event.target instanceof HTMLTextAreaElement;
      if (isTyping || !(event.ctrlKey || event.metaKey) || event.key.toLowerCase() !== 'z') return;
      event.preventDefault();
      if (event.shiftKey) redo();
      else undo();
    };
    window.addEventListener('keydown', press);
    return () => window.removeEventListener('keydown', press);
  }, [undo, redo, isActive]);
}
