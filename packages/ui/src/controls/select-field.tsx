import { type Ref, type SelectHTMLAttributes, useId } from 'react';
import { describedBy, FieldFrame } from './field-frame.tsx';
import { FIELD_CLASS } from './text-field.tsx';

type SelectFieldProps = SelectHTMLAttributes<HTMLSelectElement> & {
  label: string;
  hint?: string | undefined;
  error?: string | undefined;
  options: readonly { value: string; label: string }[];
  /** What stands there while nothing is chosen. */
  empty?: string;
  ref?: Ref<HTMLSelectElement>;
};

/** One of many, as the device's own list. */
export function SelectField({
  label,
  hint,
  error,
  options,
  empty,
  id,
  className = '',
  ...rest
}: SelectFieldProps) {
  const made = useId();
  const fieldId = id ?? made;
  return (
    <FieldFrame id={fieldId} label={label} hint={hint} error={error}>
      <select
        id={fieldId}
        aria-invalid={error ? true : undefined}
        aria-describedby={describedBy({ id: fieldId, hint, error })}
        className={`${FIELD_CLASS} ${className}`}
        {...rest}
      >
        {empty !== undefined && <option value="">{empty}</option>}
        {options.map(({ value, label: said }) => (
          <option key={value} value={value}>
            {said}
          </option>
        ))}
      </select>
    </FieldFrame>
  );
}
