import type { Knex } from 'knex';

export async function up(db: Knex): Promise<void> {
  // What the record is: at most one row, written when the demonstration is filled in.
  await db.schema.createTable('demonstration', (table) => {
    table.text('filled_at').notNullable();
  });
  await db.schema.createTable('units', (table) => {
    table.text('id').primary();
    table.text('name').notNullable().unique();
    table.text('time_zone').notNullable();
    // The unit's live sequence: one more for each bed that changes. Screens count on it having no gaps.
    table.integer('revision').notNullable().defaultTo(0);
  });
  await db.schema.createTable('beds', (table) => {
    table.text('id').primary();
    table.text('unit_id').notNullable().references('units.id');
    table.text('label').notNullable();
    table.integer('row').notNullable();
    table.integer('column').notNullable();
    table.boolean('is_open').notNullable().defaultTo(true);
    table.unique(['unit_id', 'label']);
    table.unique(['unit_id', 'row', 'column']);
  });
}

export async function down(db: Knex): Promise<void> {
  await db.schema.dropTable('beds');
  await db.schema.dropTable('units');
  await db.schema.dropTable('demonstration');
}
