import { sql } from 'kysely'
import { afterAll, afterEach, beforeAll, describe, expect, test } from 'vitest'
import { readExamples } from '../../src/contract/examples.ts'
import { WorkerPool } from '../../src/jobs/pool.ts'
import { draftRecord } from '../../src/operations/draft-record.ts'
import { type Checkpoint, verifyProject } from '../../src/operations/verify-project.ts'
import { type Actor, anonymous } from '../../src/store/actor.ts'
import { appendRecord } from '../../src/store/append-record.ts'
import { recordHash } from '../../src/store/chain.ts'
import type { Store } from '../../src/store/open-store.ts'
import { putProject } from '../../src/store/projects.ts'
import { findWholeRecord, listRecords } from '../../src/store/read-records.ts'
import { sign } from '../../src/store/signatures.ts'
import { bothDatabases, closeStores, emptyStore } from './databases.ts'

const draft = draftRecord(readExamples().assessment)
let pool: WorkerPool
beforeAll(() => {
  pool = new WorkerPool({ workers: 1, queue: 100, seconds: 60 })
})
afterAll(() => pool.close())
afterEach(closeStores)

const tables = ['records', 'caps', 'checks', 'neighbours', 'traces', 'signatures']

/** What someone with the right to change the database itself would do first. */
async function disarm(store: Store): Promise<void> {
  const sqlite = store.capabilities.name === 'sqlite'
  for (const table of tables) {
    const names = sqlite ? ['no_update', 'no_delete'] : ['no_change', 'no_truncate']
    for (const name of names)
      await sql`drop trigger ${sql.id(`${table}_${name}`)} ${sqlite ? sql`` : sql`on ${sql.table(table)}`}`.execute(
        store.db,
      )
  }
  if (sqlite) await sql`pragma foreign_keys = off`.execute(store.db)
  else
    for (const table of tables.slice(1))
      await sql`alter table ${sql.table(table)} drop constraint ${sql.id(`${table}_record_fkey`)}`.execute(store.db)
}

const check = (store: Store, checkpoint?: Checkpoint) =>
  verifyProject({ store, pool }, anonymous, 'quay', checkpoint, new AbortController().signal)
const wipe = async (store: Store, id: string) => {
  for (const table of tables) {
    const column = table === 'records' ? 'id' : 'record'
    await sql`delete from ${sql.table(table)} where ${sql.id(column)} = ${id}`.execute(store.db)
  }
}

describe.each(bothDatabases())('on $name', (database) => {
  /** A project of four records, the second signed. */
  async function project() {
    const store = await emptyStore(database)
    await putProject(store, 'quay', 'Quay')
    for (let i = 0; i < 4; i++) await appendRecord(store, 'quay', anonymous, draft)
    const records = await listRecords(store, 'quay', { limit: 10 })
    for (const [i, role] of (['originator', 'checker'] as const).entries()) {
      const actor: Actor = { ...anonymous, name: `Engineer ${i}` }
      await sign(store, records[1]!, actor, { role, meaning: 'done' })
    }
    const saved = await check(store)
    expect(saved).toMatchObject({ holds: true, records: 4, flaws: [] })
    await disarm(store)
    return { store, records, checkpoint: saved.checkpoint }
  }

  test('a byte flipped in any blob or field is found in its row', async () => {
    const { store, records } = await project()
    const third = records[2]!
    const flip = async (table: string, column: string, where: ReturnType<typeof sql>) => {
      const { rows } = await sql<{
        v: Uint8Array
      }>`select ${sql.id(column)} as v from ${sql.table(table)} where ${where}`.execute(store.db)
      const before = Uint8Array.from(rows[0]!.v)
      const after = Uint8Array.from(before)
      after[after.length >> 1]! ^= 1
      const write = (v: Uint8Array) =>
        sql`update ${sql.table(table)} set ${sql.id(column)} = ${Buffer.from(v)} where ${where}`.execute(store.db)
      await write(after)
      const { holds, flaws } = await check(store)
      await write(before)
      expect(holds).toBe(false)
      expect(flaws.every((flaw) => flaw.revision === 3)).toBe(true)
      return flaws.map((flaw) => flaw.table)
    }
    expect(await flip('records', 'request', sql`id = ${third.id}`)).toContain('records')
    expect(await flip('records', 'outcome', sql`id = ${third.id}`)).toContain('records')
    expect(await flip('caps', 'body', sql`record = ${third.id} and ordinal = 1`)).toContain('caps')
    expect(await flip('traces', 'trace', sql`record = ${third.id} and cap = 1`)).toContain('traces')
    expect((await check(store)).holds).toBe(true)
  })

  test.each<[string, string, string]>([
    [
      'caps',
      "update caps set utilisation = 0.5 where ordinal = 2 and record = '$3'",
      'the row was changed: utilisation',
    ],
    [
      'checks',
      "update checks set exceeded = 1 - exceeded where cap = 0 and record = '$3'",
      'the row was changed: exceeded',
    ],
    ['checks', "delete from checks where cap = 0 and record = '$3'", 'the row is missing'],
    ['neighbours', "update neighbours set a = 'X' where ordinal = 0 and record = '$3'", 'the row was changed: a'],
    [
      'records',
      "update records set exceeded = 0, satisfied = 6 where id = '$3'",
      'the row was changed: satisfied, exceeded',
    ],
    ['records', "update records set actor = 'somebody' where id = '$3'", 'the fields do not give the record hash'],
    [
      'records',
      "update records set created_at = '2020-01-01T00:00:00.000Z' where id = '$3'",
      'the fields do not give the record hash',
    ],
    ['records', "update records set notices = '[]' where id = '$3'", 'the content does not give its hash'],
    ['traces', "delete from traces where cap = 0 and record = '$3'", 'the traces do not give their hash'],
  ])('a changed row of %s is found: %s', async (table, change, what) => {
    const { store, records } = await project()
    await sql.raw(change.replace('$3', records[2]!.id)).execute(store.db)
    expect((await check(store)).flaws).toContainEqual(
      expect.objectContaining({ revision: 3, id: records[2]!.id, table, what }),
    )
  })

  test('a signature that is changed, or goes before a later one, is found', async () => {
    const { store, records } = await project()
    await sql.raw(`update signatures set meaning = 'never' where role = 'originator'`).execute(store.db)
    expect((await check(store)).flaws).toMatchObject([{ revision: 2, table: 'signatures', at: 'originator' }])
    await sql.raw(`delete from signatures where role = 'originator'`).execute(store.db)
    expect((await check(store)).flaws).toMatchObject([
      { revision: 2, id: records[1]!.id, table: 'signatures', at: 'checker' },
    ])
  })

  test('a record that was deleted is found', async () => {
    const { store, records } = await project()
    await wipe(store, records[1]!.id)
    const { flaws } = await check(store)
    expect(flaws).toMatchObject([
      { revision: 2, what: 'the record is missing' },
      { revision: 3, id: records[2]!.id, what: 'the record does not follow the one before it' },
    ])
  })

  test('records that change places are found', async () => {
    const { store, records } = await project()
    const move = (from: number, to: number) =>
      sql`update records set revision = ${to} where revision = ${from}`.execute(store.db)
    await move(2, 99)
    await move(3, 2)
    await move(99, 3)
    const { flaws } = await check(store)
    expect(new Set(flaws.map((f) => f.revision))).toEqual(new Set([2, 3, 4]))
    expect(flaws).toContainEqual({
      revision: 2,
      id: records[2]!.id,
      table: 'records',
      what: 'the fields do not give the record hash',
    })
  })

  test('a record that was put between others is found, even with a hash of its own', async () => {
    const { store, records } = await project()
    const model = (await findWholeRecord(store, records[1]!.id))!
    await sql`update records set revision = revision + 100 where revision >= 3`.execute(store.db)
    await sql`update records set revision = revision - 99 where revision >= 100`.execute(store.db)
    const forged = { ...model, id: `${model.id.slice(0, -1)}x`, revision: 3, previous_hash: model.record_hash }
    await store.db
      .insertInto('records')
      .values({ ...forged, record_hash: recordHash(forged) })
      .execute()
    await sql`update projects set revision = 5`.execute(store.db)
    const { flaws } = await check(store)
    expect(flaws).toContainEqual(
      expect.objectContaining({ revision: 4, what: 'the record does not follow the one before it' }),
    )
    expect(flaws.some((f) => f.revision < 3)).toBe(false)
  })

  test('records that were cut off are found: by the project, and where that was changed too, by a checkpoint', async () => {
    const { store, records, checkpoint } = await project()
    await wipe(store, records[3]!.id)
    expect((await check(store)).flaws).toMatchObject([{ revision: 4, what: 'the record was cut off' }])
    await sql`update projects set revision = 3, head = ${records[2]!.record_hash}`.execute(store.db)
    expect((await check(store)).holds).toBe(true)
    expect((await check(store, checkpoint)).flaws).toMatchObject([
      { revision: 4, what: 'the record of the checkpoint was cut off' },
    ])
    await appendRecord(store, 'quay', anonymous, draft)
    expect((await check(store, checkpoint)).flaws).toMatchObject([
      { revision: 4, what: 'the record is not the one of the checkpoint' },
    ])
  })
})
