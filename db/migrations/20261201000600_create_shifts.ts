import type { Knex } from 'knex';

export async function up(db: Knex): Promise<void> {
  await db.schema.createTable('shifts', (table) => {
    table.text('id').primary();
    table.text('unit_id').notNullable().references('units.id');
    table.text('name').notNullable();
    table.text('starts_at').notNullable();
    table.text('ends_at').notNullable();
    table.text('made_by').references('people.id');
    table.index(['unit_id', 'starts_at']);
    table.check('ends_at > starts_at', [], 'shifts_end_after_start');
  });
  await db.schema.createTable('shift_people', (table) => {
    table.text('shift_id').notNullable().references('shifts.id');
    table.text('person_id').notNullable().references('people.id');
    table.integer('minutes_available').notNullable();
    table.primary(['shift_id', 'person_id']);
  });
  // Every version of a shift's assignment, whole; the newest published one is what the beds show.
  await db.schema.createTable('assignments', (table) => {
    table.text('shift_id').notNullable().references('shifts.id');
    table.integer('version').notNullable();
    table.boolean('published').notNullable();
    table.text('places').notNullable();
    table.text('changed_by').references('people.id');
    table.text('changed_at').notNullable();
    table.primary(['shift_id', 'version']);
  });
  for (const act of ['UPDATE', 'DELETE']) {
    await db.raw(
      `CREATE TRIGGER assignments_no_${act.toLowerCase()} BEFORE ${act} ON assignments BEGIN SELECT RAISE(ABORT, 'assignments are kept by version'); END`,
    );
  }
}

export async function down(db: Knex): Promise<void> {
  await db.schema.dropTable('assignments');
  await db.schema.dropTable('shift_people');
  await db.schema.dropTable('shifts');
}
