import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { sql } from 'kysely'
import { buildApp } from '../../src/app.ts'
import { readConfig } from '../../src/config.ts'
import { draftRecord } from '../../src/operations/draft-record.ts'
import { anonymous } from '../../src/store/actor.ts'
import { appendRecord } from '../../src/store/append-record.ts'
import { openStore, type Store, type StoreOptions } from '../../src/store/open-store.ts'
import { putProject } from '../../src/store/projects.ts'
import { startPostgres } from '../store/postgres-server.ts'
import { scheduleBody } from './bodies.ts'
import { type Finding, median } from './measure.ts'

const CAPS = 50
const COMBINATIONS = 40
const CLIENTS = 4
const SECONDS = 3

/** How often a second `clients` loops finish, each waiting for its own. */
async function rate(clients: number, once: () => Promise<unknown>): Promise<number> {
  const end = Date.now() + SECONDS * 1000
  let count = 0
  const loop = async () => {
    while (Date.now() < end) {
      await once()
      count++
    }
  }
  await Promise.all(Array.from({ length: clients }, loop))
  return count / SECONDS
}

async function sizeOf(store: Store): Promise<number> {
  if (store.capabilities.name === 'sqlite') await sql`pragma wal_checkpoint(truncate)`.execute(store.db)
  return store.capabilities.size(store.db)
}

async function onOne(options: StoreOptions): Promise<Finding[]> {
  const store = await openStore(options)
  const app = await buildApp(readConfig({ LOG_LEVEL: 'silent' }), store)
  const finding = (what: string, value: string): Finding => ({
    part: 'f',
    what: `${store.capabilities.name}: ${what}`,
    value,
  })
  const schedule = scheduleBody(CAPS, COMBINATIONS)
  const draft = draftRecord(schedule)
  await putProject(store, 'p', 'P')
  const append = () => appendRecord(store, 'p', anonymous, draft)
  const COUNT = 200
  const grow = async (one: typeof draft) => {
    const before = await sizeOf(store)
    for (let i = 0; i < COUNT; i++) await appendRecord(store, 'p', anonymous, one)
    return (((await sizeOf(store)) - before) / COUNT / 1024).toFixed(1)
  }
  const [lean, whole] = [await grow({ ...draft, traces: [] }), await grow(draft)]

  await sql`create table bare (id integer not null, said text not null)`.execute(store.db)
  const bare = () => sql`insert into bare values (1, 'x')`.execute(store.db)
  const [one, alone, four] = [await rate(1, bare), await rate(1, append), await rate(CLIENTS, append)]

  const post = async (url: string) => {
    const start = performance.now()
    const reply = await app.inject({ method: 'POST', url, payload: schedule })
    if (reply.statusCode >= 300) throw new Error(reply.body)
    return performance.now() - start
  }
  const urls = ['/v1/assessments?trace=none', '/v1/assessments', '/v1/projects/p/assessments']
  const times: number[][] = urls.map(() => [])
  for (let round = -3; round < 15; round++)
    for (const [i, url] of urls.entries()) {
      const ms = await post(url)
      if (round >= 0) times[i]!.push(ms)
    }
  const [none, full, stored] = times.map(median)
  await app.close()
  return [
    finding(`a record of ${CAPS} caps, with and without traces`, `${whole} kB, ${lean} kB`),
    finding('bare inserts of one row, one client', `${one.toFixed(0)}/s`),
    finding(
      `records, 1 and ${CLIENTS} clients`,
      `${alone.toFixed(0)}/s, ${four.toFixed(0)}/s (${(four / one).toFixed(2)} of bare)`,
    ),
    finding(
      'POST unstored, unstored with trace, stored',
      `${none!.toFixed(0)}, ${full!.toFixed(0)}, ${stored!.toFixed(0)} ms`,
    ),
  ]
}

/** (f) Records: their size, how many a second, and what storing adds to an assessment. */
export async function records(): Promise<Finding[]> {
  const folder = mkdtempSync(join(tmpdir(), 'kentledge-bench-'))
  const server = await startPostgres()
  try {
    return [...(await onOne({ folder })), ...(await onOne({ url: await server.database() }))]
  } finally {
    await server.stop()
    rmSync(folder, { recursive: true, force: true })
  }
}
