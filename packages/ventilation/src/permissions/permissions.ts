/** Who may do what: one table, asked by the server for every request and socket event, and by screens to hide. */
export const ROLES = [
  'therapist',
  'charge',
  'supervisor',
  'clinician',
  'biomedical',
  'administrator',
  'display',
] as const;
export type Role = (typeof ROLES)[number];

export const ACTS = [
  'see-board',
  'see-people',
  'record',
  'amend-own',
  'amend-other',
  'place-stay',
  'see-shifts',
  'assign',
  'accept-handover',
  'use-ventilator',
  'manage-fleet',
  'see-fleet',
  'see-capacity',
  'set-stage',
  'see-policy',
  'set-policy',
  'set-up',
  'see-audit',
] as const;
export type Act = (typeof ACTS)[number];

/** A role held in one unit, or in the whole hospital where `unitId` is null. */
export type Grant = { role: Role; unitId: string | null };

const MAY: Record<Role, readonly Act[]> = {
  therapist: [
    'see-board',
    'see-people',
    'record',
    'amend-own',
    'place-stay',
    'see-shifts',
    'accept-handover',
    'use-ventilator',
    'see-fleet',
    'see-capacity',
    'see-policy',
    'see-audit',
  ],
  charge: [
    'see-board',
    'see-people',
    'record',
    'amend-own',
    'amend-other',
    'place-stay',
    'see-shifts',
    'assign',
    'accept-handover',
    'use-ventilator',
    'see-fleet',
    'see-capacity',
    'see-policy',
    'set-policy',
    'see-audit',
  ],
  supervisor: [
    'see-board',
    'see-people',
    'place-stay',
    'see-shifts',
    'assign',
    'use-ventilator',
    'manage-fleet',
    'see-fleet',
    'see-capacity',
    'set-stage',
    'see-policy',
  ],
  clinician: ['see-board', 'see-people', 'see-shifts', 'see-policy'],
  biomedical: ['use-ventilator', 'manage-fleet', 'see-fleet', 'see-capacity'],
  administrator: ['see-policy', 'set-policy', 'set-up', 'see-audit'],
  display: ['see-board', 'see-policy'],
};

/** Acts that a role holds for the whole hospital even where it was given in one unit. */
const HOUSE_WIDE: readonly Act[] = ['see-fleet', 'see-capacity'];

/**
 * Whether these grants allow an act in a unit. With `unitId` null the question is of the whole
 * house: then only a hospital-wide grant counts, or an act that is house-wide by nature.
 */
export function may(grants: readonly Grant[], act: Act, unitId: string | null): boolean {
  return grants.some(
    (grant) =>
      MAY[grant.role].includes(act) &&
      (grant.unitId === null || grant.unitId === unitId || HOUSE_WIDE.includes(act)),
  );
}

/** Whether these grants allow an act in any unit at all. */
export function mayAnywhere(grants: readonly Grant[], act: Act): boolean {
  return grants.some((grant) => MAY[grant.role].includes(act));
}
