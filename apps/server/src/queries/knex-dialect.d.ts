/** Knex ships its dialect without types; all we say of it is what it extends. */
declare module 'knex/lib/dialects/better-sqlite3/index.js' {
  import { Knex } from 'knex';

  export default class BetterSqliteClient extends Knex.Client {}
}
