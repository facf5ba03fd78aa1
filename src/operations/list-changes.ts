import { hashOf } from '../canonical.ts'
import { engineVersion } from '../engine/index.ts'
import { Problem } from '../errors.ts'
import type { Actor } from '../store/actor.ts'
import { adjacentRecords, findWholeRecord, type RecordHead } from '../store/read-records.ts'
import { comparing } from './changes-in-thread.ts'
import type { Office } from './office.ts'
import { ownRecord } from './rights.ts'
import { showRecord } from './show-record.ts'

/** The two records of a comparison. Throws `no-such-assessment`; `not-comparable` for records of two projects, and for a first one alone. */
async function bothRecords(office: Office, actor: Actor, id: string, since: string | undefined) {
  const after = await ownRecord(office, actor, id)
  const { project, revision } = after
  const earlier = since ?? (await adjacentRecords(office.store, project, revision)).before
  if (earlier === undefined)
    throw new Problem('not-comparable', { reason: 'it is the first of its project; name another one by since' })
  const before = await ownRecord(office, actor, earlier)
  if (before.project !== project)
    throw new Problem('not-comparable', { reason: `${before.id} belongs to project ${before.project}` })
  return { before, after }
}

async function comparedParts({ store }: Office, { id }: RecordHead) {
  const { request, outcome } = (await findWholeRecord(store, id))!
  const caps = store.reader.selectFrom('caps').select('body').where('record', '=', id).orderBy('ordinal')
  return { request, outcome, caps: (await caps.execute()).map((cap) => cap.body) }
}

/**
 * What differs between a record and another revision, `since`, of its project; without it the revision right before. `tag` names
 * the answer before it is computed.
 */
export async function listChanges(office: Office, actor: Actor, id: string, since: string | undefined) {
  const { before, after } = await bothRecords(office, actor, id, since)
  /** The changes as JSON, at most so many of each list. */
  const compute = async (most: number, gone: AbortSignal): Promise<Uint8Array> => {
    const heads = { before: showRecord(before), after: showRecord(after) }
    const parts = { before: await comparedParts(office, before), after: await comparedParts(office, after) }
    return office.pool.run(comparing, { ...parts, most, heads }, gone)
  }
  return { project: after.project, tag: hashOf([before.record_hash, after.record_hash, engineVersion]), compute }
}
