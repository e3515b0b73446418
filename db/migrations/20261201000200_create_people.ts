import type { Knex } from 'knex';

export async function up(db: Knex): Promise<void> {
  await db.schema.createTable('people', (table) => {
    table.text('id').primary();
    table.text('username').notNullable().unique();
    table.text('display_name').notNullable();
    table.text('initials').notNullable();
    table.text('password_hash').notNullable();
    table.text('disabled_at');
    table.integer('version').notNullable().defaultTo(1);
  });
  await db.schema.createTable('grants', (table) => {
    table.increments('id');
    table.text('person_id').notNullable().references('people.id');
    table.text('role').notNullable();
    table.text('unit_id').references('units.id');
    table.unique(['person_id', 'role', 'unit_id']);
    table.check(
      "role in ('therapist','charge','supervisor','clinician','biomedical','administrator','display')",
      [],
      'grants_role_known',
    );
  });
  await db.schema.createTable('sessions', (table) => {
    table.text('id').primary();
    table.text('person_id').notNullable().references('people.id').onDelete('CASCADE');
    table.text('expires_at').notNullable();
    // Whatever the renewals, a session ends here.
    table.text('ends_at').notNullable();
    table.index(['person_id']);
    table.index(['expires_at']);
  });
}

export async function down(db: Knex): Promise<void> {
  await db.schema.dropTable('sessions');
  await db.schema.dropTable('grants');
  await db.schema.dropTable('people');
}
