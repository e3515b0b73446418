import { useId } from 'react';

/** A labelled line of text. */
export function Field({
  name,
  label,
  autoComplete,
  type = 'text',
}: {
  name: string;
  label: string;
  autoComplete: string;
  type?: 'text' | 'password';
}) {
  const id = useId();
  return (
    <div className="flex flex-col gap-1">
      <label htmlFor={id} className="text-label text-ink-muted">
        {label}
      </label>
      <input
        id={id}
        name={name}
        type={type}
        autoComplete={autoComplete}
        autoCapitalize="none"
        spellCheck={false}
        required
        className="min-h-12 rounded-lg border-2 border-line-strong bg-tile px-4 text-body text-ink"
      />
    </div>
  );
}
