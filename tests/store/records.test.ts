import { sql } from 'kysely'
import { afterEach, describe, expect, test } from 'vitest'
import { readExamples } from '../../src/contract/examples.ts'
import { type Step, sliceTrace, type Trace } from '../../src/engine/index.ts'
import { assessSchedule } from '../../src/operations/assess-schedule.ts'
import { draftRecord } from '../../src/operations/draft-record.ts'
import { anonymous } from '../../src/store/actor.ts'
import { appendRecord } from '../../src/store/append-record.ts'
import { listCaps } from '../../src/store/cap-pages.ts'
import { NOTHING, recordHash } from '../../src/store/chain.ts'
import { migrations } from '../../src/store/migrations/list.ts'
import { openStore } from '../../src/store/open-store.ts'
import { putProject } from '../../src/store/projects.ts'
import { findCap, findTrace, listChecks } from '../../src/store/read-caps.ts'
import { findRecord, listRecords } from '../../src/store/read-records.ts'
import { bothDatabases, closeStores, emptyStore } from './databases.ts'

const draft = draftRecord(readExamples().assessment)
afterEach(closeStores)

describe.each(bothDatabases())('on $name', (database) => {
  const project = async () => {
    const store = await emptyStore(database)
    await putProject(store, 'quay', 'Quay')
    return store
  }

  test('a record is read back as it was stored', async () => {
    const store = await project()
    const record = await appendRecord(store, 'quay', anonymous, draft)
    const { notices, outcome, request, ...head } = record
    expect(await findRecord(store, record.id)).toEqual(head)
    expect(record).toMatchObject({ revision: 1, previous_hash: NOTHING, actor: 'anonymous' })
    expect(record.record_hash).toBe(recordHash(record))
    const caps = await listCaps(store, [record.id], {}, 'schedule', { limit: 100 })
    expect(caps).toEqual(draft.caps.map(({ body, ...row }) => ({ record: record.id, ...row, rank: row.ordinal })))
    expect(await listChecks(store, record.id)).toHaveLength(draft.checks.length)
    const cap = await findCap(store, record.id, caps[0]!.mark)
    expect(JSON.parse(cap!.body)).toMatchObject({ mark: caps[0]!.mark })
    const whole: Trace = JSON.parse(JSON.stringify(assessSchedule(readExamples().assessment, { trace: true }).trace))
    const byId = (steps: readonly Step[]) => steps.toSorted((a, b) => (a.id < b.id ? -1 : 1))
    for (const { ordinal } of caps) {
      const trace = (await findTrace(store, record.id, ordinal))!
      const slice = sliceTrace(whole, `/caps/${ordinal}`)
      expect(slice.steps.length).toBeGreaterThan(10)
      expect(byId(trace.steps)).toEqual(byId(slice.steps))
      expect(trace.results).toEqual(slice.results)
      // Closed: each operand comes from a step before.
      const seen = new Set<string>()
      for (const step of trace.steps) {
        for (const operand of 'operands' in step ? step.operands : []) expect(seen.has(operand.from)).toBe(true)
        seen.add(step.id)
      }
    }
  })

  test('20 records at once take 20 revisions, each linked to the one before', async () => {
    const store = await project()
    await Promise.all(Array.from({ length: 20 }, () => appendRecord(store, 'quay', anonymous, draft)))
    const records = await listRecords(store, 'quay', { limit: 100 })
    expect(records.map((r) => r.revision)).toEqual(Array.from({ length: 20 }, (_, i) => i + 1))
    expect(records.map((r) => r.previous_hash)).toEqual([NOTHING, ...records.slice(0, -1).map((r) => r.record_hash)])
    expect(new Set(records.map((r) => r.id)).size).toBe(20)
  })

  test.each(['records', 'caps', 'checks', 'neighbours', 'traces'])('rows of %s are never changed', async (table) => {
    const store = await project()
    const { id } = await appendRecord(store, 'quay', anonymous, draft)
    const column = table === 'records' ? 'id' : 'record'
    const tries = [
      sql`update ${sql.table(table)} set ${sql.id(column)} = 'x' where ${sql.id(column)} = ${id}`,
      sql`delete from ${sql.table(table)} where ${sql.id(column)} = ${id}`,
    ]
    for (const change of tries) {
      const fault = await change.execute(store.db).catch((e: Error) => e)
      expect((fault as Error).cause).toMatchObject({ message: `rows of ${table} are never changed` })
    }
  })

  test('a database that is newer than the program is refused', async () => {
    const { options } = await database.place()
    const store = await openStore(options)
    await store.db.insertInto('schema_versions').values({ version: 99, name: 'later', applied_at: '' }).execute()
    await store.close()
    await expect(openStore(options)).rejects.toThrow(
      `The database has version 99; this program knows versions up to ${migrations.length}.`,
    )
  })
})
