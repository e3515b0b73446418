import { Button } from '@windrow/ui/controls/button';
import { SelectField } from '@windrow/ui/controls/select-field';
import type { Unit } from '@windrow/ventilation/contract/board';
import { type Grant, ROLES } from '@windrow/ventilation/permissions/permissions';
import { X } from 'lucide-react';
import { ROLE_WORDS } from './role-words.ts';

const WHOLE_HOSPITAL = '';

/** Roles that look after the house, and so are given in all of it to begin with. */
const HOUSE_ROLES: readonly string[] = ['supervisor', 'biomedical', 'administrator'];

/** Which roles a person has, and where. */
export function GrantsField({
  grants,
  units,
  onChange,
}: {
  grants: readonly Grant[];
  units: readonly Unit[];
  onChange: (grants: Grant[]) => void;
}) {
  const put = (index: number, grant: Grant) =>
    onChange(grants.map((each, at) => (at === index ? grant : each)));
  const first = units[0]?.unitId ?? null;
  return (
    <fieldset className="flex flex-col gap-3">
      <legend className="mb-1 font-bold">Roles</legend>
      {grants.length === 0 && <p className="text-ink-muted">No role yet: may sign in, sees nothing.</p>}
      {grants.map((grant, index) => (
        // Two rows can say the same while they are chosen, so only their place tells them apart.
        // biome-ignore lint/suspicious/noArrayIndexKey: rows have no other identity
        <div key={index} className="grid grid-cols-[1fr_auto] items-end gap-2 sm:grid-cols-[1fr_1fr_auto]">
          <SelectField
            label="Role"
            options={ROLES.map((value) => ({ value, label: ROLE_WORDS[value] }))}
            value={grant.role}
            onChange={(event) => {
              const role = ROLES.find((each) => each === event.target.value) ?? grant.role;
              put(index, { role, unitId: HOUSE_ROLES.includes(role) ? null : (grant.unitId ?? first) });
            }}
          />
          <div className="col-start-1 sm:col-start-2">
            <SelectField
              label="In"
              options={[
                { value: WHOLE_HOSPITAL, label: 'the whole hospital' },
                ...units.map((unit) => ({ value: unit.unitId, label: unit.name })),
              ]}
              value={grant.unitId ?? WHOLE_HOSPITAL}
              onChange={(event) => put(index, { ...grant, unitId: event.target.value || null })}
            />
          </div>
          <Button
            tone="quiet"
            aria-label={`Take away: ${ROLE_WORDS[grant.role]}`}
            onClick={() => onChange(grants.filter((_, at) => at !== index))}
          >
            <X aria-hidden="true" size={20} />
          </Button>
        </div>
      ))}
      <div>
        <Button tone="quiet" onClick={() => onChange([...grants, { role: 'therapist', unitId: first }])}>
          Add a role
        </Button>
      </div>
    </fieldset>
  );
}
