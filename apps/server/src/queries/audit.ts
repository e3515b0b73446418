import type { Knex } from 'knex';

export type AuditRow = {
  id: number;
  at: string;
  person_id: string | null;
  act: string;
  unit_id: string | null;
  subject: string | null;
  outcome: 'done' | 'refused';
};

export async function insertAudit(db: Knex, row: Omit<AuditRow, 'id'>): Promise<void> {
  await db<AuditRow>('audit').insert(row);
}

/** Who last did this to a thing, and when. */
export async function lastActOn(db: Knex, { act, subject }: { act: string; subject: string }) {
  const row: { at: string; display_name: string } | undefined = await db<AuditRow>('audit')
    .join('people', 'people.id', 'audit.person_id')
    .select('audit.at', 'people.display_name')
    .where({ 'audit.act': act, 'audit.subject': subject, 'audit.outcome': 'done' })
    .orderBy('audit.id', 'desc')
    .first();
  return row ?? null;
}

/** Own acts and those in some units, or everything. */
export type AuditScope = { personId: string; unitIds: readonly string[] } | 'all';

export async function auditPage(
  db: Knex,
  { scope, limit, before }: { scope: AuditScope; limit: number; before: number | null },
) {
  const query = db<AuditRow>('audit')
    .leftJoin('people', 'people.id', 'audit.person_id')
    .select(
      'audit.id',
      'audit.at',
      'audit.person_id',
      'audit.act',
      'audit.unit_id',
      'audit.subject',
      'audit.outcome',
      'people.display_name',
    )
    .orderBy('audit.id', 'desc')
    .limit(limit);
  if (before !== null) void query.where('audit.id', '<', before);
  if (scope !== 'all') {
    void query.where((on) => {
      void on.where('audit.person_id', scope.personId).orWhereIn('audit.unit_id', [...scope.unitIds]);
    });
  }
  return (await query) as (AuditRow & { display_name: string | null })[];
}
