import { sql } from 'kysely'
import type { Migration } from './migration.ts'

/** Indexes of what dashboards ask for: the worst first, and sums from the index alone. */
export const dashboards: Migration = {
  name: 'dashboards',
  async up(db) {
    for (const statement of [
      sql`create index records_by_utilisation on records (coalesce(worst_utilisation, -1), id)`,
      sql`create index records_for_sums on records
        (project, created_at, exceeded, worst_check, worst_utilisation, caps)`,
      sql`drop index checks_by_utilisation`,
      sql`create index checks_by_utilisation on checks (record, check_kind, utilisation, exceeded)`,
    ])
      await statement.execute(db)
  },
}
