import type { Knex } from 'knex';
import * as createUnits from './migrations/20261201000100_create_units.ts';
import * as createPeople from './migrations/20261201000200_create_people.ts';
import * as createPolicies from './migrations/20261201000300_create_policies.ts';
import * as createObservations from './migrations/20261201000400_create_observations.ts';
import * as createVentilators from './migrations/20261201000500_create_ventilators.ts';
import * as createShifts from './migrations/20261201000600_create_shifts.ts';
import * as createBoardRows from './migrations/20261201000700_create_board_rows.ts';
import * as createAuditAndKeys from './migrations/20261201000800_create_audit_and_keys.ts';

/**
 * Every migration in order. Named here, not found on disk, so that the server's bundle, the tests and
 * the command line record the same names: two ways of naming them corrupt the migration table.
 */
const MIGRATIONS: Record<string, Knex.Migration> = {
  '20261201000100_create_units': createUnits,
  '20261201000200_create_people': createPeople,
  '20261201000300_create_policies': createPolicies,
  '20261201000400_create_observations': createObservations,
  '20261201000500_create_ventilators': createVentilators,
  '20261201000600_create_shifts': createShifts,
  '20261201000700_create_board_rows': createBoardRows,
  '20261201000800_create_audit_and_keys': createAuditAndKeys,
};

export const migrationSource: Knex.MigrationSource<string> = {
  getMigrations: async () => Object.keys(MIGRATIONS).sort(),
  getMigrationName: (name) => name,
  getMigration: async (name) => {
    const migration = MIGRATIONS[name];
    if (!migration) throw new Error(`there is no migration ${name}`);
    return migration;
  },
};
