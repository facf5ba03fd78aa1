import { type Kysely, sql } from 'kysely'
import type { Capabilities } from '../dialects/capabilities.ts'
import type { Tables } from '../tables.ts'
import { migrations } from './list.ts'

/**
 * Brings the database to the version of this program, in one transaction. Throws when the database is newer: this program
 * would not know what it must keep.
 */
export async function migrate(db: Kysely<Tables>, capabilities: Capabilities, now: Date): Promise<void> {
  await db.transaction().execute(async (trx) => {
    await capabilities.lockMigrations(trx)
    await sql`create table if not exists schema_versions
      (version integer not null primary key, name text not null, applied_at text not null)`.execute(trx)
    const { version } = (await trx
      .selectFrom('schema_versions')
      .select(({ fn }) => fn.max('version').as('version'))
      .executeTakeFirst()) ?? { version: null }
    const found = version ?? 0
    if (found > migrations.length)
      throw new Error(
        `The database has version ${found}; this program knows versions up to ${migrations.length}. Run the newer program, or restore a backup from before the upgrade.`,
      )
    for (const [index, { name, up }] of migrations.entries()) {
      if (index < found) continue
      await up(trx, capabilities)
      await trx
        .insertInto('schema_versions')
        .values({ version: index + 1, name, applied_at: now.toISOString() })
        .execute()
    }
  })
}
