import type { Knex } from 'knex';

/** Rows that every request may add or change by being a request: refusals are audited, sessions renewed. */
const KEPT_BY_REQUESTS = ['audit', 'sessions'];

export type Stored = Record<string, number>;

/** How many rows each table holds. A refusal is held against it: nothing was stored, whatever was sent. */
export async function stored(db: Knex): Promise<Stored> {
  const tables: { name: string }[] = await db('sqlite_master')
    .select('name')
    .where({ type: 'table' })
    .whereNot('name', 'like', 'sqlite_%')
    .whereNot('name', 'like', 'knex_%')
    .orderBy('name');
  const counts = tables.map(({ name }) => `(select count(*) from "${name}") as "${name}"`);
  const [row]: Stored[] = await db.raw(`select ${counts.join(', ')}`);
  return row ?? {};
}

/** The same without the tables that the asking itself writes to. */
export async function storedBesidesAsking(db: Knex): Promise<Stored> {
  const counts = await stored(db);
  return Object.fromEntries(Object.entries(counts).filter(([name]) => !KEPT_BY_REQUESTS.includes(name)));
}
