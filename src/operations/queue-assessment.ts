import { randomUUIDv7 } from 'node:crypto'
import type { Transaction } from 'kysely'
import { addJob } from '../store/jobs.ts'
import type { Tables } from '../store/tables.ts'
import type { Office } from './office.ts'
import type { ScheduleText } from './read-schedule.ts'
import type { Actor } from './rights.ts'
import { type ShownJob, showJob } from './show-job.ts'

/**
 * Puts a schedule in line, to be assessed and kept as a record of the project under an id that is fixed now; its revision is
 * that of the moment when it is completed. `also` is done in the same transaction. Throws `overloaded` where the line is full.
 */
export async function queueAssessment(
  { store, line }: Office,
  project: string,
  actor: Actor,
  traceId: string,
  text: ScheduleText,
  also: (trx: Transaction<Tables>, job: ShownJob) => Promise<void>,
): Promise<void> {
  const id = randomUUIDv7()
  await addJob(store, { id, project, actor, traceId, text }, line.most, async (trx, job) => {
    await line.queue.add(trx, id)
    await also(trx, showJob(job))
  })
  line.queue.wake()
}
