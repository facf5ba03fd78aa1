import { sql } from 'kysely'
import type { Migration } from './migration.ts'

/** Assessments that wait, run, or ended without a record. What each column holds: `tables.ts`. */
export const jobs: Migration = {
  name: 'jobs',
  async up(db, { blob, text }) {
    await sql`create table jobs (
      id ${text} not null primary key, project ${text} not null references projects, state ${text} not null,
      actor ${text} not null, actor_key ${text}, trace_id ${text} not null,
      created_at ${text} not null, started_at ${text}, finished_at ${text},
      attempts integer not null, runner ${text}, done integer not null, caps integer, problem ${text},
      schedule ${blob}, loads ${blob})`.execute(db)
    await sql`create index jobs_by_state on jobs (state, id)`.execute(db)
  },
}
