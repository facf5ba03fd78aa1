import { setTimeout as wait } from 'node:timers/promises'
import type { FastifyInstance } from 'fastify'
import { afterEach, describe, expect, test } from 'vitest'
import { buildApp } from '../../src/app.ts'
import { readConfig } from '../../src/config.ts'
import { readExamples } from '../../src/contract/examples.ts'
import { openStore } from '../../src/store/open-store.ts'
import { bothDatabases } from '../store/databases.ts'

/** Every third call fails in its turn; with ROUNDS each one. */
const stride = process.env.ROUNDS ? 1 : 3
const schedule = JSON.stringify(readExamples().assessment)
let app: FastifyInstance | undefined
afterEach(() => app?.close())

describe.each(bothDatabases())('on $name', (database) => {
  test('a fault at the n-th call of the store while a job is posted and run: it ends all the same, as one record', async () => {
    let [calls, faultAt] = [0, Number.POSITIVE_INFINITY]
    const watch = () => {
      calls++
      if (calls === faultAt) throw new Error('injected')
    }
    const store = await openStore({ ...(await database.place()).options, watch })
    app = await buildApp(readConfig({ LOG_LEVEL: 'silent', WORKERS: '1' }), store)
    const ask = async (method: 'GET' | 'PUT' | 'POST', url: string, payload?: string, headers = {}) => {
      const json = { 'content-type': 'application/json', ...headers }
      const reply = await app!.inject({ method, url, ...(payload && { payload, headers: json }) })
      const isTold = reply.statusCode < 300 || [409, 503].includes(reply.statusCode)
      expect([url, isTold ? 0 : reply.body]).toEqual([url, 0])
      return reply
    }
    const make = (slug: string) => ask('PUT', `/v1/projects/${slug}`, JSON.stringify({ title: slug }))
    /** Posts until it is acknowledged, as a client does, and waits until the record is there. */
    const walk = async (slug: string) => {
      const headers = { prefer: 'respond-async', 'idempotency-key': slug }
      for (let tries = 0; ; tries++) {
        const reply = await ask('POST', `/v1/projects/${slug}/assessments`, schedule, headers)
        if (reply.statusCode === 202) return reply.json().id as string
        expect(tries).toBeLessThan(300)
        await wait(50)
      }
    }
    const end = async (id: string) => {
      for (let tries = 0; tries < 500; tries++) {
        const { state } = (await ask('GET', `/v1/assessments/${id}`)).json()
        if (state === 'completed') return
        expect(state).not.toBe('failed')
        await wait(20)
      }
      throw new Error(`${id} does not end`)
    }

    await make('whole')
    calls = 0
    await end(await walk('whole'))
    const count = calls
    const hashes = new Set<string>()
    let met = 0
    for (let n = 1; n <= Math.min(count, 40); n += stride) {
      await make(`p${n}`)
      calls = 0
      faultAt = n
      await end(await walk(`p${n}`))
      if (calls >= n) met++
      faultAt = Number.POSITIVE_INFINITY
      const { items } = (await ask('GET', `/v1/projects/p${n}/assessments`)).json()
      expect(items).toHaveLength(1)
      hashes.add(items[0].contentHash)
    }
    expect(hashes.size).toBe(1)
    expect(met).toBeGreaterThan(20 / stride)
    console.info(`${database.name}: a fault at ${met} calls of the store, one after the other`)
  }, 300_000)
})
