import type { Kysely, RawBuilder, Transaction } from 'kysely'
import type { Tables } from '../tables.ts'

/** Where the two databases differ, each difference named once. All other SQL is the same. */
export type Capabilities = {
  readonly name: 'sqlite' | 'postgres'
  /** Whether one service alone serves the database: what it left unfinished when it ended is nobody's. */
  readonly alone: boolean
  /** Column type of bytes, and of text that sorts by code points whatever the locale. */
  readonly blob: RawBuilder<unknown>
  readonly text: RawBuilder<unknown>
  /** Holds off other processes that migrate, until the transaction ends. */
  readonly lockMigrations: (db: Transaction<Tables>) => Promise<void>
  /** The row of a project, held until the transaction ends. */
  readonly lockProject: (db: Transaction<Tables>, slug: string) => Promise<Tables['projects'] | undefined>
  /** Statements that make a table refuse UPDATE and DELETE. */
  readonly immutable: (table: string) => readonly RawBuilder<unknown>[]
  /** Bytes that the database takes on disk. */
  readonly size: (db: Kysely<Tables>) => Promise<number>
}
