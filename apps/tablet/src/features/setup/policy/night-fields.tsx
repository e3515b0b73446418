import { TextField } from '@windrow/ui/controls/text-field';
import { asClockTime } from '@windrow/ventilation/assignment/clock-time';
import { FormSection } from './form-section.tsx';
import { messageAt, type PolicyFormApi } from './number-input.tsx';

/** The hours in which the unit's screens are dark. */
export function NightFields({ form }: { form: PolicyFormApi }) {
  return (
    <FormSection title="Night" words="The hours, by the unit’s 24-hour clock, in which its screens are dark.">
      <div className="grid max-w-md grid-cols-2 gap-3">
        <HourField form={form} path="policy.nightFrom" label="from" />
        <HourField form={form} path="policy.nightTo" label="to" />
      </div>
    </FormSection>
  );
}

/** Plain text: the browser's own time field follows the device and may ask for a.m. and p.m. */
function HourField({
  form,
  path,
  label,
}: {
  form: PolicyFormApi;
  path: 'policy.nightFrom' | 'policy.nightTo';
  label: string;
}) {
  return (
    <TextField
      label={label}
      inputMode="numeric"
      placeholder="20:00"
      error={messageAt(form, path)}
      {...form.register(path, { setValueAs: asClockTime })}
    />
  );
}
