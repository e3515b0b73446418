import type { ReactNode } from 'react';

/** Ids of the words around a control, for `aria-describedby`. */
export function describedBy({
  id,
  hint,
  error,
}: {
  id: string;
  hint?: string | undefined;
  error?: string | undefined;
}): string | undefined {
  const ids = [hint ? `${id}-hint` : null, error ? `${id}-error` : null].filter((one) => one !== null);
  return ids.length > 0 ? ids.join(' ') : undefined;
}

/** A label above, a hint below it, the control, and what is wrong with it in words. */
export function FieldFrame({
  id,
  label,
  hint,
  error,
  children,
}: {
  id: string;
  label: string;
  hint?: string | undefined;
  error?: string | undefined;
  children: ReactNode;
}) {
  return (
    <div className="flex min-w-0 flex-col gap-1">
      <label htmlFor={id} className="font-bold text-ink">
        {label}
      </label>
      {hint && (
        <p id={`${id}-hint`} className="text-ink-muted text-sm">
          {hint}
        </p>
      )}
      {children}
      {error && <FieldError id={`${id}-error`}>{error}</FieldError>}
    </div>
  );
}

/** What is wrong, beside what it is wrong with. The sign is for the eye; the words say it all. */
export function FieldError({ id, children }: { id?: string; children: ReactNode }) {
  return (
    <p id={id} className="flex gap-2 font-bold text-flag-text">
      <span aria-hidden="true">▲</span>
      <span>{children}</span>
    </p>
  );
}
