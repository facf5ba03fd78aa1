import { DatabaseSync, type SQLInputValue, type StatementSync } from 'node:sqlite'
import { type Dialect, type SqliteDatabase, SqliteDialect, sql } from 'kysely'
import type { Capabilities } from './capabilities.ts'

/** How long a call waits for another process that writes (the commands for keys and backups), ms. It holds up the event loop. */
const BUSY = 2000
/** Statements kept ready. Their texts are few: rows go in chunks of fixed sizes. */
const KEPT = 300

/**
 * A connection to one file, or to memory (`:memory:`). A commit is on the disk when it returns: WAL alone would lose the last
 * ones at a power failure. Throws when the connection is not set so.
 */
export function openSqlite(path: string, options: { readonly readOnly?: boolean } = {}): DatabaseSync {
  const db = new DatabaseSync(path, { timeout: BUSY, enableForeignKeyConstraints: true, ...options })
  if (!options.readOnly) db.exec('pragma journal_mode = wal')
  db.exec('pragma synchronous = full; pragma cache_size = -32000')
  const { synchronous } = db.prepare('pragma synchronous').get() as { synchronous: number }
  if (synchronous !== 2) throw new Error(`SQLite runs with synchronous = ${synchronous}; 2 is needed`)
  return db
}

/** The face of a connection that kysely asks for. */
function kyselyFace(db: DatabaseSync): SqliteDatabase {
  const kept = new Map<string, StatementSync>()
  const prepared = (text: string): StatementSync => {
    const found = kept.get(text)
    if (found) return found
    const made = db.prepare(text)
    if (kept.size >= KEPT) kept.delete(kept.keys().next().value!)
    kept.set(text, made)
    return made
  }
  return {
    close: () => {
      kept.clear()
      db.close()
    },
    prepare: (text) => {
      const statement = prepared(text)
      const values = (given: readonly unknown[]) => given as readonly SQLInputValue[]
      return {
        reader: statement.columns().length > 0,
        all: (given) => statement.all(...values(given)),
        run: (given) => statement.run(...values(given)),
        iterate: (given) => statement.iterate(...values(given)),
      }
    },
  }
}

export const sqliteDialect = (db: DatabaseSync): Dialect => new SqliteDialect({ database: kyselyFace(db) })

/** Takes the lock of writers at once: a transaction that began by reading could not wait for it. */
export const SQLITE_BEGIN = 'begin immediate'

const refusal = (table: string, event: string) => {
  const name = sql.id(`${table}_no_${event}`)
  const said = sql.lit(`rows of ${table} are never changed`)
  return sql`create trigger ${name} before ${sql.raw(event)} on ${sql.table(table)} begin select raise(abort, ${said}); end`
}

export const sqliteCapabilities: Capabilities = {
  name: 'sqlite',
  alone: true,
  blob: sql`blob`,
  text: sql`text`,
  // One writer at a time, from `begin immediate` on.
  lockMigrations: async () => undefined,
  lockProject: (db, slug) => db.selectFrom('projects').selectAll().where('slug', '=', slug).executeTakeFirst(),
  immutable: (table) => ['update', 'delete'].map((event) => refusal(table, event)),
  size: async (db) => {
    const pages = await sql<{ page_count: number }>`pragma page_count`.execute(db)
    const page = await sql<{ page_size: number }>`pragma page_size`.execute(db)
    return pages.rows[0]!.page_count * page.rows[0]!.page_size
  },
}
