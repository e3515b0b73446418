import { type InputHTMLAttributes, type Ref, useId } from 'react';

type CheckFieldProps = Omit<InputHTMLAttributes<HTMLInputElement>, 'type'> & {
  label: string;
  ref?: Ref<HTMLInputElement>;
};

/** Yes or no, with the whole line as the target. */
export function CheckField({ label, id, ...rest }: CheckFieldProps) {
  const made = useId();
  const fieldId = id ?? made;
  return (
    <label
      htmlFor={fieldId}
      className="inline-flex min-h-12 cursor-pointer items-center gap-3 font-bold text-ink"
    >
      <input id={fieldId} type="checkbox" className="size-6 shrink-0 accent-ink" {...rest} />
      {label}
    </label>
  );
}
