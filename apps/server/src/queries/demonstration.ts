import type { Knex } from 'knex';

/** Whether this record is the invented hospital. It stays so whatever the settings say later. */
export async function isDemonstration(db: Knex): Promise<boolean> {
  return (await db('demonstration').first()) !== undefined;
}

export async function markDemonstration(db: Knex, filledAt: string): Promise<void> {
  await db('demonstration').insert({ filled_at: filledAt });
}
