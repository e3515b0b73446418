import { useId } from 'react';
import { FieldError } from './field-frame.tsx';

export type Choice<Value extends string> = { value: Value; label: string };

/** A few choices side by side, all to be seen. Real radio buttons, so arrows and screen readers know them. */
export function ChoiceGroup<Value extends string>({
  label,
  options,
  value,
  onChoose,
  onFocus,
  hideLabel = false,
  error,
  name,
}: {
  label: string;
  options: readonly Choice<Value>[];
  value: Value | null;
  onChoose: (value: Value) => void;
  onFocus?: () => void;
  /** Where the label already stands beside it. */
  hideLabel?: boolean;
  error?: string | undefined;
  name?: string;
}) {
  const made = useId();
  const errorId = `${made}-error`;
  return (
    <fieldset className="min-w-0" aria-describedby={error ? errorId : undefined}>
      <legend className={hideLabel ? 'sr-only' : 'mb-1 font-bold text-ink'}>{label}</legend>
      <div className="flex flex-wrap gap-2">
        {options.map((option) => (
          <ChoiceChip
            key={option.value}
            name={name ?? made}
            label={option.label}
            isChosen={option.value === value}
            onChoose={() => onChoose(option.value)}
            onFocus={onFocus}
          />
        ))}
      </div>
      {error && <FieldError id={errorId}>{error}</FieldError>}
    </fieldset>
  );
}

function ChoiceChip({
  name,
  label,
  isChosen,
  onChoose,
  onFocus,
}: {
  name: string;
  label: string;
  isChosen: boolean;
  onChoose: () => void;
  onFocus: (() => void) | undefined;
}) {
  return (
    <label className="relative inline-flex min-h-12 cursor-pointer items-center gap-2 rounded-lg border-2 border-line-strong bg-tile px-3 font-bold text-ink has-checked:border-ink has-checked:bg-ink has-checked:text-ground has-focus-visible:outline-3 has-focus-visible:outline-focus has-focus-visible:outline-offset-2">
      <input
        type="radio"
        name={name}
        checked={isChosen}
        onChange={onChoose}
        onFocus={onFocus}
        className="absolute inset-0 cursor-pointer opacity-0"
      />
      <span aria-hidden="true" className="size-3 shrink-0 rounded-full border-2 border-current p-px">
        {isChosen && <span className="block size-full rounded-full bg-current" />}
      </span>
      <span>{label}</span>
    </label>
  );
}
