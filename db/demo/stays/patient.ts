import type { StayPlan } from '../plan.ts';

/** Names are invented; any likeness is chance. */
export function patient(
  familyName: string,
  givenName: string,
  sex: 'female' | 'male' | null,
  age: number,
  heightCm: number | null,
): StayPlan['patient'] {
  return { familyName, givenName, sex, age, heightCm };
}
