import type { Actor } from '../store/actor.ts'
import { type AppendOptions, appendRecord } from '../store/append-record.ts'
import type { RecordRow } from '../store/tables.ts'
import { type DraftTask, drafting, type Progress } from './draft-in-thread.ts'
import type { Office } from './office.ts'

export type RecordOptions = AppendOptions & { readonly told?: (progress: Progress) => void }

/**
 * Assesses a schedule in a thread and keeps it as the next record of a project: for requests that wait, and for jobs. A run that
 * fails, or is cancelled by `gone`, takes no revision. Throws the problems of the schedule, of the pool and of the store.
 */
export async function recordAssessment(
  { store, pool }: Pick<Office, 'store' | 'pool'>,
  project: string,
  actor: Pick<Actor, 'name' | 'key'>,
  schedule: DraftTask,
  gone: AbortSignal,
  { told, ...options }: RecordOptions = {},
): Promise<RecordRow> {
  const draft = await pool.run(drafting, schedule, gone, told && ((message) => told(message as Progress)))
  return appendRecord(store, project, actor, draft, options)
}
