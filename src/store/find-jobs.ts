import type { Kysely } from 'kysely'
import { type Actor, hasProject } from './actor.ts'
import { type Job, jobColumns } from './jobs.ts'
import type { Store } from './open-store.ts'
import type { Page } from './page.ts'
import type { JobRow, Tables } from './tables.ts'

export type JobFilter = {
  readonly project?: string
  readonly state?: JobRow['state']
  /** Asked for at this time or later, and before that one: ISO 8601, UTC. */
  readonly from?: string
  readonly to?: string
}

function filtered(reader: Kysely<Tables>, actor: Actor, { project, state, from, to }: JobFilter) {
  let query = reader.selectFrom('jobs')
  if (project !== undefined) query = query.where('project', '=', hasProject(actor, project) ? project : '')
  else if (!actor.projects.includes('*')) query = query.where('project', 'in', [...actor.projects, ''])
  if (state !== undefined) query = query.where('state', '=', state)
  if (from !== undefined) query = query.where('created_at', '>=', from)
  if (to !== undefined) query = query.where('created_at', '<', to)
  return query
}

/** Jobs that the actor has a right to, oldest first. */
export function findJobs({ reader }: Store, actor: Actor, filter: JobFilter, page: Page<string>): Promise<Job[]> {
  let query = filtered(reader, actor, filter).select(jobColumns)
  if (page.after !== undefined) query = query.where('id', '>', page.after)
  return query.orderBy('id').limit(page.limit).execute()
}

export async function countJobsOf({ reader }: Store, actor: Actor, filter: JobFilter): Promise<number> {
  const { count } = await filtered(reader, actor, filter)
    .select(({ fn }) => fn.countAll().as('count'))
    .executeTakeFirstOrThrow()
  return Number(count)
}
