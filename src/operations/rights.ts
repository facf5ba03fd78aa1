import { Problem } from '../errors.ts'
import { type Actor, hasProject, hasScope, type Scope } from '../store/actor.ts'
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
export async function ownProject({ store }: Office, actor: Actor, slug: string): Promise<ProjectRow> {
  const row = hasProject(actor, slug) ? await findProject(store, slug) : undefined
  if (!row) throw new Problem('no-such-project', { slug })
  return row
}

/** A record of a project that the actor has a right to. Throws `no-such-assessment`, for those of others as for none. */
export async function ownRecord({ store }: Office, actor: Actor, id: string): Promise<RecordHead> {
  const record = await findRecord(store, id)
  if (!record || !hasProject(actor, record.project)) throw new Problem('no-such-assessment', { id })
  return record
}
