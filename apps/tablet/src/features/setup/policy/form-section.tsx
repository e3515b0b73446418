import { type ReactNode, useId } from 'react';

/** One part of the policy. */
export function FormSection({
  title,
  words,
  children,
}: {
  title: string;
  words: string;
  children: ReactNode;
}) {
  const headingId = useId();
  return (
    <section aria-labelledby={headingId} className="min-w-0 rounded-xl bg-tile p-4">
      <h2 id={headingId} className="font-bold text-lg">
        {title}
      </h2>
      <p className="mb-3 text-ink-muted">{words}</p>
      {children}
    </section>
  );
}
