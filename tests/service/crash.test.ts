import { once } from 'node:events'
import { join } from 'node:path'
import { DatabaseSync } from 'node:sqlite'
import { setTimeout as wait } from 'node:timers/promises'
import { describe, expect, test } from 'vitest'
import { readExamples } from '../../src/contract/examples.ts'
import { bothDatabases } from '../store/databases.ts'
import { type Started, startService } from './start-service.ts'

/** SIGKILL while four clients write. CRASH_ROUNDS=50 for a long run, CRASH_SEED to run one again. */
const rounds = Number(process.env.CRASH_ROUNDS ?? 4)
const seed = Number(process.env.CRASH_SEED ?? Date.now() % 1_000_000)
const CLIENTS = 4

/** Numbers from 0 to 1 (mulberry32, public domain). */
function random(from: number): () => number {
  let state = from
  return () => {
    state = (state + 0x6d2b79f5) | 0
    let t = Math.imul(state ^ (state >>> 15), 1 | state)
    t = (t + Math.imul(t ^ (t >>> 7), 61 | t)) ^ t
    return ((t ^ (t >>> 14)) >>> 0) / 2 ** 32
  }
}

const schedule = JSON.stringify(readExamples().assessment)
const url = '/v1/projects/quay/assessments'

/** A client that gives up nothing: it sends one key until it is answered, then the next. */
class Writer {
  readonly acknowledged = new Map<string, { id: string; revision: number; body: string }>()
  readonly name: string
  retries = 0
  #count = 0
  #sent = false
  constructor(name: string) {
    this.name = name
  }

  get key(): string {
    return `${this.name}-${this.#count}`
  }

  /** Sends the present key once; false where nobody answered. */
  async send(address: string): Promise<boolean> {
    if (this.#sent) this.retries++
    this.#sent = true
    const headers = { 'content-type': 'application/json', 'idempotency-key': this.key }
    const reply = await fetch(address + url, { method: 'POST', headers, body: schedule }).catch(() => undefined)
    const body = await reply?.text().catch(() => undefined)
    if (!reply || body === undefined) return false
    if (reply.status === 201) {
      this.acknowledged.set(this.key, { ...(JSON.parse(body) as { id: string; revision: number }), body })
      this.#count++
      this.#sent = false
    } else {
      if (![409, 503].includes(reply.status)) throw new Error(`${reply.status}: ${body}`)
      await wait(200)
    }
    return true
  }
}

describe.each(bothDatabases())('on $name', (database) => {
  test(
    `killed ${rounds} times while ${CLIENTS} clients write: nothing acknowledged is lost, nothing is there twice`,
    async () => {
      const { env } = await database.place()
      const next = random(seed)
      const writers = Array.from({ length: CLIENTS }, (_, i) => new Writer(`client${i}`))
      const count = () => writers.reduce((sum, writer) => sum + writer.acknowledged.size, 0)
      const start = (): Promise<Started> => startService({ env: { ...env, LOG_LEVEL: 'error' } })
      for (let round = 0; round < rounds; round++) {
        const { child, address } = await start()
        const headers = { 'content-type': 'application/json' }
        await fetch(`${address}/v1/projects/quay`, { method: 'PUT', headers, body: '{"title":"Quay"}' })
        const write = async (writer: Writer) => {
          while (await writer.send(address));
        }
        const all = Promise.all(writers.map(write))
        // One round in four before anything need have been answered, the others once records come, however slow the machine is.
        if (next() >= 0.25) {
          const before = count()
          for (let tries = 0; count() === before && tries < 400; tries++) await wait(50)
        }
        await wait(2000 * next())
        const exit = once(child, 'exit')
        child.kill('SIGKILL')
        await exit
        await all
      }
      const { child, address } = await start()
      // What was under way when the service was killed is sent again until it is answered.
      for (const writer of writers) {
        const { size } = writer.acknowledged
        while (writer.acknowledged.size === size) expect(await writer.send(address)).toBe(true)
      }
      const told = writers.flatMap((writer) => [...writer.acknowledged])
      const kept: { id: string; revision: number }[] = []
      for (let page: string | undefined = `${url}?limit=1000`; page; ) {
        const reply: Response = await fetch(address + page)
        kept.push(...((await reply.json()) as { items: typeof kept }).items)
        page = /<([^>]+)>; rel="next"/.exec(reply.headers.get('link') ?? '')?.[1]
      }
      expect(kept.map((record) => record.revision)).toEqual(kept.map((_, i) => i + 1))
      expect(kept.map((record) => record.id).sort()).toEqual(told.map(([, { id }]) => id).sort())
      const integrity = await (await fetch(`${address}/v1/projects/quay/integrity`)).json()
      expect(integrity).toMatchObject({ holds: true, records: told.length, flaws: [] })
      const [key, first] = told[0]!
      const headers = { 'content-type': 'application/json', 'idempotency-key': key }
      const again = await fetch(address + url, { method: 'POST', headers, body: schedule })
      expect([again.headers.get('idempotency-replayed'), await again.text()]).toEqual(['true', first.body])
      const exit = once(child, 'exit')
      child.kill('SIGTERM')
      expect(await exit).toEqual([0, null])
      if (env.DATA_DIR) {
        const db = new DatabaseSync(join(env.DATA_DIR, 'kentledge.sqlite'))
        expect(db.prepare('pragma integrity_check').get()).toEqual({ integrity_check: 'ok' })
        db.close()
      }
      const retries = writers.reduce((sum, writer) => sum + writer.retries, 0)
      console.info(
        `${database.name}: seed ${seed}, ${rounds} kills, ${told.length} records acknowledged, ${retries} retries`,
      )
    },
    60_000 + rounds * 20_000,
  )
})
