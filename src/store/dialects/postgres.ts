import { type Dialect, PostgresDialect, sql } from 'kysely'
import { Pool } from 'pg'
import type { Capabilities } from './capabilities.ts'

/** Any number that no other program in the same database locks by. */
const MIGRATION_LOCK = 7_305_921_446

/** Connections to a PostgreSQL server. `report` hears of connections that were lost; the next call makes new ones. */
export function openPostgres(url: string, report: (fault: Error) => void): Pool {
  const pool = new Pool({
    connectionString: url,
    max: 10,
    connectionTimeoutMillis: 5000,
    keepAlive: true,
    application_name: 'kentledge',
  })
  pool.on('error', report)
  // One that is lost in the middle of a transaction, between two queries, would end the process with nobody listening.
  pool.on('connect', (client) => client.on('error', report))
  return pool
}

export const postgresDialect = (pool: Pool): Dialect => new PostgresDialect({ pool })

export const POSTGRES_BEGIN = 'begin'

export const postgresCapabilities: Capabilities = {
  name: 'postgres',
  alone: false,
  blob: sql`bytea`,
  text: sql`text collate "C"`,
  lockMigrations: async (db) => {
    await sql`select pg_advisory_xact_lock(${sql.lit(MIGRATION_LOCK)})`.execute(db)
  },
  lockProject: (db, slug) =>
    db.selectFrom('projects').selectAll().where('slug', '=', slug).forUpdate().executeTakeFirst(),
  immutable: (table) => [
    sql`create or replace function kentledge_refuse() returns trigger language plpgsql as
      $$ begin raise exception 'rows of % are never changed', tg_table_name; end $$`,
    sql`create trigger ${sql.id(`${table}_no_change`)} before update or delete on ${sql.table(table)}
      for each row execute function kentledge_refuse()`,
    sql`create trigger ${sql.id(`${table}_no_truncate`)} before truncate on ${sql.table(table)}
      for each statement execute function kentledge_refuse()`,
  ],
  size: async (db) => {
    const { rows } = await sql<{ size: string }>`select pg_database_size(current_database()) as size`.execute(db)
    return Number(rows[0]!.size)
  },
}
