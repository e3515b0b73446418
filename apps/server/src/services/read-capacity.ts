import { shownBed } from '@windrow/ventilation/board/shown-bed';
import { presentSupport } from '@windrow/ventilation/board/tile/present-support';
import type { Bed } from '@windrow/ventilation/contract/board';
import { type Capacity, VENTILATOR_CLASSES, type VentilatorClass } from '@windrow/ventilation/contract/fleet';
import { isOnVentilator, type SupportKind, supportEntry } from '@windrow/ventilation/support/catalogue';
import type { Deps } from '../deps.ts';
import { boardRows } from '../queries/board-rows.ts';
import { allUnits, type UnitRow } from '../queries/units.ts';
import { countsByClassAndState, readyInUnit } from '../queries/ventilators.ts';

/** Supply and use, counted now: machines by class and state, beds and support by unit. Counts only, nobody is named. */
export async function readCapacity({ db, now }: Deps): Promise<Capacity> {
  const serverTime = now().toISOString();
  const units: Capacity['units'] = [];
  for (const unit of await allUnits(db)) {
    units.push(
      unitCounts({
        unit,
        beds: await boardRows(db, unit.id),
        serverTime,
        ventilatorsReady: await readyInUnit(db, unit.id),
      }),
    );
  }
  return { serverTime, classes: classCounts(await countsByClassAndState(db)), units };
}

function classCounts(rows: Awaited<ReturnType<typeof countsByClassAndState>>): Capacity['classes'] {
  return Object.entries(VENTILATOR_CLASSES).map(([name, label]) => {
    const count = (state: string) =>
      Number(rows.find((row) => row.class === name && row.state === state)?.n ?? 0);
    return {
      class: name as VentilatorClass,
      label,
      counts: {
        inUse: count('in-use'),
        ready: count('ready'),
        cleaning: count('cleaning'),
        held: count('held'),
        onLoan: count('on-loan'),
      },
    };
  });
}

function unitCounts({
  unit,
  beds,
  serverTime,
  ventilatorsReady,
}: {
  unit: UnitRow;
  beds: Bed[];
  serverTime: string;
  ventilatorsReady: number;
}): Capacity['units'][number] {
  const occupied = beds.filter((bed) => bed.stay !== null);
  const shown = occupied.map((bed) => shownBed({ bed, now: serverTime }));
  // As the wall counts: a support that only a withdrawn check speaks of is not known any more.
  const supports = shown.map(
    (one) => presentSupport({ shown: one, now: Date.parse(serverTime) })?.id ?? null,
  );
  const ofKind = (kind: SupportKind) =>
    supports.filter((id) => id !== null && supportEntry(id).kind === kind).length;
  const open = beds.filter((bed) => bed.isOpen).length;
  return {
    unitId: unit.id,
    name: unit.name,
    beds: {
      open,
      closed: beds.length - open,
      occupied: occupied.length,
      free: beds.filter((bed) => bed.isOpen && !bed.stay).length,
    },
    support: {
      invasive: ofKind('invasive'),
      mask: ofKind('mask'),
      highFlow: ofKind('high-flow'),
      other: ofKind('oxygen') + ofKind('none'),
      unknown: supports.filter((id) => id === null).length,
    },
    unassigned: shown.filter(({ assignment }) => assignment === null).length,
    checksOverdue: shown.filter(
      ({ groups }) => groups.check.state === 'overdue' || groups.check.state === 'withdrawn',
    ).length,
    ventilatorsReady,
    withoutMachine: occupied.filter(
      (bed) => bed.stay?.support && isOnVentilator(bed.stay.support.id) && !bed.ventilator,
    ).length,
    oldestCheckAt:
      shown
        .map(({ groups }) => groups.check.observedAt)
        .filter((at) => at !== null)
        .sort()[0] ?? null,
  };
}
