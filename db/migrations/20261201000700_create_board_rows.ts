import type { Knex } from 'knex';

/** What each bed shows, ready to send: derived from the facts, and always to be had from them again. */
export async function up(db: Knex): Promise<void> {
  await db.schema.createTable('board_rows', (table) => {
    table.text('bed_id').primary().references('beds.id');
    table.text('unit_id').notNullable().references('units.id');
    table.integer('revision').notNullable();
    table.text('row').notNullable();
    table.index(['unit_id']);
  });
}

export async function down(db: Knex): Promise<void> {
  await db.schema.dropTable('board_rows');
}
