import type { Actor } from '../store/actor.ts'
import { type AppendOptions, appendRecord } from '../store/append-record.ts'
import type { RecordRow } from '../store/tables.ts'
import { drafting } from './draft-in-thread.ts'
import type { Office } from './office.ts'
import type { ScheduleText } from './read-schedule.ts'

/**
 * Assesses a schedule in a thread and keeps it as the next record of a project: for requests that wait, and for jobs. A run that
 * fails, or is cancelled by `gone`, takes no revision. Throws the problems of the schedule, of the pool and of the store.
 */
export async function recordAssessment(
  { store, pool }: Office,
  project: string,
  actor: Actor,
  schedule: ScheduleText,
  gone: AbortSignal,
  options: AppendOptions = {},
): Promise<RecordRow> {
  const draft = await pool.run(drafting, schedule, gone)
  return appendRecord(store, project, actor, draft, options)
}
