import type { Transaction } from 'kysely'
import type { Capabilities } from '../dialects/capabilities.ts'
import type { Tables } from '../tables.ts'

/** One step of the database from version n - 1 to n. Once released it is never changed. */
export type Migration = {
  readonly name: string
  readonly up: (db: Transaction<Tables>, capabilities: Capabilities) => Promise<void>
}
