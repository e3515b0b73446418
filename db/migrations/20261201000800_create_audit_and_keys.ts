import type { Knex } from 'knex';

export async function up(db: Knex): Promise<void> {
  await db.schema.createTable('audit', (table) => {
    table.increments('id');
    table.text('at').notNullable();
    table.text('person_id').references('people.id');
    table.text('act').notNullable();
    table.text('unit_id').references('units.id');
    table.text('subject');
    table.text('outcome').notNullable();
    table.check("outcome in ('done','refused')", [], 'audit_outcome_known');
    table.index(['person_id', 'id']);
    table.index(['unit_id', 'id']);
  });
  for (const act of ['UPDATE', 'DELETE']) {
    await db.raw(
      `CREATE TRIGGER audit_no_${act.toLowerCase()} BEFORE ${act} ON audit BEGIN SELECT RAISE(ABORT, 'the audit trail is append-only'); END`,
    );
  }
  // The first answer to each write, so that a retry is answered and not done again.
  await db.schema.createTable('idempotency_keys', (table) => {
    table.text('person_id').notNullable().references('people.id');
    table.text('key').notNullable();
    table.text('request_hash').notNullable();
    table.integer('status').notNullable();
    table.text('response').notNullable();
    table.text('created_at').notNullable();
    table.primary(['person_id', 'key']);
    table.index(['created_at']);
  });
}

export async function down(db: Knex): Promise<void> {
  await db.schema.dropTable('idempotency_keys');
  await db.schema.dropTable('audit');
}
