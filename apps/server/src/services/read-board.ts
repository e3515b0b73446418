import { bedBoard } from '@windrow/ventilation/board/bed-board';
import { bedForAudience } from '@windrow/ventilation/board/for-audience';
import type { Bed, Board, Unit } from '@windrow/ventilation/contract/board';
import type { Audience } from '@windrow/ventilation/contract/live';
import type { Knex } from 'knex';
import type { Deps } from '../deps.ts';
import { invalid } from '../errors.ts';
import { boardRows } from '../queries/board-rows.ts';
import { policyOf } from '../queries/policies.ts';
import { placeKnownAt, stayFacts } from '../queries/stay-facts.ts';
import { staysKnownAt } from '../queries/stays.ts';
import { bedCounts, bedsOfUnit, type UnitRow } from '../queries/units.ts';
import { type KnownMachine, machinesKnownAt, readyInUnit } from '../queries/ventilators.ts';
import { publishedAssignments, toPlace, toVentilatorAtBed } from './rebuild-bed.ts';

/** Every bed of a unit as it stands, cut to what the reader may see. */
export async function readBoard(
  deps: Deps,
  { unit, audience }: { unit: UnitRow; audience: Audience },
): Promise<Board> {
  const now = deps.now().toISOString();
  const beds = await boardRows(deps.db, unit.id);
  return {
    ...(await boardHead(deps, unit)),
    revision: unit.revision,
    serverTime: now,
    at: null,
    beds: beds.map((bed) => bedForAudience({ bed, audience, now })),
  };
}

/**
 * What the board showed at a past minute: from the facts recorded by then, under the policy of then,
 * aged to then. What was entered later, even about earlier, is not in it.
 */
export async function lookBack(
  deps: Deps,
  { unit, audience, at }: { unit: UnitRow; audience: Audience; at: string },
): Promise<Board> {
  const serverTime = deps.now().toISOString();
  if (at > serverTime)
    throw invalid([{ path: 'at', message: `must not be after the server's time, ${serverTime}, not ${at}` }]);
  const machines = await machinesKnownAt(deps.db, at);
  const beds = await bedsKnownAt(deps.db, { unitId: unit.id, at, machines });
  const ready = machines.filter(
    ({ state, unit_id, home_unit_id }) => state === 'ready' && (unit_id ?? home_unit_id) === unit.id,
  );
  return {
    ...(await boardHead(deps, unit)),
    fleet: { ready: ready.length },
    revision: unit.revision,
    serverTime,
    at,
    beds: beds.map((bed) => bedForAudience({ bed, audience, now: at })),
  };
}

/** The rows as the facts recorded by an instant make them. Their revision is 0: it belongs to the live sequence. */
async function bedsKnownAt(
  db: Knex,
  { unitId, at, machines }: { unitId: string; at: string; machines: KnownMachine[] },
): Promise<Bed[]> {
  const { policy } = await policyOf(db, unitId, at);
  const stayOfBed = new Map<string, string>();
  for (const stay of await staysKnownAt(db, at)) {
    const place = await placeKnownAt(db, stay.id, at);
    if (place && place.event !== 'left') stayOfBed.set(place.bedId, stay.id);
  }
  const beds: Bed[] = [];
  for (const row of await bedsOfUnit(db, unitId)) {
    const stayId = stayOfBed.get(row.id);
    const machine = machines.find(({ state, bed_id }) => state === 'in-use' && bed_id === row.id);
    beds.push(
      bedBoard({
        place: toPlace(row),
        revision: 0,
        facts: stayId === undefined ? null : await stayFacts(db, stayId, { recordedBy: at }),
        policy,
        assignments: await publishedAssignments(db, { unitId, bedId: row.id, notEndedAt: at, changedBy: at }),
        ventilator: machine ? toVentilatorAtBed(machine) : null,
      }),
    );
  }
  return beds;
}

async function boardHead(
  { db, demonstration }: Deps,
  unit: UnitRow,
): Promise<Pick<Board, 'unit' | 'demonstration' | 'fleet'>> {
  return {
    unit: await toUnit(db, unit),
    demonstration,
    fleet: { ready: await readyInUnit(db, unit.id) },
  };
}

export async function toUnit(db: Knex, { id, name, time_zone, revision }: UnitRow): Promise<Unit> {
  const { policy } = await policyOf(db, id);
  const counts = await bedCounts(db);
  return {
    unitId: id,
    name,
    timeZone: time_zone,
    revision,
    nightFrom: policy.nightFrom,
    nightTo: policy.nightTo,
    bedCount: counts.get(id) ?? 0,
  };
}
