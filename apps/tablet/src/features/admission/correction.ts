import type { BedStay } from '@windrow/ventilation/contract/board';
import type { StayCorrection, StayDetails } from '@windrow/ventilation/contract/stays';

/** The details of a present stay, as the board has them. Null where this person may not see who it is. */
export function detailsOf({
  patient,
  difficultAirway,
  precautions,
  careLimits,
  orders,
}: BedStay): StayDetails | null {
  return patient && { patient, difficultAirway, precautions, careLimits, orders };
}

/** Only the parts that differ: what somebody else has corrected meanwhile is not put back. */
export function correctionOf({
  before,
  after,
}: {
  before: StayDetails;
  after: StayDetails;
}): StayCorrection | null {
  const correction: StayCorrection = {
    ...(isSame(before.patient, after.patient) ? {} : { patient: after.patient }),
    ...(before.difficultAirway === after.difficultAirway ? {} : { difficultAirway: after.difficultAirway }),
    ...(before.precautions === after.precautions ? {} : { precautions: after.precautions }),
    ...(before.careLimits === after.careLimits ? {} : { careLimits: after.careLimits }),
    ...(isSame(before.orders, after.orders) ? {} : { orders: after.orders }),
  };
  return Object.keys(correction).length === 0 ? null : correction;
}

const LABELS: Readonly<Record<string, string>> = {
  hospitalNumber: 'Hospital number',
  familyName: 'Family name',
  givenName: 'Given name',
  bornOn: 'Born',
  sex: 'Sex',
  heightCm: 'Height, cm',
  difficultAirway: 'Difficult airway',
  precautions: 'Precautions',
  careLimits: 'Care limits',
  checkEveryMinutes: 'Check ordered, min',
  gasEveryMinutes: 'Gas ordered, min',
};

/** What differs between two readings of the same stay, in words: what somebody else has changed. */
export function differences({
  before,
  after,
}: {
  before: StayDetails;
  after: StayDetails;
}): { label: string; before: string; after: string }[] {
  const [old, now] = [flat(before), flat(after)];
  return Object.entries(LABELS).flatMap(([key, label]) =>
    old[key] === now[key] ? [] : [{ label, before: inWords(old[key]), after: inWords(now[key]) }],
  );
}

function flat({ patient, orders, ...rest }: StayDetails): Readonly<Record<string, unknown>> {
  return { ...patient, ...orders, ...rest };
}

function isSame(a: object, b: object): boolean {
  const [old, now]: [Readonly<Record<string, unknown>>, Readonly<Record<string, unknown>>] = [
    { ...a },
    { ...b },
  ];
  return Object.keys({ ...old, ...now }).every((key) => old[key] === now[key]);
}

function inWords(value: unknown): string {
  if (value === null || value === undefined) return 'not recorded';
  return typeof value === 'boolean' ? (value ? 'yes' : 'no') : String(value);
}
