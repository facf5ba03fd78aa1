import type { Store } from './open-store.ts'
import type { CapRow, CheckRow, NeighbourRow, RecordRow, SignatureRow, TraceRow } from './tables.ts'

/** A record with all its rows, as they lie in the database. */
export type WholeRecord = {
  readonly record: RecordRow
  readonly caps: readonly CapRow[]
  readonly checks: readonly CheckRow[]
  readonly neighbours: readonly NeighbourRow[]
  readonly traces: readonly TraceRow[]
  readonly signatures: readonly SignatureRow[]
}

/** Reads a record whole; undefined where there is none. */
export async function readWhole({ reader }: Store, id: string): Promise<WholeRecord | undefined> {
  const record = await reader.selectFrom('records').selectAll().where('id', '=', id).executeTakeFirst()
  if (!record) return undefined
  const caps = reader.selectFrom('caps').selectAll().where('record', '=', id).orderBy('ordinal')
  const checks = reader.selectFrom('checks').selectAll().where('record', '=', id).orderBy('cap').orderBy('check_kind')
  const neighbours = reader.selectFrom('neighbours').selectAll().where('record', '=', id).orderBy('ordinal')
  const traces = reader.selectFrom('traces').selectAll().where('record', '=', id).orderBy('cap')
  const signatures = reader.selectFrom('signatures').selectAll().where('record', '=', id).orderBy('ordinal')
  return {
    record,
    caps: await caps.execute(),
    checks: await checks.execute(),
    neighbours: await neighbours.execute(),
    traces: await traces.execute(),
    signatures: await signatures.execute(),
  }
}
