import { Policy } from '@windrow/ventilation/policy/policy';
import type { Knex } from 'knex';

type PolicyRow = {
  unit_id: string;
  version: number;
  body: string;
  reason: string;
  changed_by: string | null;
  changed_at: string;
};
export type StoredPolicy = {
  unitId: string;
  version: number;
  policy: Policy;
  reason: string;
  changedBy: string | null;
  changedAt: string;
};

/** A unit's policy now, or as it stood at an instant. */
export async function policyOf(db: Knex, unitId: string, at?: string): Promise<StoredPolicy> {
  const query = db<PolicyRow>('policies').where({ unit_id: unitId }).orderBy('version', 'desc');
  const row =
    (await (at === undefined ? query.first() : query.clone().where('changed_at', '<=', at).first())) ??
    (await db<PolicyRow>('policies').where({ unit_id: unitId }).orderBy('version').first());
  if (!row) throw new Error(`unit ${unitId} has no policy`);
  return {
    unitId,
    version: row.version,
    policy: Policy.parse(JSON.parse(row.body)),
    reason: row.reason,
    changedBy: row.changed_by,
    changedAt: row.changed_at,
  };
}

export async function insertPolicy(
  db: Knex,
  { unitId, version, policy, reason, changedBy, changedAt }: StoredPolicy,
): Promise<void> {
  await db<PolicyRow>('policies').insert({
    unit_id: unitId,
    version,
    body: JSON.stringify(policy),
    reason,
    changed_by: changedBy,
    changed_at: changedAt,
  });
}
