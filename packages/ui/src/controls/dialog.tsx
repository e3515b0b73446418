import { Dialog as Radix } from 'radix-ui';
import { type ReactNode, useEffect } from 'react';

const CLOSE_ALL = 'windrow:close-dialogs';

/** For what must stand alone over the page, such as signing in again: no dialog ever lies on another. */
export function closeDialogs(): void {
  window.dispatchEvent(new Event(CLOSE_ALL));
}

/** A question over the page. Focus is kept inside; Escape and the ground outside mean no. */
export function Dialog({
  open,
  onClose,
  title,
  description,
  children,
}: {
  open: boolean;
  onClose: () => void;
  title: string;
  description?: string;
  children: ReactNode;
}) {
  useEffect(() => {
    if (!open) return;
    window.addEventListener(CLOSE_ALL, onClose);
    return () => window.removeEventListener(CLOSE_ALL, onClose);
  }, [open, onClose]);

  return (
    <Radix.Root open={open} onOpenChange={(next) => !next && onClose()}>
      <Radix.Portal>
        {/* Not Radix's own overlay: that writes a style element into the page, which our policy forbids. */}
        <div className="fixed inset-0 z-40 bg-veil" />
        <Radix.Content
          {...(description ? {} : { 'aria-describedby': undefined })}
          className="fixed top-1/2 left-1/2 z-50 flex max-h-11/12 w-11/12 max-w-xl -translate-x-1/2 -translate-y-1/2 flex-col gap-4 overflow-y-auto rounded-xl border-2 border-ink bg-tile p-5 text-ink"
        >
          <Radix.Title className="font-bold text-xl">{title}</Radix.Title>
          {description && <Radix.Description>{description}</Radix.Description>}
          {children}
        </Radix.Content>
      </Radix.Portal>
    </Radix.Root>
  );
}

/** The buttons of a dialog, the deed first. */
export function DialogActions({ children }: { children: ReactNode }) {
  return <div className="flex flex-wrap gap-3">{children}</div>;
}
