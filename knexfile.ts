import type { Knex } from 'knex';
import { migrationSource } from './db/migration-source.ts';

/** For the Knex command line (`npm run db -- migrate:latest`); the server opens its own in queries/database.ts. */
const config: Knex.Config = {
  client: 'better-sqlite3',
  connection: { filename: process.env.WINDROW_DATABASE ?? 'db/data/windrow.sqlite3' },
  useNullAsDefault: true,
  migrations: { migrationSource },
};

export default config;
