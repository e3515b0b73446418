import { TextField } from '@windrow/ui/controls/text-field';
import type { PolicyChange } from '@windrow/ventilation/contract/setup';
import { type FieldPath, get, type UseFormReturn } from 'react-hook-form';

export type PolicyFormApi = UseFormReturn<PolicyChange, unknown, PolicyChange>;

/** One number of the policy with its unit, and what is wrong with it. */
export function NumberInput({
  form,
  path,
  label,
  hint,
  group,
}: {
  form: PolicyFormApi;
  path: FieldPath<PolicyChange>;
  label: string;
  hint?: string | undefined;
  /** The group that is judged as a whole, where there is one, so that mending one number clears its words. */
  group?: FieldPath<PolicyChange>;
}) {
  return (
    <TextField
      label={label}
      hint={hint}
      inputMode="decimal"
      error={messageAt(form, path)}
      {...form.register(path, { setValueAs: asNumber, ...(group ? { deps: group } : {}) })}
    />
  );
}

/** A comma is a decimal sign to many; nothing entered is no nought. */
function asNumber(entered: unknown): number {
  if (typeof entered === 'number') return entered;
  const text = String(entered).trim().replace(',', '.');
  return text === '' ? Number.NaN : Number(text);
}

/** The words for a field, or for a group of them such as one ladder. */
export function messageAt(form: PolicyFormApi, path: string): string | undefined {
  const error: unknown = get(form.formState.errors, path);
  if (typeof error !== 'object' || error === null) return undefined;
  if ('message' in error && typeof error.message === 'string') return error.message;
  return 'root' in error ? messageAt(form, `${path}.root`) : undefined;
}
