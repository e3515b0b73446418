import {
  CHECKS_WINDOW_MINUTES,
  NOTHING_ACKNOWLEDGED,
  type Stamped,
  type StayFacts,
} from '@windrow/ventilation/board/facts';
import {
  type Acknowledgement,
  type Airway,
  type AirwayCheck,
  type Check,
  type Gas,
  HAPPENING_KINDS,
  type Happening,
} from '@windrow/ventilation/contract/observations';
import type { StayDetails } from '@windrow/ventilation/contract/stays';
import type { SupportId } from '@windrow/ventilation/support/catalogue';
import type { Knex } from 'knex';
import type { ObservationRow } from './observations.ts';

/** Enough for a cuff and a depth that were not looked at each time. */
const AIRWAY_CHECKS = 20;

type FactRow = ObservationRow & { initials: string };

/** Where a stay is, or how it ended: its 'place' facts. */
export type Place =
  | { event: 'admitted' | 'transferred'; bedId: string; unitId: string }
  | { event: 'left'; outcome: string };

/** What a reader may know: everything, or only what was recorded by an instant (look back). */
export type Known = { recordedBy?: string };

/**
 * The facts of a stay that hold and can touch its board row, read kind by kind along one index each,
 * so that the cost does not grow with the stay.
 */
export async function stayFacts(db: Knex, stayId: string, known: Known = {}): Promise<StayFacts | null> {
  const kind = <Body>(name: ObservationRow['kind'], limit: number) =>
    newest<Body>(db, { stayId, kind: name, limit, known });
  const [details] = await kind<StayDetails>('details', 1);
  if (!details) return null;
  const [gas] = await kind<Gas>('gas', 1);
  const [airway] = await kind<Airway>('airway', 1);
  return {
    stayId,
    version: await versionOf(db, stayId, known),
    admittedAt: await admittedAt(db, stayId, known),
    details: details.body,
    checks: await recentChecks(db, stayId, known),
    gas: gas ?? null,
    airway: airway ?? null,
    airwayChecks: await kind<AirwayCheck>('airway-check', AIRWAY_CHECKS),
    happenings: await latestHappenings(db, stayId, known),
    support: await supportNow(db, stayId, known),
    ...(await acknowledged(db, stayId, known)),
  };
}

/** Holds: was neither corrected nor struck by anything known, and is not itself a strike. */
function holding(db: Knex, stayId: string, { recordedBy }: Known) {
  const query = db<ObservationRow>('observations')
    .where('observations.stay_id', stayId)
    .where((on) => on.whereNull('observations.amended_as').orWhere('observations.amended_as', 'corrected'))
    .whereNotExists((later) => {
      void later
        .from({ later: 'observations' })
        .select(db.raw('1'))
        .whereRaw('later.amends_id = observations.id');
      if (recordedBy !== undefined) void later.where('later.recorded_at', '<=', recordedBy);
    });
  if (recordedBy !== undefined) void query.where('observations.recorded_at', '<=', recordedBy);
  return query;
}

function newestFirst(query: ReturnType<typeof holding>) {
  return query
    .join('people', 'people.id', 'observations.recorded_by')
    .select<FactRow[]>('observations.*', 'people.initials')
    .orderBy([
      { column: 'observations.observed_at', order: 'desc' },
      { column: 'observations.sequence', order: 'desc' },
    ]);
}

async function newest<Body>(
  db: Knex,
  {
    stayId,
    kind,
    limit,
    known,
  }: { stayId: string; kind: ObservationRow['kind']; limit: number; known: Known },
): Promise<Stamped<Body>[]> {
  const rows: FactRow[] = await newestFirst(
    holding(db, stayId, known).where('observations.kind', kind),
  ).limit(limit);
  return rows.map((row) => stamped<Body>(row));
}

/** Every fact of a kind that holds, oldest first. Grows with the stay: for what is computed on request only. */
export async function allFacts<Body>(
  db: Knex,
  { stayId, kind }: { stayId: string; kind: ObservationRow['kind'] },
): Promise<Stamped<Body>[]> {
  const rows: FactRow[] = await newestFirst(holding(db, stayId, {}).where('observations.kind', kind));
  return rows.map((row) => stamped<Body>(row)).reverse();
}

/** The latest check, and those in the window before it that a gas may have to be held against. */
async function recentChecks(db: Knex, stayId: string, known: Known): Promise<Stamped<Check>[]> {
  const [latest] = await newest<Check>(db, { stayId, kind: 'check', limit: 1, known });
  if (!latest) return [];
  const from = new Date(Date.parse(latest.observedAt) - CHECKS_WINDOW_MINUTES * 60_000).toISOString();
  const rows: FactRow[] = await newestFirst(
    holding(db, stayId, known)
      .where('observations.kind', 'check')
      .where('observations.observed_at', '>=', from),
  ).limit(200);
  return rows.map((row) => stamped<Check>(row));
}

/** The newest of each kind of happening, newest first. The kinds are few, and stand in the body. */
async function latestHappenings(db: Knex, stayId: string, known: Known): Promise<Stamped<Happening>[]> {
  const rows: FactRow[] = await newestFirst(
    holding(db, stayId, known).where('observations.kind', 'happening'),
  ).limit(200);
  const latest = new Map<string, Stamped<Happening>>();
  for (const row of rows) {
    const fact = stamped<Happening>(row);
    if (!latest.has(fact.body.kind)) latest.set(fact.body.kind, fact);
    if (latest.size === Object.keys(HAPPENING_KINDS).length) break;
  }
  return [...latest.values()];
}

/** How far back the facts are read by which an acknowledgement is seen to have held: a month of checks. */
const SINCE_ACKNOWLEDGED = 200;

/** The newest acknowledgement of each flag; only where there is one, the facts that came in since. */
async function acknowledged(
  db: Knex,
  stayId: string,
  known: Known,
): Promise<Pick<StayFacts, 'acknowledgements' | 'sinceAcknowledged'>> {
  const kind = <Body>(name: ObservationRow['kind']) =>
    newest<Body>(db, { stayId, kind: name, limit: SINCE_ACKNOWLEDGED, known });
  const all = await kind<Acknowledgement>('acknowledgement');
  if (all.length === 0) return NOTHING_ACKNOWLEDGED;
  const latest = new Map<string, Stamped<Acknowledgement>>();
  // The one that was recorded last counts, whenever it is said to have been made.
  for (const one of all.toSorted((a, b) => a.recordedAt.localeCompare(b.recordedAt)))
    latest.set(one.body.flagId, one);
  return {
    acknowledgements: [...latest.values()],
    sinceAcknowledged: {
      checks: await kind<Check>('check'),
      gases: await kind<Gas>('gas'),
      airwayChecks: await kind<AirwayCheck>('airway-check'),
    },
  };
}

async function supportNow(db: Knex, stayId: string, known: Known): Promise<StayFacts['support']> {
  const telling = () => holding(db, stayId, known).whereNotNull('observations.support');
  const [latest]: FactRow[] = await newestFirst(telling()).limit(1);
  if (!latest?.support) return null;
  const [other]: FactRow[] = await newestFirst(
    telling().whereNot('observations.support', latest.support),
  ).limit(1);
  const since = await telling()
    .where('observations.support', latest.support)
    .where('observations.observed_at', other ? '>' : '>=', other?.observed_at ?? '')
    .min<{ since: string | null }[]>({ since: 'observations.observed_at' });
  // The catalogue's ids never change, so what was stored as one still is.
  return {
    id: latest.support as SupportId,
    observedAt: latest.observed_at,
    sinceAt: since[0]?.since ?? latest.observed_at,
  };
}

async function admittedAt(db: Knex, stayId: string, known: Known): Promise<string> {
  const row = await holding(db, stayId, known)
    .where('observations.kind', 'place')
    .min<{ at: string | null }[]>({ at: 'observations.observed_at' });
  return row[0]?.at ?? '';
}

/** Versions count the facts about identity and place, so a look back has the version of its time. */
async function versionOf(db: Knex, stayId: string, { recordedBy }: Known): Promise<number> {
  const query = db<ObservationRow>('observations')
    .where({ stay_id: stayId })
    .whereIn('kind', ['details', 'place']);
  if (recordedBy !== undefined) void query.where('recorded_at', '<=', recordedBy);
  const row = await query.count<{ n: number }[]>({ n: '*' });
  // Admission writes two facts, and is version 1.
  return Number(row[0]?.n ?? 2) - 1;
}

/** Where a stay was last placed, by what had been recorded at an instant. */
export async function placeKnownAt(db: Knex, stayId: string, recordedBy: string): Promise<Place | null> {
  const row = await db<ObservationRow>('observations')
    .where({ stay_id: stayId, kind: 'place' })
    .where('recorded_at', '<=', recordedBy)
    .orderBy('sequence', 'desc')
    .first();
  return row ? JSON.parse(row.body) : null;
}

function stamped<Body>(row: FactRow): Stamped<Body> {
  return {
    observationId: row.id,
    observedAt: row.observed_at,
    recordedAt: row.recorded_at,
    recordedByInitials: row.initials,
    body: JSON.parse(row.body),
  };
}
