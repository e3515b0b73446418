import { Mark } from '@windrow/ui/mark';
import type { ReactNode } from 'react';

/** A whole screen that has something to say and nothing to show. */
export function Message({
  title,
  sentence,
  children,
}: {
  title: string;
  sentence?: string;
  children?: ReactNode;
}) {
  return (
    <main className="mx-auto flex min-h-screen max-w-[44rem] flex-col justify-center gap-6 p-8 text-body text-ink">
      <Mark className="size-12" />
      <h1 className="text-title font-bold">{title}</h1>
      {sentence && <p className="text-ink-muted">{sentence}</p>}
      {children}
    </main>
  );
}
