import { useQuery } from '@tanstack/react-query';
import { unitsQuery } from '@windrow/client/board/board-queries';
import type { Unit } from '@windrow/ventilation/contract/board';
import type { Session } from '@windrow/ventilation/contract/session';
import { useEffect } from 'react';
import { useParams } from 'react-router-dom';
import { recall, remember } from './device-memory.ts';
import { firstUnit } from './home-path.ts';

const LAST_UNIT = 'unit';

export function lastUnitId(): string | null {
  return recall(LAST_UNIT);
}

/** The unit of this page, or the one that the links of the bar should lead to; null: none may be seen. */
export function useCurrentUnit(session: Session): { unit: Unit | null; units: readonly Unit[] } {
  const { unitId } = useParams();
  const { data } = useQuery(unitsQuery());
  const units = data?.items ?? [];
  const wanted =
    unitId ??
    firstUnit({
      grants: session.grants,
      unitIds: units.map((unit) => unit.unitId),
      lastUnitId: lastUnitId(),
    });

  useEffect(() => {
    if (unitId) remember(LAST_UNIT, unitId);
  }, [unitId]);

  return { unit: units.find((unit) => unit.unitId === wanted) ?? units[0] ?? null, units };
}
