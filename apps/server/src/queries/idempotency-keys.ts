import type { Knex } from 'knex';

type KeyRow = {
  person_id: string;
  key: string;
  request_hash: string;
  status: number;
  response: string;
  created_at: string;
};

export async function answerForKey(
  db: Knex,
  { personId, key }: { personId: string; key: string },
): Promise<KeyRow | null> {
  return (await db<KeyRow>('idempotency_keys').where({ person_id: personId, key }).first()) ?? null;
}

export async function insertKey(db: Knex, row: KeyRow): Promise<void> {
  await db<KeyRow>('idempotency_keys').insert(row);
}

/** Keys live longer than any tablet keeps an unsent entry; then they only take room. */
export async function deleteKeysBefore(db: Knex, instant: string): Promise<void> {
  await db<KeyRow>('idempotency_keys').where('created_at', '<', instant).delete();
}
