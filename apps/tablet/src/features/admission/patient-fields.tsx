import { ChoiceGroup } from '@windrow/ui/controls/choice-group';
import { TextField } from '@windrow/ui/controls/text-field';
import type { StayDetails } from '@windrow/ventilation/contract/stays';
import { PATIENT_FIELDS, rangeInWords } from '@windrow/ventilation/entry/fields';
import { formatDay } from '@windrow/ventilation/format/clock';
import { Controller, type UseFormReturn } from 'react-hook-form';
import { dayFromTyping, numberOrNull } from './form-values.ts';

const SEX_OPTIONS = [
  { value: 'female', label: 'Female' },
  { value: 'male', label: 'Male' },
  { value: '', label: 'Not recorded' },
] as const;

/** Who the patient is: the two identifiers first, then what the weight formula needs. */
export function PatientFields({ form }: { form: UseFormReturn<StayDetails> }) {
  const { register, control, formState } = form;
  const errors = formState.errors.patient;
  return (
    <fieldset className="grid gap-4 rounded-xl bg-tile p-5 sm:grid-cols-2">
      <legend className="sr-only">Patient</legend>
      <TextField
        label="Hospital number"
        autoCapitalize="characters"
        spellCheck={false}
        error={errors?.hospitalNumber?.message}
        {...register('patient.hospitalNumber')}
      />
      <Controller
        control={control}
        name="patient.bornOn"
        render={({ field }) => <BornField {...field} error={errors?.bornOn?.message} />}
      />
      <TextField
        label="Family name"
        spellCheck={false}
        error={errors?.familyName?.message}
        {...register('patient.familyName')}
      />
      <TextField
        label="Given name"
        spellCheck={false}
        error={errors?.givenName?.message}
        {...register('patient.givenName')}
      />
      <Controller
        control={control}
        name="patient.sex"
        render={({ field }) => (
          <ChoiceGroup
            label="Sex, for the weight formula only"
            options={SEX_OPTIONS}
            value={field.value ?? ''}
            onChoose={(value) => field.onChange(value === '' ? null : value)}
          />
        )}
      />
      <TextField
        label="Height, cm"
        hint={`${rangeInWords(PATIENT_FIELDS.heightCm)}; empty: not recorded, and then nothing is judged per kg`}
        inputMode="decimal"
        error={errors?.heightCm?.message}
        {...register('patient.heightCm', { setValueAs: numberOrNull })}
      />
    </fieldset>
  );
}

/** A day in one order only, read back with its month in letters. */
function BornField({
  value,
  onChange,
  error,
  ...rest
}: {
  value: string;
  onChange: (day: string) => void;
  error: string | undefined;
  name: string;
  onBlur: () => void;
}) {
  const isWhole = /^\d{4}-\d{2}-\d{2}$/.test(value) && !Number.isNaN(Date.parse(value));
  return (
    <TextField
      label="Born"
      hint={isWhole ? `read as ${formatDay(value)}` : 'year, month, day: 1961-03-04'}
      inputMode="numeric"
      placeholder="yyyy-mm-dd"
      error={error}
      value={value}
      onChange={(event) => onChange(dayFromTyping(event.target.value))}
      {...rest}
    />
  );
}
