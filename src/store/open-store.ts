import { mkdirSync } from 'node:fs'
import { join } from 'node:path'
import { Kysely } from 'kysely'
import type { Capabilities } from './dialects/capabilities.ts'
import { openPostgres, POSTGRES_BEGIN, postgresCapabilities, postgresDialect } from './dialects/postgres.ts'
import { openSqlite, SQLITE_BEGIN, sqliteCapabilities, sqliteDialect } from './dialects/sqlite.ts'
import { type Watch, watched } from './dialects/watched.ts'
import { migrate } from './migrations/migrate.ts'
import type { Tables } from './tables.ts'

export type Store = {
  /** For transactions and whatever writes. */
  readonly db: Kysely<Tables>
  /** For reading alone: on SQLite a connection of its own, so that a page is read while a record is written. */
  readonly reader: Kysely<Tables>
  readonly capabilities: Capabilities
  /** The address of its server, for those that need connections of their own. */
  readonly url: string | undefined
  readonly clock: () => Date
  readonly close: () => Promise<void>
}

export type StoreOptions = {
  /** The address of a PostgreSQL server; left out, SQLite. */
  readonly url?: string
  /** Folder of the SQLite file; left out, the store lives in memory and ends with the process. */
  readonly folder?: string
  readonly clock?: () => Date
  readonly watch?: Watch
  /** Hears of connections to PostgreSQL that were lost while idle. */
  readonly report?: (fault: Error) => void
}

export const FILE = 'kentledge.sqlite'

function connect({ url, folder, watch = () => undefined, report = () => undefined }: StoreOptions) {
  if (url) {
    const db = new Kysely<Tables>({
      dialect: watched(postgresDialect(openPostgres(url, report)), POSTGRES_BEGIN, watch),
    })
    return { db, reader: db, capabilities: postgresCapabilities }
  }
  if (folder) mkdirSync(folder, { recursive: true })
  const path = folder ? join(folder, FILE) : ':memory:'
  const open = () => new Kysely<Tables>({ dialect: watched(sqliteDialect(openSqlite(path)), SQLITE_BEGIN, watch) })
  const db = open()
  return { db, reader: folder ? open() : db, capabilities: sqliteCapabilities }
}

/** Opens the store and brings it to this program's version. Throws when it cannot be opened, or is newer than the program. */
export async function openStore(options: StoreOptions = {}): Promise<Store> {
  const { db, reader, capabilities } = connect(options)
  const clock = options.clock ?? (() => new Date())
  const close = async () => {
    if (reader !== db) await reader.destroy()
    await db.destroy()
  }
  try {
    await migrate(db, capabilities, clock())
  } catch (fault) {
    await close()
    throw fault
  }
  return { db, reader, capabilities, url: options.url, clock, close }
}
