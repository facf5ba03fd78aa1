import type { FastifyInstance } from 'fastify'
import { afterAll, beforeAll, describe, expect, test } from 'vitest'
import { buildApp } from '../../src/app.ts'
import { readConfig } from '../../src/config.ts'
import { readExamples } from '../../src/contract/examples.ts'
import { makeKey } from '../../src/store/keys.ts'
import { openStore } from '../../src/store/open-store.ts'
import { bothDatabases } from '../store/databases.ts'
import { slowSchedule } from './slow-schedule.ts'

type Told = { id: string; state: string; done: number; caps: number | null }

const example = readExamples().assessment as Record<string, unknown>
const keys: Record<string, string> = {}

describe.each(bothDatabases())('on $name', (database) => {
  let app: FastifyInstance
  let address: string
  const apps: FastifyInstance[] = []
  /** A service on an empty database, with a project `quay` and keys where they are asked for. */
  async function serve(env: Record<string, string> = {}): Promise<FastifyInstance> {
    const store = await openStore((await database.place()).options)
    const made = await buildApp(readConfig({ LOG_LEVEL: 'silent', WORKERS: '2', ...env }), store)
    apps.push(made)
    if (env.AUTH !== 'off')
      for (const [name, projects] of [
        ['quay', 'quay'],
        ['dock', 'dock'],
      ])
        keys[name!] = (await makeKey(store, { name: name!, scopes: ['read', 'write'], projects: [projects!] })).key
    await put(made, 'quay')
    return made
  }
  const put = (to: FastifyInstance, slug: string) => ask(to, 'PUT', `/v1/projects/${slug}`, { title: slug }, slug)
  const ask = (
    to: FastifyInstance,
    method: 'GET' | 'PUT' | 'POST' | 'DELETE',
    url: string,
    payload?: object | string,
    key = 'quay',
    headers = {},
  ) =>
    to.inject({
      method,
      url,
      ...(payload && { payload }),
      headers: {
        ...(payload && { 'content-type': 'application/json' }),
        ...(keys[key] && { authorization: `Bearer ${keys[key]}` }),
        ...headers,
      },
    })
  const post = (payload: object | string, headers: Record<string, string> = {}, to = app) =>
    ask(to, 'POST', '/v1/projects/quay/assessments', payload, 'quay', { prefer: 'respond-async', ...headers })
  const get = async (id: string, to = app) => (await ask(to, 'GET', `/v1/assessments/${id}`)).json()
  /** The events of an assessment until it ends, over a connection of its own. */
  async function watch(id: string, at = address): Promise<(Told & { event: string })[]> {
    const authorization = `Bearer ${keys.quay}`
    const reply = await fetch(`${at}/v1/assessments/${id}/events`, { headers: { authorization } })
    expect(reply.headers.get('content-type')).toBe('text/event-stream; charset=utf-8')
    const parts = (await reply.text()).trim().split('\n\n')
    return parts.map((part) => {
      const [, event, data] = /^event: (\w+)\ndata: (.*)$/.exec(part)!
      return { event: event!, ...JSON.parse(data!) }
    })
  }
  const revisions = async () =>
    ((await ask(app, 'GET', '/v1/projects/quay/assessments')).json().items as { revision: number }[]).map(
      (r) => r.revision,
    )

  beforeAll(async () => {
    for (const name of Object.keys(keys)) delete keys[name]
    app = await serve()
    address = await app.listen({ port: 0, host: '127.0.0.1' })
  })
  afterAll(async () => {
    for (const made of apps) await made.close()
  })

  test('a schedule in line becomes the record that a waiting request gets, under the id of the post', async () => {
    const sync = await ask(app, 'POST', '/v1/projects/quay/assessments', example)
    const reply = await post(example)
    expect(reply.statusCode).toBe(202)
    const job = reply.json()
    expect(reply.headers).toMatchObject({
      location: `/v1/assessments/${job.id}`,
      link: `</v1/assessments/${job.id}/events>; rel="monitor"`,
      'preference-applied': 'respond-async',
      'retry-after': '1',
    })
    expect(job).toMatchObject({ project: 'quay', state: 'queued', actor: 'quay', attempts: 0 })
    expect(job).not.toHaveProperty('revision')
    const events = await watch(job.id)
    expect(events.at(-1)).toEqual({ event: 'completed', id: job.id, state: 'completed', done: 6, caps: 6 })
    const record = await get(job.id)
    const { contentHash, requestHash, traceHash, revision } = sync.json()
    expect(record).toMatchObject({ state: 'completed', contentHash, requestHash, traceHash, actor: 'quay' })
    expect(record.revision).toBe(revision + 1)
    expect((await ask(app, 'GET', '/v1/projects/quay/integrity')).json()).toMatchObject({ holds: true })
  })

  test('progress is told as caps done of caps, and never goes back', async () => {
    const { id } = (await post(slowSchedule(60))).json()
    const early = await ask(app, 'GET', `/v1/assessments/${id}`)
    expect(early.headers).toMatchObject({ 'retry-after': '1', 'cache-control': 'no-store' })
    const early409 = await ask(app, 'GET', `/v1/assessments/${id}/caps`)
    expect([early409.statusCode, early409.json().type]).toEqual([409, '/problems/assessment-not-completed'])
    const events = await watch(id)
    const running = events.filter((e) => e.state === 'running' && e.caps !== null)
    expect(running.length).toBeGreaterThan(0)
    expect(events.map((e) => e.done)).toEqual(events.map((e) => e.done).sort((a, b) => a - b))
    expect(new Set(running.map((e) => e.caps))).toEqual(new Set([60]))
    expect(events.slice(0, -1).every((e) => e.event === 'progress')).toBe(true)
    expect(events.at(-1)).toMatchObject({ event: 'completed', done: 60 })
  })

  test('a failed job embeds its problem and takes no revision', async () => {
    const before = await revisions()
    const caps = (example.caps as object[]).map((cap, i) => (i === 1 ? { ...cap, ground: 'BH9' } : cap))
    const { id } = (await post({ ...example, caps })).json()
    const { id: torn } = (await post('{"title":')).json()
    const [event] = (await watch(id)).slice(-1)
    expect(event).toMatchObject({ event: 'failed', state: 'failed' })
    const failed = await get(id)
    expect(failed.problem).toMatchObject({ type: '/problems/invalid-request', status: 422 })
    expect(failed.problem.errors[0]).toMatchObject({ pointer: '/caps/1/ground', code: 'unknown-reference' })
    expect(failed.problem.traceId).toMatch(/^[0-9a-f]{32}$/)
    expect(Date.parse(failed.finishedAt)).toBeGreaterThanOrEqual(Date.parse(failed.createdAt))
    await watch(torn)
    expect((await get(torn)).problem).toMatchObject({ type: '/problems/malformed-json', status: 400 })
    const cancel = await ask(app, 'DELETE', `/v1/assessments/${id}`)
    expect([cancel.statusCode, cancel.json().type]).toEqual([409, '/problems/assessment-ended'])
    expect(await revisions()).toEqual(before)
  })

  test('wait=N: the record where it comes in time, else 202', async () => {
    const quick = await post(example, { prefer: 'wait=30, respond-async' })
    expect([quick.statusCode, quick.headers['preference-applied']]).toEqual([201, 'wait=30'])
    expect(quick.json()).toMatchObject({ state: 'completed', revision: expect.any(Number) })
    expect(quick.headers.etag).toBe(`"${quick.json().contentHash}"`)
    const slow = await post(slowSchedule(300), { prefer: 'respond-async; x="a,b", wait="1", wait=9' })
    expect([slow.statusCode, slow.headers['preference-applied']]).toEqual([202, 'respond-async, wait=1'])
    expect((await ask(app, 'DELETE', `/v1/assessments/${slow.json().id}`)).statusCode).toBe(200)
    const sync = await post(example, { prefer: 'wait=5, return=minimal' })
    expect([sync.statusCode, sync.headers['preference-applied']]).toEqual([201, undefined])
  })

  test('one Idempotency-Key makes one job, and its retries get the answer of the first', async () => {
    const before = (await revisions()).length
    const headers = { 'idempotency-key': 'once' }
    const replies = await Promise.all(Array.from({ length: 20 }, () => post(example, headers)))
    const accepted = replies.filter((r) => r.statusCode === 202)
    expect(accepted.length).toBeGreaterThan(0)
    expect(replies.every((r) => r.statusCode === 202 || r.statusCode === 409)).toBe(true)
    expect(new Set(accepted.map((r) => r.body)).size).toBe(1)
    const { id } = accepted[0]!.json()
    await watch(id)
    const again = await post(example, headers)
    expect([again.statusCode, again.body]).toEqual([202, accepted[0]!.body])
    expect(again.headers['idempotency-replayed']).toBe('true')
    expect(again.headers.location).toBe(`/v1/assessments/${id}`)
    expect((await post({ ...example, title: 'other' }, headers)).json().type).toBe('/problems/idempotency-mismatch')
    expect((await revisions()).length).toBe(before + 1)
    const waiting = { 'idempotency-key': 'once-and-wait', prefer: 'respond-async, wait=30' }
    const first = await post(example, waiting)
    const second = await post(example, waiting)
    expect([first.statusCode, second.statusCode, second.body]).toEqual([201, 201, first.body])
  })

  test('what waits or runs can be cancelled, and leaves no record', async () => {
    const before = await revisions()
    const cancel = (id: string, key = 'quay') => ask(app, 'DELETE', `/v1/assessments/${id}`, undefined, key)
    const { id: running } = (await post(slowSchedule(600))).json()
    const { id: waiting } = (await post(example)).json()
    for (;;) if ((await get(running)).state === 'running') break
    expect((await cancel(running, 'dock')).statusCode).toBe(404)
    const cancelled = await cancel(waiting)
    expect([cancelled.statusCode, cancelled.json().state]).toEqual([200, 'cancelled'])
    expect((await cancel(waiting)).json()).toEqual(cancelled.json())
    expect((await cancel(running)).json()).toMatchObject({
      state: 'cancelled',
      problem: { type: '/problems/assessment-cancelled' },
    })
    expect((await watch(running)).map((e) => e.event)).toEqual(['cancelled'])
    // The thread is free at once: what comes after does not wait for 600 caps.
    const next = await post(example, { prefer: 'respond-async, wait=20' })
    expect(next.statusCode).toBe(201)
    const record = await cancel(next.json().id)
    expect([record.statusCode, record.json().type]).toEqual([409, '/problems/assessment-ended'])
    expect(await revisions()).toEqual([...before, before.length + 1])
    expect((await get(running)).state).toBe('cancelled')
  })

  test("another project's job is told like a missing one", async () => {
    const { id } = (await post(slowSchedule(60))).json()
    const elsewhere = (path: string, method: 'GET' | 'DELETE' = 'GET') =>
      ask(app, method, `/v1/assessments/${path}`, undefined, 'dock')
    for (const path of [id, `${id}/events`, `${id}/caps`, `${id}/content`])
      expect((await elsewhere(path)).json().type).toBe('/problems/no-such-assessment')
    expect((await elsewhere(id, 'DELETE')).statusCode).toBe(404)
    expect((await ask(app, 'DELETE', `/v1/assessments/${id}`)).statusCode).toBe(200)
  })

  test('beyond the limit of the line a post is refused with 503; metrics tell the line by state', async () => {
    const small = await serve({ JOB_QUEUE: '2', WORKERS: '1', AUTH: 'off' })
    const replies = []
    for (let i = 0; i < 4; i++) replies.push(await post(slowSchedule(300), {}, small))
    expect(replies.map((r) => r.statusCode)).toEqual([202, 202, 503, 503])
    expect([replies[3]!.headers['retry-after'], replies[3]!.json().type]).toEqual(['1', '/problems/overloaded'])
    const ids = replies.slice(0, 2).map((r) => r.json().id as string)
    for (;;) if ((await get(ids[0]!, small)).state === 'running') break
    const metrics = (await small.inject('/metrics')).body
    expect(metrics).toContain('kentledge_jobs{state="queued"} 1')
    expect(metrics).toContain('kentledge_jobs{state="running"} 1')
    expect(metrics).toMatch(/kentledge_workers_busy [01]\n/)
    for (const id of ids) {
      await ask(small, 'DELETE', `/v1/assessments/${id}`)
      expect(metrics).not.toContain(id)
    }
    expect((await small.inject('/metrics')).body).toContain('kentledge_jobs_ended_total{state="cancelled"} 2')
    expect((await post(example, {}, small)).statusCode).toBe(202)
  })

  test('a job that overruns each time is given up after three tries, and holds up nobody else', async () => {
    const strict = await serve({ WORK_TIMEOUT: '5', WORKERS: '3', AUTH: 'off' })
    // Two threads that are warm, one for each job: on a busy machine the start of a thread alone may overrun.
    const warm = () => Promise.all([1, 2].map(() => post(example, { prefer: '' }, strict)))
    for (let tries = 0; (await warm()).some((reply) => reply.statusCode !== 201); tries++)
      expect(tries).toBeLessThan(10)
    const { id: poison } = (await post(slowSchedule(4000), {}, strict)).json()
    const good = await post(example, { prefer: 'respond-async, wait=30' }, strict)
    expect(good.statusCode).toBe(201)
    expect(['queued', 'running']).toContain((await get(poison, strict)).state)
    const at = await strict.listen({ port: 0, host: '127.0.0.1' })
    expect((await watch(poison, at)).at(-1)).toMatchObject({ event: 'failed' })
    const failed = await get(poison, strict)
    expect(failed).toMatchObject({ state: 'failed', attempts: 3, problem: { type: '/problems/job-abandoned' } })
    expect(failed.problem.detail).toContain('begun 3 times')
  })
})
