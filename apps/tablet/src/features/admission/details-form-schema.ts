import { serverNow } from '@windrow/client/clock/server-clock';
import { StayDetails } from '@windrow/ventilation/contract/stays';
import { isUnusual, PATIENT_FIELDS } from '@windrow/ventilation/entry/fields';
import { dayIn } from '@windrow/ventilation/format/zoned-time';

const LONGEST_LIFE_YEARS = 125;

/** The contract's own schema, and what only a form can see: a birthday in the future, or of another century. */
export const DetailsForm = StayDetails.superRefine(({ patient }, ctx) => {
  const today = dayIn(serverNow(), 'UTC');
  const years = Number(today.slice(0, 4)) - Number(patient.bornOn.slice(0, 4));
  if (patient.bornOn > today || years > LONGEST_LIFE_YEARS) {
    ctx.addIssue({
      code: 'custom',
      path: ['patient', 'bornOn'],
      input: patient.bornOn,
      message: `born on ${patient.bornOn} cannot be: look at the year`,
    });
  }
});

export const NO_DETAILS: StayDetails = {
  patient: { hospitalNumber: '', familyName: '', givenName: '', bornOn: '', sex: null, heightCm: null },
  difficultAirway: false,
  precautions: null,
  careLimits: null,
  orders: { checkEveryMinutes: null, gasEveryMinutes: null },
};

/** A height that is possible and still asks to be looked at once more. */
export function isOddHeight(heightCm: number | null): heightCm is number {
  return heightCm !== null && isUnusual(PATIENT_FIELDS.heightCm, heightCm);
}
