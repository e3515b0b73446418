import type { Knex } from 'knex';

export async function up(db: Knex): Promise<void> {
  await db.schema.createTable('policies', (table) => {
    table.text('unit_id').notNullable().references('units.id');
    table.integer('version').notNullable();
    table.text('body').notNullable();
    table.text('reason').notNullable();
    table.text('changed_by').references('people.id');
    table.text('changed_at').notNullable();
    table.primary(['unit_id', 'version']);
  });
  for (const act of ['UPDATE', 'DELETE']) {
    await db.raw(
      `CREATE TRIGGER policies_no_${act.toLowerCase()} BEFORE ${act} ON policies BEGIN SELECT RAISE(ABORT, 'policies are kept by version'); END`,
    );
  }
}

export async function down(db: Knex): Promise<void> {
  await db.schema.dropTable('policies');
}
