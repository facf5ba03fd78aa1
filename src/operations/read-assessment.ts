import type { Actor } from '../store/actor.ts'
import { unpack } from '../store/blobs.ts'
import { contentPieces } from '../store/chain.ts'
import type { Page } from '../store/page.ts'
import { capBodies } from '../store/read-caps.ts'
import { adjacentRecords, findWholeRecord, listRecords } from '../store/read-records.ts'
import type { Office } from './office.ts'
import { ownAssessment, ownProject, ownRecord } from './rights.ts'
import { showJob } from './show-job.ts'
import { showRecord } from './show-record.ts'

/** A record, with the ids of the revisions before and after it; the job, as long as there is none. */
export async function getAssessment(office: Office, actor: Actor, id: string) {
  const found = await ownAssessment(office, actor, id)
  if ('job' in found) return { job: showJob(found.job) }
  const { record } = found
  const { before, after } = await adjacentRecords(office.store, record.project, record.revision)
  return { job: undefined, record: showRecord(record), before, after }
}

/** Records of a project, oldest first. */
export async function listAssessments(office: Office, actor: Actor, slug: string, page: Page<number>) {
  await ownProject(office, actor, slug)
  return (await listRecords(office.store, slug, page)).map(showRecord)
}

/** The content of a record, `{ notices, request, result }`, as the canonical JSON whose SHA-256 is the content hash. */
export async function getContent(office: Office, actor: Actor, id: string) {
  await ownRecord(office, actor, id)
  const record = (await findWholeRecord(office.store, id))!
  const caps = await capBodies(office.store, id)
  const pieces = contentPieces({
    notices: record.notices,
    outcome: unpack(record.outcome),
    request: unpack(record.request),
    caps: caps.map((cap) => unpack(cap.body)),
  })
  return { hash: record.content_hash, project: record.project, text: [...pieces].join('') }
}
