import { Problem } from '../errors.ts'
import { capBodies } from '../store/read-caps.ts'
import { findWholeRecord } from '../store/read-records.ts'
import type { Office } from './office.ts'
import { reverifying } from './reverify-in-thread.ts'

/** Computes a record again with the running engine: identical, or what changed by JSON Pointer into `{ notices, result }`. */
export async function reverifyRecord({ store, pool }: Office, id: string, gone: AbortSignal) {
  const record = await findWholeRecord(store, id)
  if (!record) throw new Problem('no-such-assessment', { id })
  const caps = await capBodies(store, id)
  const { request, outcome, notices } = record
  const stored = { request, outcome, notices, caps: caps.map((cap) => cap.body) }
  const { content_hash, engine, count, changes } = await pool.run(reverifying, stored, gone)
  return {
    id,
    identical: content_hash === record.content_hash,
    stored: { engine: record.engine, contentHash: record.content_hash },
    computed: { engine, contentHash: content_hash },
    count,
    changes,
  }
}
