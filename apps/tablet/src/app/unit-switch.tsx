import { FIELD_CLASS } from '@windrow/ui/controls/text-field';
import type { Unit } from '@windrow/ventilation/contract/board';
import { useLocation, useNavigate, useParams } from 'react-router-dom';

/** The same page of another unit. Where only one unit may be seen, its name alone. */
export function UnitSwitch({ unit, units }: { unit: Unit | null; units: readonly Unit[] }) {
  const navigate = useNavigate();
  const { pathname } = useLocation();
  const { unitId, bedId } = useParams();
  if (!unit || unitId === undefined) return null;
  const name = <p className="min-w-0 truncate font-bold">{unit.name}</p>;
  // On a bed's page the unit is where the bed stands.
  if (units.length < 2 || bedId !== undefined) return name;

  const part = pathname.split('/')[1] ?? 'round';
  return (
    <label className="min-w-0">
      <span className="sr-only">Unit</span>
      <select
        className={`${FIELD_CLASS} font-bold`}
        value={unit.unitId}
        onChange={(event) => void navigate(`/${part}/${event.target.value}`)}
      >
        {units.map((one) => (
          <option key={one.unitId} value={one.unitId}>
            {one.name}
          </option>
        ))}
      </select>
    </label>
  );
}
