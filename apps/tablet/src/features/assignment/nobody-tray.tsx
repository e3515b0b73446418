import { useDroppable } from '@dnd-kit/core';
import type { ReactNode } from 'react';
import { NOBODY } from './drag/place-id.ts';

/** Beds with a patient whom nobody has. It is always there, so that a bed can be taken back. */
export function NobodyTray({
  count,
  isOver,
  isTarget,
  children,
}: {
  count: number;
  isOver: boolean;
  isTarget: boolean;
  children: ReactNode;
}) {
  const { setNodeRef } = useDroppable({ id: NOBODY, disabled: !isTarget });
  return (
    <section
      ref={setNodeRef}
      aria-labelledby="nobody-has"
      className={`flex flex-wrap items-center gap-x-4 gap-y-2 rounded-xl border-2 border-dashed px-4 py-3 ${isOver ? 'border-note' : 'border-ink'}`}
    >
      <h2 id="nobody-has" className="basis-full font-bold text-lg @2xl:basis-auto">
        Nobody has
      </h2>
      {count === 0 && <p className="text-ink-muted">no bed: every patient has a person</p>}
      <ul aria-label="Beds that nobody has" className="flex min-w-0 flex-1 basis-full flex-wrap @2xl:basis-0">
        {children}
      </ul>
      {isTarget && count > 0 && (
        <p className="text-ink-muted text-sm">drag, or press a bed and choose a person</p>
      )}
    </section>
  );
}
