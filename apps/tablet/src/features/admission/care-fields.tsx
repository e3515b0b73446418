import { CheckField } from '@windrow/ui/controls/check-field';
import { SelectField } from '@windrow/ui/controls/select-field';
import { TextField } from '@windrow/ui/controls/text-field';
import type { StayDetails } from '@windrow/ventilation/contract/stays';
import type { UseFormReturn } from 'react-hook-form';
import { intervalOptions, numberOrNull, textOrNull } from './form-values.ts';

/** What everybody at the bed must know, and what is ordered more often than the unit's own rule. */
export function CareFields({
  form,
  orders,
}: {
  form: UseFormReturn<StayDetails>;
  orders: StayDetails['orders'];
}) {
  const { register, formState } = form;
  const { errors } = formState;
  return (
    <fieldset className="grid gap-4 rounded-xl bg-tile p-5 sm:grid-cols-2">
      <legend className="sr-only">Care</legend>
      <div className="sm:col-span-2">
        <CheckField label="Difficult airway" {...register('difficultAirway')} />
      </div>
      <TextField
        label="Precautions"
        hint="such as: contact, droplet"
        error={errors.precautions?.message}
        {...register('precautions', { setValueAs: textOrNull })}
      />
      <TextField
        label="Care limits"
        hint="as written in the chart"
        error={errors.careLimits?.message}
        {...register('careLimits', { setValueAs: textOrNull })}
      />
      <SelectField
        label="Check ordered"
        empty="by the unit's rule"
        options={intervalOptions(orders.checkEveryMinutes)}
        error={errors.orders?.checkEveryMinutes?.message}
        {...register('orders.checkEveryMinutes', { setValueAs: numberOrNull })}
      />
      <SelectField
        label="Gas ordered"
        empty="none ordered"
        options={intervalOptions(orders.gasEveryMinutes)}
        error={errors.orders?.gasEveryMinutes?.message}
        {...register('orders.gasEveryMinutes', { setValueAs: numberOrNull })}
      />
    </fieldset>
  );
}
