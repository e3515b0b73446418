import type { Knex } from 'knex';

const STATES = "('in-use','ready','cleaning','held','on-loan','retired')";

export async function up(db: Knex): Promise<void> {
  await db.schema.createTable('ventilators', (table) => {
    table.text('id').primary();
    table.text('asset_number').notNullable().unique();
    table.text('model').notNullable();
    table.text('class').notNullable();
    table.text('home_unit_id').references('units.id');
    table.text('state').notNullable();
    table.text('unit_id').references('units.id');
    table.text('bed_id').references('beds.id');
    table.text('place_words');
    table.text('since_at').notNullable();
    table.integer('version').notNullable().defaultTo(1);
    table.check("class in ('adult-icu','transport','noninvasive','neonatal')", [], 'ventilators_class_known');
    table.check(`state in ${STATES}`, [], 'ventilators_state_known');
    table.check("(state = 'in-use') = (bed_id is not null)", [], 'ventilators_in_use_at_a_bed');
  });
  // A machine counted at two beds, or two at one, would make the free count wrong.
  await db.raw("CREATE UNIQUE INDEX ventilators_one_per_bed ON ventilators (bed_id) WHERE state = 'in-use'");

  await db.schema.createTable('ventilator_moves', (table) => {
    table.increments('sequence');
    table.text('id').notNullable().unique();
    table.text('ventilator_id').notNullable().references('ventilators.id');
    table.text('from_state').notNullable();
    table.text('to_state').notNullable();
    table.text('unit_id').references('units.id');
    table.text('bed_id').references('beds.id');
    table.text('place_words');
    table.text('note');
    table.text('observed_at').notNullable();
    table.text('recorded_at').notNullable();
    table.text('recorded_by').notNullable().references('people.id');
    table.index(['ventilator_id', 'sequence']);
    table.check(`from_state in ${STATES} and to_state in ${STATES}`, [], 'moves_states_known');
  });
  for (const act of ['UPDATE', 'DELETE']) {
    await db.raw(
      `CREATE TRIGGER ventilator_moves_no_${act.toLowerCase()} BEFORE ${act} ON ventilator_moves BEGIN SELECT RAISE(ABORT, 'moves are append-only'); END`,
    );
  }
}

export async function down(db: Knex): Promise<void> {
  await db.schema.dropTable('ventilator_moves');
  await db.schema.dropTable('ventilators');
}
