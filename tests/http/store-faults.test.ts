import type { FastifyInstance } from 'fastify'
import { afterEach, describe, expect, test } from 'vitest'
import { buildApp } from '../../src/app.ts'
import { readConfig } from '../../src/config.ts'
import { readExamples } from '../../src/contract/examples.ts'
import { openStore } from '../../src/store/open-store.ts'
import { bothDatabases } from '../store/databases.ts'

const schedule = JSON.stringify(readExamples().assessment)
const json = { 'content-type': 'application/json' }
let app: FastifyInstance | undefined
afterEach(() => app?.close())

describe.each(bothDatabases())('on $name', (database) => {
  test('a fault at the n-th call of the store, for every n: a problem each time, and nothing acknowledged is missing', async () => {
    let [calls, faultAt] = [0, Number.POSITIVE_INFINITY]
    const watch = () => {
      calls++
      if (calls === faultAt) throw new Error('injected')
    }
    const store = await openStore({ ...(await database.place()).options, watch })
    app = await buildApp(readConfig({ LOG_LEVEL: 'silent', WORKERS: '1' }), store)
    const ask = async (method: 'GET' | 'PUT' | 'POST', url: string, payload?: string, headers = {}) => {
      const reply = await app!.inject({ method, url, ...(payload && { payload, headers: { ...json, ...headers } }) })
      const whole = reply.statusCode < 300 || reply.json().type === '/problems/store-unavailable'
      expect([url, whole, reply.statusCode, reply.body.slice(0, 200)]).toEqual([
        url,
        true,
        reply.statusCode,
        reply.body.slice(0, 200),
      ])
      if (!whole) expect(reply.headers['content-type']).toContain('application/problem+json')
      return reply
    }
    const put = (slug: string) => ask('PUT', `/v1/projects/${slug}`, JSON.stringify({ title: slug }))
    const post = (slug: string) =>
      ask('POST', `/v1/projects/${slug}/assessments`, schedule, { 'idempotency-key': slug })
    const sign = (id: string) =>
      ask('POST', `/v1/assessments/${id}/signatures`, JSON.stringify({ role: 'originator', meaning: 'mine' }))

    /** A project, a record, a signature, and all of it read: what was acknowledged by a status of success. */
    const walk = async (slug: string) => {
      const project = await put(slug)
      if (project.statusCode !== 201) return {}
      const record = await post(slug)
      if (record.statusCode !== 201) return { project: slug }
      const { id } = record.json() as { id: string }
      const signature = await sign(id)
      for (const url of [
        `/v1/projects/${slug}`,
        `/v1/projects/${slug}/assessments`,
        `/v1/projects/${slug}/integrity`,
        `/v1/assessments/${id}`,
        `/v1/assessments/${id}/content`,
        `/v1/assessments/${id}/caps`,
        `/v1/assessments/${id}/caps/A1`,
        `/v1/assessments/${id}/signatures`,
      ])
        await ask('GET', url)
      return { project: slug, record: id, body: record.body, signed: signature.statusCode === 201 }
    }

    await walk('warm')
    calls = 0
    await walk('whole')
    const count = calls
    expect(count).toBeGreaterThan(40)
    for (let n = 1; n <= count; n++) {
      const slug = `p${n}`
      calls = 0
      faultAt = n
      const told = await walk(slug)
      expect(calls, `fault ${n}`).toBeGreaterThanOrEqual(n)
      faultAt = Number.POSITIVE_INFINITY
      // The client tries again, as it would, and finds one record: the one it was told of, if it was.
      expect((await put(slug)).statusCode).toBe(told.project ? 200 : 201)
      let again = await post(slug)
      for (let tries = 0; again.statusCode === 409 && tries < 100; tries++) again = await post(slug)
      if (told.body) expect(again.body).toBe(told.body)
      const records = (await ask('GET', `/v1/projects/${slug}/assessments`)).json().items
      expect(records.map((r: { id: string }) => r.id)).toEqual([again.json().id])
      const signatures = (await ask('GET', `/v1/assessments/${again.json().id}/signatures`)).json().items
      if (told.signed !== undefined) expect(signatures).toHaveLength(told.signed ? 1 : 0)
      expect((await ask('GET', `/v1/projects/${slug}/integrity`)).json()).toMatchObject({ holds: true, records: 1 })
    }
    console.info(`${database.name}: ${count} calls of the store, a fault at each`)
  }, 300_000)
})
