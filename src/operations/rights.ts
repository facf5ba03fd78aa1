import { Problem } from '../errors.ts'
import { type Actor, hasProject, hasScope, type Scope } from '../store/actor.ts'
import { findJob, type Job } from '../store/jobs.ts'
import { findProject } from '../store/projects.ts'
import { findRecord, type RecordHead } from '../store/read-records.ts'
import type { ProjectRow } from '../store/tables.ts'
import type { Office } from './office.ts'

export type { Actor, Scope }

/** Throws `missing-scope`. */
export function needScope(actor: Actor, scope: Scope): void {
  if (!hasScope(actor, scope)) throw new Problem('missing-scope', { scope })
}

/** A project that the actor has a right to. Throws `no-such-project`, for those of others as for none. */
export async function ownProject({ store }: Pick<Office, 'store'>, actor: Actor, slug: string): Promise<ProjectRow> {
  const row = hasProject(actor, slug) ? await findProject(store, slug) : undefined
  if (!row) throw new Problem('no-such-project', { slug })
  return row
}

/** An assessment of a project that the actor has a right to. Throws `no-such-assessment`, for those of others as for none. */
export async function ownAssessment(
  { store }: Pick<Office, 'store'>,
  actor: Actor,
  id: string,
): Promise<{ readonly record: RecordHead } | { readonly job: Job }> {
  const own = (row: { readonly project: string } | undefined) => row !== undefined && hasProject(actor, row.project)
  const record = await findRecord(store, id)
  if (record && own(record)) return { record }
  const job = await findJob(store, id)
  if (job && own(job)) return { job }
  // The job may have become a record between the two looks.
  const late = await findRecord(store, id)
  if (late && own(late)) return { record: late }
  throw new Problem('no-such-assessment', { id })
}

/** As `ownAssessment`, once it is completed. Throws `assessment-not-completed` before, and where it never will be. */
export async function ownRecord(office: Pick<Office, 'store'>, actor: Actor, id: string): Promise<RecordHead> {
  const found = await ownAssessment(office, actor, id)
  if ('job' in found) throw new Problem('assessment-not-completed', { id, state: found.job.state })
  return found.record
}
