import type { Unit } from '@windrow/ventilation/contract/board';
import type { Grant, Role } from '@windrow/ventilation/permissions/permissions';

export const ROLE_WORDS: Record<Role, string> = {
  therapist: 'Therapist',
  charge: 'Charge therapist',
  supervisor: 'House supervisor',
  clinician: 'Clinician (looks only)',
  biomedical: 'Biomedical engineer',
  administrator: 'Administrator',
  display: 'Wall display',
};

/** "Charge therapist in Harbour ICU; House supervisor in the whole hospital". */
export function grantsInWords(
  grants: readonly Grant[],
  units: readonly Pick<Unit, 'unitId' | 'name'>[],
): string {
  if (grants.length === 0) return 'no role: may sign in, sees nothing';
  return grants
    .map(({ role, unitId }) => {
      const place =
        unitId === null
          ? 'the whole hospital'
          : (units.find((unit) => unit.unitId === unitId)?.name ?? 'a unit');
      return `${ROLE_WORDS[role]} in ${place}`;
    })
    .join('; ');
}
