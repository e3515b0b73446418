import type { BedStay } from '@windrow/ventilation/contract/board';
import { formatDay } from '@windrow/ventilation/format/clock';
import { formatNumber } from '@windrow/ventilation/format/number';

/** Name and two identifiers, as they are read out at a bed: a bed's label is never one. */
export function patientInWords(patient: BedStay['patient']): string {
  if (!patient) return 'name not shown';
  return `${nameInWords(patient)} · born ${formatDay(patient.bornOn)} · No. ${patient.hospitalNumber}`;
}

export function nameInWords({ familyName, givenName }: { familyName: string; givenName: string }): string {
  return `${familyName}, ${givenName}`;
}

/** "64 y, male, 178 cm"; what is missing is said, since nothing is judged per kg without it. */
export function bodyInWords({
  patient,
  today,
}: {
  patient: NonNullable<BedStay['patient']>;
  today: string;
}): string {
  const { sex, heightCm, bornOn } = patient;
  return [
    `${ageInYears(bornOn, today)} y`,
    sex ?? 'sex not recorded',
    heightCm === null ? 'no height' : `${formatNumber(heightCm, { decimals: 0 })} cm`,
  ].join(', ');
}

export function weightInWords(predictedBodyWeightKg: number | null): string {
  return predictedBodyWeightKg === null
    ? 'no PBW'
    : `PBW ${formatNumber(predictedBodyWeightKg, { decimals: 1 })} kg`;
}

/** Whole years between two calendar days. */
export function ageInYears(bornOn: string, today: string): number {
  const years = Number(today.slice(0, 4)) - Number(bornOn.slice(0, 4));
  return today.slice(5) < bornOn.slice(5) ? years - 1 : years;
}
