import { FormSection } from './form-section.tsx';
import { NumberInput, type PolicyFormApi } from './number-input.tsx';
import { THRESHOLDS } from './policy-fields.ts';

/** From where a value is worth a flag. */
export function ThresholdFields({ form }: { form: PolicyFormApi }) {
  return (
    <FormSection
      title="What is worth a flag"
      words="Limits at which a bed is marked on the board. They begin at published limits; a flag tells its source."
    >
      <div className="grid grid-cols-2 items-end gap-4 lg:grid-cols-3">
        {THRESHOLDS.map(({ key, label, unit }) => (
          <NumberInput
            key={key}
            form={form}
            path={`policy.thresholds.${key}`}
            label={unit ? `${label}, ${unit}` : label}
          />
        ))}
      </div>
    </FormSection>
  );
}
