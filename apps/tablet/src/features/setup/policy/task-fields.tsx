import { FormSection } from './form-section.tsx';
import { NumberInput, type PolicyFormApi } from './number-input.tsx';
import { TASK_ROWS } from './policy-fields.ts';

/** What each task takes and how often it comes: the widths of the blocks on the assignment page. */
export function TaskFields({ form }: { form: PolicyFormApi }) {
  return (
    <FormSection
      title="What work takes"
      words="Minutes for each task and how often it is due. From these the assignment counts what each bed asks of a person; 0 minutes leaves a task out."
    >
      <div className="grid grid-cols-1 gap-4 lg:grid-cols-2">
        {TASK_ROWS.map(({ task, label, whom }) => (
          <fieldset key={task} className="border-line border-t pt-3">
            <legend className="sr-only">{label}</legend>
            <p className="mb-1">
              <strong aria-hidden="true">{label}</strong>{' '}
              <span className="text-ink-muted text-sm">{whom}</span>
            </p>
            <div className="grid grid-cols-2 gap-3">
              <NumberInput form={form} path={`policy.tasks.${task}.minutes`} label="minutes each" />
              <NumberInput form={form} path={`policy.tasks.${task}.everyMinutes`} label="every … minutes" />
            </div>
          </fieldset>
        ))}
      </div>
    </FormSection>
  );
}
