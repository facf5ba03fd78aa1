import { joinTrace, type Trace, type TracePart } from '../engine/index.ts'
import { unpack } from './blobs.ts'
import type { Store } from './open-store.ts'
import type { CheckRow } from './tables.ts'

/** One cap with its part of the result as canonical JSON. */
export async function findCap(store: Store, record: string, mark: string) {
  const row = await store.reader
    .selectFrom('caps')
    .selectAll()
    .where('record', '=', record)
    .where('mark', '=', mark)
    .executeTakeFirst()
  return row && { ...row, body: unpack(row.body) }
}

/** Parts of the result of all caps, or of the one of a mark, as they lie compressed. */
export function capBodies({ reader }: Store, record: string, mark?: string) {
  let query = reader.selectFrom('caps').select(['ordinal', 'body']).where('record', '=', record)
  if (mark !== undefined) query = query.where('mark', '=', mark)
  return query.orderBy('ordinal').execute()
}

/** Checks of the given caps (ordinals), of all caps without. */
export function listChecks(store: Store, record: string, caps?: readonly number[]): Promise<CheckRow[]> {
  let query = store.reader.selectFrom('checks').selectAll().where('record', '=', record)
  if (caps) query = query.where('cap', 'in', [...caps, -1])
  return query.orderBy('cap').orderBy('check_kind').execute()
}

async function tracePart({ reader }: Store, record: string, part: number): Promise<TracePart | undefined> {
  const row = await reader
    .selectFrom('traces')
    .select('trace')
    .where('record', '=', record)
    .where('cap', '=', part)
    .executeTakeFirst()
  return row && (JSON.parse(unpack(row.trace)) as TracePart)
}

/** The trace of one cap by its ordinal, put together from its own part and the few that hold what it shares with others. */
export async function findTrace(store: Store, record: string, cap: number): Promise<Trace | undefined> {
  const parts = new Map<number, TracePart>()
  const ahead = [cap]
  for (let next = ahead.pop(); next !== undefined; next = ahead.pop()) {
    if (parts.has(next)) continue
    const part = await tracePart(store, record, next)
    if (!part) return undefined
    parts.set(next, part)
    ahead.push(...part.uses)
  }
  return joinTrace([...parts].sort(([a], [b]) => a - b).map(([, part]) => part))
}
