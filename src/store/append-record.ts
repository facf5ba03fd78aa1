import { randomUUIDv7 } from 'node:crypto'
import { setImmediate as breath } from 'node:timers/promises'
import type { Transaction } from 'kysely'
import { Problem } from '../errors.ts'
import type { Actor } from './actor.ts'
import { recordHash } from './chain.ts'
import type { Draft } from './draft.ts'
import type { Store } from './open-store.ts'
import type { RecordRow, Tables } from './tables.ts'

/** Rows of one statement: few enough that neither the event loop nor the limit of parameters feels them. */
const CHUNK = 50

type RowTable = 'caps' | 'checks' | 'neighbours' | 'traces'

async function insertRows(trx: Transaction<Tables>, table: RowTable, record: string, rows: readonly object[]) {
  for (let i = 0; i < rows.length; i += CHUNK) {
    if (i > 0) await breath()
    const chunk = rows.slice(i, i + CHUNK).map((row) => ({ record, ...row }))
    await trx
      .insertInto(table)
      .values(chunk as never)
      .execute()
  }
}

export type AppendOptions = {
  /** An id that was told before the record was computed. */
  readonly id?: string
  /** Done in the transaction of the record, before it ends. */
  readonly also?: (trx: Transaction<Tables>, record: RecordRow) => Promise<void>
}

/**
 * Adds a record to a project: takes the next revision, links the chain and inserts every row, all in one transaction, so that
 * no revision is used twice or skipped. The record is on the disk when this returns. Throws `no-such-project`.
 */
export function appendRecord(
  store: Store,
  project: string,
  actor: Pick<Actor, 'name' | 'key'>,
  draft: Draft,
  { id = randomUUIDv7(), also = async () => undefined }: AppendOptions = {},
): Promise<RecordRow> {
  return store.db.transaction().execute(async (trx) => {
    const place = await store.capabilities.lockProject(trx, project)
    if (!place) throw new Problem('no-such-project', { slug: project })
    const link = {
      ...draft.record,
      id,
      project,
      revision: place.revision + 1,
      created_at: store.clock().toISOString(),
      actor: actor.name,
      actor_key: actor.key,
      previous_hash: place.head,
    }
    const record: RecordRow = { ...link, record_hash: recordHash(link) }
    await trx.insertInto('records').values(record).execute()
    await insertRows(trx, 'caps', record.id, draft.caps)
    await insertRows(trx, 'checks', record.id, draft.checks)
    await insertRows(trx, 'neighbours', record.id, draft.neighbours)
    await insertRows(trx, 'traces', record.id, draft.traces)
    await trx
      .updateTable('projects')
      .set({ revision: record.revision, head: record.record_hash })
      .where('slug', '=', project)
      .execute()
    await also(trx, record)
    return record
  })
}
