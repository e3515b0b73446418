import { type InputHTMLAttributes, type Ref, type TextareaHTMLAttributes, useId } from 'react';
import { describedBy, FieldFrame } from './field-frame.tsx';

type Words = { label: string; hint?: string | undefined; error?: string | undefined };

export const FIELD_CLASS =
  'w-full min-h-12 rounded-lg border-2 border-line-strong bg-tile px-3 py-2 text-ink text-base aria-invalid:border-flag-text';

type TextFieldProps = Words & InputHTMLAttributes<HTMLInputElement> & { ref?: Ref<HTMLInputElement> };

/** One line of text with its label. Suggestions of the browser are off: a shared tablet must not remember. */
export function TextField({ label, hint, error, id, className = '', ...rest }: TextFieldProps) {
  const made = useId();
  const fieldId = id ?? made;
  return (
    <FieldFrame id={fieldId} label={label} hint={hint} error={error}>
      <input
        id={fieldId}
        type="text"
        autoComplete="off"
        aria-invalid={error ? true : undefined}
        aria-describedby={describedBy({ id: fieldId, hint, error })}
        className={`${FIELD_CLASS} ${className}`}
        {...rest}
      />
    </FieldFrame>
  );
}

type TextAreaProps = Words & TextareaHTMLAttributes<HTMLTextAreaElement> & { ref?: Ref<HTMLTextAreaElement> };

/** Several lines of text. */
export function TextArea({ label, hint, error, id, className = '', ...rest }: TextAreaProps) {
  const made = useId();
  const fieldId = id ?? made;
  return (
    <FieldFrame id={fieldId} label={label} hint={hint} error={error}>
      <textarea
        id={fieldId}
        rows={3}
        aria-invalid={error ? true : undefined}
        aria-describedby={describedBy({ id: fieldId, hint, error })}
        className={`${FIELD_CLASS} ${className}`}
        {...rest}
      />
    </FieldFrame>
  );
}
