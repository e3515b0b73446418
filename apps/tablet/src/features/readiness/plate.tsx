import { type ReactNode, useId } from 'react';

/** One part of the page, with its name. */
export function Plate({ title, children }: { title: string; children: ReactNode }) {
  const id = useId();
  return (
    <section aria-labelledby={id} className="flex min-w-0 flex-col gap-3 rounded-xl bg-tile px-4 py-3">
      <h2 id={id} className="font-bold text-lg">
        {title}
      </h2>
      {children}
    </section>
  );
}
