import type { Knex } from 'knex';

export async function up(db: Knex): Promise<void> {
  // Where each stay is now: derived from its 'place' facts, kept for look-ups and for the one-stay-a-bed rule.
  await db.schema.createTable('stays', (table) => {
    table.text('id').primary();
    table.text('unit_id').notNullable().references('units.id');
    table.text('bed_id').references('beds.id');
    table.text('hospital_number').notNullable();
    table.text('admitted_at').notNullable();
    table.text('left_at');
    table.text('outcome');
    // When the board learnt of the stay and of its end: a look back asks who was there by these.
    table.text('recorded_at').notNullable();
    table.text('left_recorded_at');
    table.integer('version').notNullable().defaultTo(1);
    table.index(['left_recorded_at', 'recorded_at']);
    table.check('(left_at is null) = (bed_id is not null)', [], 'stays_bed_until_left');
  });
  await db.raw('CREATE UNIQUE INDEX stays_one_per_bed ON stays (bed_id) WHERE left_at IS NULL');
  await db.raw('CREATE UNIQUE INDEX stays_one_per_patient ON stays (hospital_number) WHERE left_at IS NULL');

  await db.schema.createTable('observations', (table) => {
    table.increments('sequence');
    table.text('id').notNullable().unique();
    table.text('stay_id').notNullable().references('stays.id');
    table.text('unit_id').notNullable().references('units.id');
    table.text('kind').notNullable();
    table.text('observed_at').notNullable();
    table.text('recorded_at').notNullable();
    table.text('recorded_by').notNullable().references('people.id');
    table.text('source').notNullable();
    // What the patient breathes with from this fact on, where it says so (checks, extubations).
    table.text('support');
    // One amendment amends one fact, and each fact is amended once: the next mend amends the amendment.
    table.text('amends_id').unique().references('observations.id');
    table.text('amended_as');
    table.text('reason');
    table.text('body').notNullable();
    table.check(
      "kind in ('details','place','check','gas','airway','airway-check','happening','acknowledgement','infection-sign')",
      [],
      'observations_kind_known',
    );
    table.check("source in ('hand','feed','import')", [], 'observations_source_known');
    table.check(
      "(amends_id is null and amended_as is null and reason is null) or (amends_id is not null and amended_as in ('corrected','struck') and length(reason) >= 3)",
      [],
      'observations_amended_with_reason',
    );
    table.index(['stay_id', 'kind', 'observed_at', 'sequence'], 'observations_by_kind');
    table.index(['stay_id', 'observed_at', 'sequence'], 'observations_by_time');
  });
  for (const act of ['UPDATE', 'DELETE']) {
    await db.raw(
      `CREATE TRIGGER observations_no_${act.toLowerCase()} BEFORE ${act} ON observations BEGIN SELECT RAISE(ABORT, 'observations are append-only'); END`,
    );
  }
}

export async function down(db: Knex): Promise<void> {
  await db.schema.dropTable('observations');
  await db.schema.dropTable('stays');
}
