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

export type AuditScope = { personId: string } | { unitIds: readonly string[]; personId: string } | 'all';

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
      void on.where('audit.person_id', scope.personId);
      if ('unitIds' in scope) void on.orWhereIn('audit.unit_id', [...scope.unitIds]);
    });
  }
  return (await query) as (AuditRow & { display_name: string | null })[];
}
