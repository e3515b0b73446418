import type { ReactNode } from 'react';

/** `note`: good to know. `attention`: somebody should act. `plain`: part of the page. */
export type NoticeTone = 'note' | 'attention' | 'plain';

const TONES: Record<NoticeTone, string> = {
  note: 'border-2 border-note text-ink',
  attention: 'border-2 border-flag bg-tile text-ink',
  plain: 'border-2 border-line text-ink',
};

/** A few sentences in a frame. `isNews` tells screen readers when it appears, without taking the focus. */
export function Notice({
  tone = 'plain',
  isNews = false,
  title,
  children,
}: {
  tone?: NoticeTone;
  isNews?: boolean;
  title?: string;
  children?: ReactNode;
}) {
  return (
    <div
      role={isNews ? 'status' : undefined}
      className={`flex flex-col gap-2 rounded-lg px-4 py-3 ${TONES[tone]}`}
    >
      {title && (
        <p className="font-bold">
          {tone === 'attention' && (
            <span aria-hidden="true" className="mr-2 text-flag-text">
              ▲
            </span>
          )}
          {title}
        </p>
      )}
      {children}
    </div>
  );
}
