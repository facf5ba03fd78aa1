import type { Actor } from '../store/actor.ts'
import { NOTHING } from '../store/chain.ts'
import { listRecords } from '../store/read-records.ts'
import type { Flaw } from '../store/verify-record.ts'
import { readWhole } from '../store/whole-record.ts'
import type { Office } from './office.ts'
import { ownProject } from './rights.ts'
import { verifying } from './verify-in-thread.ts'

/** Revision and record hash of a record, as an earlier answer gave them and somebody kept them elsewhere. */
export type Checkpoint = { readonly revision: number; readonly hash: string }
export type LocatedFlaw = Flaw & { readonly revision: number; readonly id?: string }

const PAGE = 200

/**
 * Recomputes the chain of a project: every hash, link and row. Rows cut off at the end together with what the project says of
 * them leave no mark inside the database: against that stands a checkpoint.
 */
export async function verifyProject(
  office: Pick<Office, 'store' | 'pool'>,
  actor: Actor,
  slug: string,
  checkpoint: Checkpoint | undefined,
  gone: AbortSignal,
) {
  const { store, pool } = office
  const project = await ownProject(office, actor, slug)
  const flaws: LocatedFlaw[] = []
  let [expected, previous, count] = [1, NOTHING, 0]
  let passed = checkpoint === undefined
  for (;;) {
    const heads = await listRecords(store, slug, { limit: PAGE, after: expected - 1 })
    for (const { id, revision, previous_hash, record_hash } of heads) {
      const flaw = (what: string) => flaws.push({ revision, id, table: 'records', what })
      for (; expected < revision; expected++)
        flaws.push({ revision: expected, table: 'records', what: 'the record is missing' })
      if (previous_hash !== previous) flaw('the record does not follow the one before it')
      const whole = await readWhole(store, id)
      const own = whole ? await pool.run(verifying, whole, gone) : []
      flaws.push(...own.map((found) => ({ revision, id, ...found })))
      if (checkpoint?.revision === revision) {
        passed = true
        if (checkpoint.hash !== record_hash) flaw('the record is not the one of the checkpoint')
      }
      expected = revision + 1
      previous = record_hash
      count++
    }
    if (heads.length < PAGE) break
  }
  const last = expected - 1
  // Read before the records: what was added meanwhile is no flaw.
  for (; expected <= project.revision; expected++)
    flaws.push({ revision: expected, table: 'records', what: 'the record was cut off' })
  if (!passed && checkpoint!.revision > project.revision)
    flaws.push({ revision: checkpoint!.revision, table: 'records', what: 'the record of the checkpoint was cut off' })
  const headOf = (revision: number) => (revision === project.revision ? project.head : undefined)
  if (last === project.revision && headOf(last) !== previous)
    flaws.push({ revision: last, table: 'projects', what: 'the project names another newest record' })
  return {
    project: slug,
    holds: flaws.length === 0,
    records: count,
    checkpoint: { revision: last, hash: previous },
    flaws,
  }
}
