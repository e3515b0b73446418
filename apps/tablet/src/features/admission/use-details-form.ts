import { zodResolver } from '@hookform/resolvers/zod';
import { ProblemError } from '@windrow/client/http';
import type { StayDetails } from '@windrow/ventilation/contract/stays';
import { useState } from 'react';
import { type FieldPath, type UseFormReturn, useForm } from 'react-hook-form';
import { DetailsForm, isOddHeight } from './details-form-schema.ts';

export type DetailsFormState = {
  form: UseFormReturn<StayDetails>;
  /** A height that waits for an answer, or got one; null: nothing is odd. */
  oddHeight: { heightCm: number; isKept: boolean; keep: (kept: boolean) => void } | null;
  /** True where the form may be sent: nothing odd is unanswered. */
  isAnswered: (details: StayDetails) => boolean;
  /** Puts the server's refusals to their fields. */
  takeRefusals: (error: unknown) => void;
};

/** The form of who a patient is and what is ordered, for admission and for corrections. */
export function useDetailsForm(defaultValues: StayDetails): DetailsFormState {
  const form = useForm<StayDetails>({ resolver: zodResolver(DetailsForm), defaultValues });
  const [kept, setKept] = useState<number | null>(null);
  const [asked, setAsked] = useState<number | null>(null);
  const height = form.watch('patient.heightCm');
  const isOdd = isOddHeight(height) && asked === height;

  return {
    form,
    oddHeight: isOdd
      ? { heightCm: height, isKept: kept === height, keep: (keeps) => setKept(keeps ? height : null) }
      : null,
    isAnswered: ({ patient: { heightCm } }) => {
      if (!isOddHeight(heightCm) || kept === heightCm || heightCm === defaultValues.patient.heightCm)
        return true;
      setAsked(heightCm);
      return false;
    },
    takeRefusals: (error) => {
      if (!(error instanceof ProblemError)) return;
      for (const { path, message } of error.problem.errors ?? []) {
        if (isField(path)) form.setError(path, { message });
      }
    },
  };
}

const FIELDS: readonly string[] = [
  'patient.hospitalNumber',
  'patient.familyName',
  'patient.givenName',
  'patient.bornOn',
  'patient.sex',
  'patient.heightCm',
  'precautions',
  'careLimits',
  'orders.checkEveryMinutes',
  'orders.gasEveryMinutes',
];

function isField(path: string): path is FieldPath<StayDetails> {
  return FIELDS.includes(path);
}
