import { Problem } from '../errors.ts'
import type { CheckKind } from '../print/check-words.ts'
import type { Issue } from '../print/record.ts'
import type { Actor } from '../store/actor.ts'
import { findProject } from '../store/projects.ts'
import { capBodies, findTrace } from '../store/read-caps.ts'
import { adjacentRecords, findRevision, findWholeRecord, type RecordHead } from '../store/read-records.ts'
import { listSignatures } from '../store/signatures.ts'
import type { Office } from './office.ts'
import { printing } from './print-in-thread.ts'
import { ownProject, ownRecord } from './rights.ts'
import type { PackedRecord } from './unpack-record.ts'

type Printed = { readonly record: RecordHead; readonly bytes: Uint8Array }

async function issueOf({ store }: Office, record: RecordHead): Promise<Issue> {
  const project = await findProject(store, record.project)
  const signatures = await listSignatures(store, record.id)
  return {
    project: { slug: record.project, title: project!.title },
    revision: record.revision,
    id: record.id,
    actor: record.actor,
    createdAt: record.created_at,
    contentHash: record.content_hash,
    recordHash: record.record_hash,
    engine: record.engine,
    signatures: signatures.map((s) => ({ role: s.role, actor: s.actor, signedAt: s.signed_at })),
  }
}

/** The record as it is stored, with all its caps or the one of a mark. */
async function packed(office: Office, head: RecordHead, mark?: string): Promise<PackedRecord> {
  const { request, outcome, notices } = (await findWholeRecord(office.store, head.id))!
  const caps = await capBodies(office.store, head.id, mark)
  const [only] = caps
  if (mark !== undefined && !only) throw new Problem('no-such-cap', { mark })
  const trace = mark === undefined ? undefined : await findTrace(office.store, head.id, only!.ordinal)
  const issue = await issueOf(office, head)
  return { issue, request, outcome, notices, caps: caps.map((cap) => cap.body), trace }
}

/** The calculation sheet of one cap of a record. Throws `no-such-cap`. */
export async function printCapSheet(office: Office, actor: Actor, id: string, mark: string, gone: AbortSignal) {
  const record = await ownRecord(office, actor, id)
  const task = { page: 'sheet', mark, record: await packed(office, record, mark) } as const
  return { record, bytes: await office.pool.run(printing, task, gone) } satisfies Printed
}

/** The schedule of piles of a record, as a page or as CSV. */
export async function printPiles(
  office: Office,
  actor: Actor,
  id: string,
  page: 'piles' | 'piles-csv',
  gone: AbortSignal,
) {
  const record = await ownRecord(office, actor, id)
  const bytes = await office.pool.run(printing, { page, record: await packed(office, record) }, gone)
  return { record, bytes } satisfies Printed
}

export type PlanQuery = {
  readonly check?: CheckKind | undefined
  /** An assessment of the same project by its id or its revision, to be laid beside. */
  readonly since?: string | undefined
}

/** The plan of a record, alone or beside another revision of its project. Throws `no-such-assessment` for `since`. */
export async function printOverview(
  office: Office,
  actor: Actor,
  id: string,
  at: string,
  { check, since }: PlanQuery,
  gone: AbortSignal,
) {
  const { store } = office
  const record = await ownRecord(office, actor, id)
  const { before } = await adjacentRecords(store, record.project, record.revision)
  const other = since === undefined ? undefined : await sinceOf(office, actor, record, since)
  const previous = other && (await packed(office, other))
  const task = { page: 'plan', at, check, before, previous, record: await packed(office, record) } as const
  return { record, bytes: await office.pool.run(printing, task, gone) } satisfies Printed
}

async function sinceOf(office: Office, actor: Actor, { project }: RecordHead, since: string): Promise<RecordHead> {
  const other = /^\d{1,9}$/.test(since)
    ? await findRevision(office.store, project, Number(since))
    : await ownRecord(office, actor, since)
  if (other?.project !== project) throw new Problem('no-such-assessment', { id: since })
  return other
}

/** The plan of the newest record of a project. Throws `no-assessment-yet`. */
export async function printPlan(
  office: Office,
  actor: Actor,
  slug: string,
  at: string,
  query: PlanQuery,
  gone: AbortSignal,
) {
  const { revision } = await ownProject(office, actor, slug)
  const newest = await findRevision(office.store, slug, revision)
  if (!newest) throw new Problem('no-assessment-yet', { slug })
  return printOverview(office, actor, newest.id, at, query, gone)
}
