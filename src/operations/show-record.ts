import type { assess } from '../engine/index.ts'
import type { RecordHead } from '../store/read-records.ts'

type Summary = ReturnType<typeof assess>['result']['summary']

/** A record as the contract shows it. Nothing of it ever changes, so its bytes stay the same. */
export function showRecord(r: RecordHead) {
  return {
    id: r.id,
    project: r.project,
    revision: r.revision,
    title: r.title,
    state: 'completed' as const,
    createdAt: r.created_at,
    actor: r.actor,
    actorKey: r.actor_key,
    engine: r.engine,
    requestHash: r.request_hash,
    contentHash: r.content_hash,
    traceHash: r.trace_hash,
    previousHash: r.previous_hash,
    recordHash: r.record_hash,
    summary: JSON.parse(r.summary) as Summary,
  }
}
export type ShownRecord = ReturnType<typeof showRecord>
