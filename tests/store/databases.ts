import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { sql } from 'kysely'
import { afterAll } from 'vitest'
import { openStore, type Store, type StoreOptions } from '../../src/store/open-store.ts'
import { type PostgresServer, startPostgres } from './postgres-server.ts'

/** Both databases for real: SQLite in a file, PostgreSQL as a server of its own. Each store that a test opens is empty. */
export type Database = {
  readonly name: 'sqlite' | 'postgres'
  /** Where an empty store lies: for `openStore`, and as the settings of a service. */
  readonly place: () => Promise<Place>
  /** Takes the database away, as a read-only disk or a lost server does; what is returned brings it back. */
  readonly breakDown: (store: Store) => Promise<() => Promise<unknown>>
}
export type Place = { readonly options: StoreOptions; readonly env: Readonly<Record<string, string>> }

const folders: string[] = []
function folder(): string {
  const made = mkdtempSync(join(tmpdir(), 'kentledge-store-'))
  folders.push(made)
  return made
}

let server: Promise<PostgresServer> | undefined
const databases: readonly Database[] = [
  {
    name: 'sqlite',
    place: async () => {
      const made = folder()
      return { options: { folder: made }, env: { DATA_DIR: made } }
    },
    breakDown: async (store) => {
      await sql`pragma query_only = on`.execute(store.db)
      return () => sql`pragma query_only = off`.execute(store.db)
    },
  },
  {
    name: 'postgres',
    place: async () => {
      server ??= startPostgres()
      const url = await (await server).database()
      return { options: { url }, env: { DATABASE_URL: url } }
    },
    breakDown: async (store) => {
      const { rows } = await sql<{ name: string }>`select current_database() as name`.execute(store.db)
      const { server: running } = await server!
      const client = running.getPgClient()
      await client.connect()
      const allow = (yes: boolean) => client.query(`alter database ${rows[0]!.name} allow_connections ${yes}`)
      await allow(false)
      await client.query('select pg_terminate_backend(pid) from pg_stat_activity where datname = $1', [rows[0]!.name])
      return () => allow(true).then(() => client.end())
    },
  },
]

/** The databases of a test file; its server and folders go when the file is through. */
export function bothDatabases(): readonly Database[] {
  afterAll(async () => {
    await (await server)?.stop()
    for (const made of folders.splice(0)) rmSync(made, { recursive: true, force: true })
  }, 60_000)
  return databases
}

const open: Store[] = []
/** Opens an empty store. `closeStores` after each test. */
export async function emptyStore(database: Database, more: StoreOptions = {}): Promise<Store> {
  const store = await openStore({ ...(await database.place()).options, ...more })
  open.push(store)
  return store
}
export async function closeStores(): Promise<void> {
  for (const store of open.splice(0)) await store.close()
}
