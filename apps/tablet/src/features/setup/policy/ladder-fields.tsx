import { FieldError } from '@windrow/ui/controls/field-frame';
import { formatAge } from '@windrow/ventilation/format/age';
import { useWatch } from 'react-hook-form';
import { FormSection } from './form-section.tsx';
import { messageAt, NumberInput, type PolicyFormApi } from './number-input.tsx';
import { LADDER_ROWS, LADDER_STEPS } from './policy-fields.ts';

/** From which age each kind of fact is due, overdue, and no longer shown. */
export function LadderFields({ form }: { form: PolicyFormApi }) {
  const freshness = useWatch({ control: form.control, name: 'policy.freshness' });
  return (
    <FormSection
      title="How old is too old"
      words="Ages in minutes. A withdrawn value is no longer shown as the bed’s state."
    >
      <div className="flex flex-col gap-4">
        {LADDER_ROWS.map(({ kind, label }) => {
          const wrong = messageAt(form, `policy.freshness.${kind}`);
          return (
            <fieldset
              key={kind}
              className="border-line border-t pt-3"
              aria-describedby={wrong ? `ladder-${kind}-wrong` : undefined}
            >
              <legend className="sr-only">{label}</legend>
              <p aria-hidden="true" className="mb-1 font-bold">
                {label}
              </p>
              <div className="grid grid-cols-3 items-end gap-3">
                {LADDER_STEPS.map(({ step, label: word }) => (
                  <NumberInput
                    key={step}
                    form={form}
                    path={`policy.freshness.${kind}.${step}`}
                    group={`policy.freshness.${kind}`}
                    label={word}
                    hint={
                      Number.isFinite(freshness[kind][step])
                        ? `${formatAge(freshness[kind][step])} old`
                        : 'an age in minutes'
                    }
                  />
                ))}
              </div>
              {wrong && (
                <FieldError id={`ladder-${kind}-wrong`}>
                  Due, overdue and withdrawn must follow one another.
                </FieldError>
              )}
            </fieldset>
          );
        })}
      </div>
    </FormSection>
  );
}
