import { Button } from '@windrow/ui/controls/button';
import { TextField } from '@windrow/ui/controls/text-field';
import { DifferenceTable } from './difference-table.tsx';
import { messageAt } from './number-input.tsx';
import type { PolicyEditing } from './use-policy-form.ts';

/** What will be changed, why, and the deed. */
export function PolicySave({ editing }: { editing: PolicyEditing }) {
  const { form, base, changes, newer, isSaving } = editing;
  if (changes.length === 0) return <p className="text-ink-muted">Nothing is changed yet.</p>;
  const hasErrors = Object.keys(form.formState.errors).length > 0;
  return (
    <section
      aria-labelledby="save-policy"
      className="flex flex-col gap-4 rounded-xl border-2 border-ink bg-tile p-4"
    >
      <h2 id="save-policy" className="font-bold text-lg">
        {changes.length === 1 ? '1 value changes' : `${changes.length} values change`}
      </h2>
      <DifferenceTable
        differences={changes}
        theirsName={`Version ${base.version}`}
        mineName={`Version ${base.version + 1}`}
      />
      <TextField
        label="Why"
        hint="kept with the version, for whoever asks later"
        error={messageAt(form, 'reason')}
        {...form.register('reason')}
      />
      {hasErrors && (
        <p role="alert" className="font-bold text-flag-text">
          Not saved: something above is not accepted.
        </p>
      )}
      <div className="flex flex-wrap gap-3">
        <Button type="submit" tone="main" disabled={isSaving || newer !== null}>
          {isSaving ? 'Saving …' : `Save version ${base.version + 1}`}
        </Button>
        <Button onClick={editing.discard}>Discard changes</Button>
      </div>
    </section>
  );
}
