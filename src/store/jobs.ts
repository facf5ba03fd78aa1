import { randomUUID } from 'node:crypto'
import type { Transaction } from 'kysely'
import { Problem } from '../errors.ts'
import type { Actor } from './actor.ts'
import { packLater } from './blobs.ts'
import type { Store } from './open-store.ts'
import type { JobRow, Tables } from './tables.ts'

/** A job that failed or was cancelled can be read so long. */
const KEPT_MS = 30 * 24 * 3600 * 1000

export type JobText = { readonly schedule: string; readonly loads?: string }
/** What a job is, without its schedule. */
export type Job = Omit<JobRow, 'schedule' | 'loads' | 'runner'>
/** The right to end a job: lost when it is cancelled, or when another run takes it over. */
export type Hold = { readonly id: string; readonly runner: string }
/** Schedule and loads as they came, compressed. */
export type PackedText = { readonly schedule: Uint8Array; readonly loads?: Uint8Array }
export type Claimed = { readonly job: Job; readonly hold: Hold; readonly text: PackedText }

export const jobColumns = [
  'id',
  'project',
  'state',
  'actor',
  'actor_key',
  'trace_id',
  'created_at',
  'started_at',
  'finished_at',
  'attempts',
  'done',
  'caps',
  'problem',
] as const
const now = (store: Store) => store.clock().toISOString()

export type NewJob = {
  readonly id: string
  readonly project: string
  readonly actor: Actor
  readonly traceId: string
  readonly text: JobText
}

/**
 * Puts a job in line; `also` is done in the same transaction. Throws `overloaded` where `most` jobs wait or run already.
 */
export async function addJob(
  store: Store,
  { id, project, actor, traceId, text }: NewJob,
  most: number,
  also: (trx: Transaction<Tables>, job: Job) => Promise<void>,
): Promise<void> {
  const schedule = await packLater(text.schedule)
  const loads = text.loads === undefined ? null : await packLater(text.loads)
  await store.db.transaction().execute(async (trx) => {
    const old = new Date(store.clock().getTime() - KEPT_MS).toISOString()
    await trx.deleteFrom('jobs').where('state', 'in', ['failed', 'cancelled']).where('finished_at', '<', old).execute()
    const { count } = await trx
      .selectFrom('jobs')
      .select(({ fn }) => fn.countAll().as('count'))
      .where('state', 'in', ['queued', 'running'])
      .executeTakeFirstOrThrow()
    if (Number(count) >= most) throw new Problem('overloaded', { seconds: 1 })
    const job: Job = {
      id,
      project,
      state: 'queued',
      actor: actor.name,
      actor_key: actor.key,
      trace_id: traceId,
      created_at: now(store),
      started_at: null,
      finished_at: null,
      attempts: 0,
      done: 0,
      caps: null,
      problem: null,
    }
    await trx
      .insertInto('jobs')
      .values({ ...job, runner: null, schedule, loads })
      .execute()
    await also(trx, job)
  })
}

export const findJob = (store: Store, id: string): Promise<Job | undefined> =>
  store.reader.selectFrom('jobs').select(jobColumns).where('id', '=', id).executeTakeFirst()

/** The job that has waited longest, but for those in `but`. */
export async function nextJob(store: Store, but: readonly string[]): Promise<string | undefined> {
  let query = store.db.selectFrom('jobs').select('id').where('state', '=', 'queued')
  if (but.length > 0) query = query.where('id', 'not in', but)
  return (await query.orderBy('id').limit(1).executeTakeFirst())?.id
}

/**
 * Takes a job to run it, also from a run that seems lost: who gives the id out says that no other run lives. Undefined where
 * the job has ended.
 */
export async function claimJob(store: Store, id: string): Promise<Claimed | undefined> {
  const runner = randomUUID()
  const row = await store.db
    .updateTable('jobs')
    .set(({ eb }) => ({
      state: 'running',
      runner,
      attempts: eb('attempts', '+', 1),
      started_at: now(store),
      done: 0,
      caps: null,
    }))
    .where('id', '=', id)
    .where('state', 'in', ['queued', 'running'])
    .returning([...jobColumns, 'schedule', 'loads'])
    .executeTakeFirst()
  if (!row) return undefined
  const { schedule, loads, ...job } = row
  return { job, hold: { id, runner }, text: { schedule: schedule!, ...(loads && { loads }) } }
}

const held = (db: Store['db'] | Transaction<Tables>, { id, runner }: Hold) =>
  db.updateTable('jobs').where('id', '=', id).where('runner', '=', runner).where('state', '=', 'running')

/** Tells how far a job is. False where the hold is lost. */
export async function tellProgress(store: Store, hold: Hold, done: number, caps: number): Promise<boolean> {
  return (await held(store.db, hold).set({ done, caps }).returning('id').executeTakeFirst()) !== undefined
}

export async function isHeld(store: Store, { id, runner }: Hold): Promise<boolean> {
  const found = store.reader.selectFrom('jobs').select('id').where('id', '=', id).where('runner', '=', runner)
  return (await found.where('state', '=', 'running').executeTakeFirst()) !== undefined
}

/** In the transaction of its record: the job is done. Throws, and so undoes the record, where the hold is lost. */
export async function completeJob(trx: Transaction<Tables>, { id, runner }: Hold): Promise<void> {
  const gone = await trx
    .deleteFrom('jobs')
    .where('id', '=', id)
    .where('runner', '=', runner)
    .where('state', '=', 'running')
    .returning('id')
    .executeTakeFirst()
  if (!gone) throw new Problem('assessment-cancelled')
}

/** Gives a job back to the queue; `count` false where this run shall not count as a try. */
export async function requeueJob(store: Store, hold: Hold, count: boolean): Promise<void> {
  await held(store.db, hold)
    .set(({ eb }) => ({ state: 'queued', runner: null, attempts: eb('attempts', '-', count ? 0 : 1) }))
    .execute()
}

const ended = (store: Store, state: 'failed' | 'cancelled', problem: Problem) => ({
  state,
  runner: null,
  finished_at: now(store),
  problem: JSON.stringify(problem.document),
  schedule: null,
  loads: null,
})

export async function failJob(store: Store, hold: Hold, problem: Problem): Promise<void> {
  await held(store.db, hold)
    .set(ended(store, 'failed', problem))
    .execute()
}

/** Cancels a job that waits or runs, and tells whether there was one. */
export async function cancelJob(store: Store, id: string): Promise<boolean> {
  const found = await store.db
    .updateTable('jobs')
    .set(ended(store, 'cancelled', new Problem('assessment-cancelled')))
    .where('id', '=', id)
    .where('state', 'in', ['queued', 'running'])
    .returning('id')
    .executeTakeFirst()
  return found !== undefined
}

/** Runs of a process that ended go back into line: only where no other process serves the same database. */
export async function requeueAll(store: Store): Promise<void> {
  await store.db.updateTable('jobs').set({ state: 'queued', runner: null }).where('state', '=', 'running').execute()
}

export async function countJobs(store: Store): Promise<Record<JobRow['state'], number>> {
  const rows = await store.reader
    .selectFrom('jobs')
    .select(['state', ({ fn }) => fn.countAll().as('count')])
    .groupBy('state')
    .execute()
  const counts = { queued: 0, running: 0, failed: 0, cancelled: 0 }
  for (const { state, count } of rows) counts[state] = Number(count)
  return counts
}
