import { Ajv2020 } from 'ajv/dist/2020.js'
import type { FastifyInstance } from 'fastify'
import { afterAll, beforeAll, describe, expect, test } from 'vitest'
import { KentledgeProblem, kentledge, type Schemas } from '../../schema/client.ts'
import { buildApp } from '../../src/app.ts'
import { readConfig } from '../../src/config.ts'
import { readExamples } from '../../src/contract/examples.ts'
import { openapi } from '../../src/contract/openapi.ts'
import { makeKey } from '../../src/store/keys.ts'
import { openStore, type Store } from '../../src/store/open-store.ts'
import { slowSchedule } from '../jobs/slow-schedule.ts'

/** Every answer of the routes of projects and records against the schema that the document names for its status. */
type Response = { content?: Record<string, { schema: { $ref?: string } }> }
type Operation = {
  responses: Record<string, Response>
  requestBody?: { content: Record<string, { example?: unknown }> }
}

const document = openapi(readExamples())
const paths = document.paths as Record<string, Record<string, Operation>>
const ajv = new Ajv2020({ strict: false, allErrors: true })
ajv.addSchema({ $id: 'contract', components: document.components })
const example = readExamples().assessment as Schemas['Schedule']

let app: FastifyInstance
let store: Store
let baseUrl: string
beforeAll(async () => {
  store = await openStore()
  app = await buildApp(readConfig({ LOG_LEVEL: 'silent', WORKERS: '1', BODY_LIMIT: '1000000' }), store)
  baseUrl = await app.listen({ port: 0, host: '127.0.0.1' })
})
afterAll(() => app.close())

/** Sends a request to a documented path and holds the answer to what is documented for its status. */
async function send(
  method: 'GET' | 'PUT' | 'POST' | 'DELETE',
  path: string,
  at: Record<string, string>,
  more: object = {},
) {
  const url = path.replaceAll(/\{(\w+)\}/g, (_, name: string) => encodeURIComponent(at[name]!)) + (at.query ?? '')
  const operation = paths[path]![method.toLowerCase()]!
  const reply = await app.inject({ method, url, ...more })
  const documented = operation.responses[reply.statusCode]
  expect(documented, `${method} ${path} ${reply.statusCode}`).toBeDefined()
  const type = String(reply.headers['content-type'] ?? '').split(';')[0]!
  if (reply.statusCode !== 304) {
    const name = documented!.content![type]?.schema.$ref
    expect(documented!.content![type], `${method} ${path} ${reply.statusCode} ${type}`).toBeDefined()
    if (name) {
      const validate = ajv.getSchema(`contract${name}`)!
      expect(validate(reply.json()) ? [] : validate.errors, `${method} ${path} ${reply.statusCode}`).toEqual([])
    }
  }
  return reply
}

test('every route of records, in each of its statuses that a request can bring about', async () => {
  const slug = 'quay'
  const project = '/v1/projects/{slug}'
  const assessments = `${project}/assessments`
  const record = '/v1/assessments/{id}'
  const statuses: Record<string, number[]> = {}
  const tell = async (
    method: 'GET' | 'PUT' | 'POST' | 'DELETE',
    path: string,
    at: Record<string, string>,
    more: object = {},
  ) => {
    const reply = await send(method, path, at, more)
    const list = statuses[`${method} ${path}`] ?? []
    statuses[`${method} ${path}`] = list
    list.push(reply.statusCode)
    return reply
  }
  const json = (payload: unknown, headers = {}) => ({
    payload: JSON.stringify(payload),
    headers: { 'content-type': 'application/json', ...headers },
  })
  const put = paths[project]!.put!.requestBody!.content['application/json']!.example
  await tell('PUT', project, { slug }, json(put))
  await tell('PUT', project, { slug }, json(put))
  await tell('PUT', project, { slug }, json({ title: 'Other' }))
  await tell('PUT', project, { slug }, json({ title: 'Other' }, { 'if-match': '"stale"' }))
  await tell('PUT', project, { slug }, { payload: '{', headers: { 'content-type': 'application/json' } })
  await tell('PUT', project, { slug }, { payload: 'x', headers: { 'content-type': 'text/xml' } })
  await tell('PUT', project, { slug }, json({ title: '' }))
  const { etag } = (await tell('GET', project, { slug })).headers
  await tell('GET', project, { slug }, { headers: { 'if-none-match': etag } })
  await tell('GET', project, { slug: 'none' })
  await tell('GET', '/v1/projects', {})
  await tell('GET', '/v1/projects', { query: '?limit=0' })
  await tell('GET', '/v1/projects', {}, { headers: { accept: 'image/png' } })

  const made = await tell('POST', assessments, { slug }, json(example))
  const { id } = made.json() as { id: string }
  await tell('POST', assessments, { slug }, json(example))
  await tell('POST', assessments, { slug: 'none' }, json(example))
  await tell('POST', assessments, { slug }, json({ ...example, hash: 'x' }))
  await tell('POST', assessments, { slug }, { payload: '{', headers: { 'content-type': 'application/json' } })
  await tell('POST', assessments, { slug }, { payload: 'x', headers: { 'content-type': 'text/csv' } })
  await tell('POST', assessments, { slug }, json({ title: 'x'.repeat(1_100_000) }))
  const queued = (await tell('POST', assessments, { slug }, json(example, { prefer: 'respond-async' }))).json()
  const cancelled = (await tell('POST', assessments, { slug }, json(example, { prefer: 'respond-async' }))).json()
  expect(queued.state).toBe('queued')
  // One worker: the second waits for the first.
  await tell('DELETE', record, { id: cancelled.id })
  await tell('DELETE', record, { id: cancelled.id })
  await tell('DELETE', record, { id })
  await tell('DELETE', record, { id: 'none' })
  await tell('GET', record, { id: cancelled.id })
  for (const rest of ['/content', '/caps', '/signatures']) await tell('GET', record + rest, { id: cancelled.id })
  await tell('GET', record, { id: queued.id })
  const events = (await tell('GET', `${record}/events`, { id: queued.id })).body
  expect(events.trim().split('\n\n').at(-1)).toMatch(/^event: completed\ndata: \{.*\}$/)
  for (const [, data] of events.matchAll(/^data: (.*)$/gm))
    expect(ajv.getSchema('contract#/components/schemas/JobProgress')!(JSON.parse(data!))).toBe(true)
  await tell('GET', `${record}/events`, { id: 'none' })
  await tell('GET', `${record}/events`, { id }, { headers: { accept: 'application/json' } })
  await tell('GET', record, { id: queued.id })
  await tell('GET', assessments, { slug, query: '?limit=1' })
  await tell('GET', assessments, { slug: 'none' })
  await tell('GET', `${project}/integrity`, { slug })
  await tell('GET', `${project}/integrity`, { slug, query: '?hash=x' })

  for (const rest of ['', '/content', '/caps']) {
    const tag = (await tell('GET', record + rest, { id })).headers.etag
    await tell('GET', record + rest, { id }, { headers: { 'if-none-match': tag } })
    await tell('GET', record + rest, { id: 'none' })
    await tell('GET', record + rest, { id, query: '?x=1' })
  }
  await tell('GET', `${record}/caps`, { id, query: '?limit=1' }, { headers: { accept: 'text/csv' } })
  await tell('GET', `${record}/caps/{mark}`, { id, mark: 'A1' })
  await tell('GET', `${record}/caps/{mark}`, { id, mark: 'A1', query: '?trace=none' })
  await tell('GET', `${record}/caps/{mark}`, { id, mark: 'none' })
  const piles = ['/piles', '/piles.csv'].map((rest) => record + rest)
  for (const path of piles) {
    const { headers } = await tell('GET', path, { id })
    await tell('GET', path, { id }, { headers: { 'if-none-match': headers.etag } })
  }
  for (const path of [...piles, `${record}/sheet`, `${record}/caps/{mark}/sheet`, `${project}/plan`]) {
    const at = { id, slug, mark: 'A1' }
    await tell('GET', path, at, { headers: path.endsWith('.csv') ? {} : { accept: 'text/html' } })
    await tell('GET', path, at, { headers: { accept: 'application/json' } })
    await tell('GET', path, { ...at, query: '?x=1' })
    await tell('GET', path, { id: 'none', slug: 'none', mark: 'A1' })
  }
  await tell('GET', `${record}/changes`, { id })
  const [first, ...others] = example.caps
  const bent = { ...example, caps: [{ ...first, capWeight: 777 }, ...others] }
  const next = (await tell('POST', assessments, { slug }, json(bent))).json().id
  const changed = await tell('GET', `${record}/changes`, { id: next })
  expect(changed.json().inputs).toMatchObject([{ part: 'cap', field: 'capWeight', after: 777, unit: 'kN' }])
  await tell(
    'GET',
    `${record}/changes`,
    { id: next, query: `?since=${id}` },
    { headers: { 'if-none-match': changed.headers.etag } },
  )
  await tell('GET', `${record}/changes`, { id: next, query: '?since=none' })
  const signature = paths[`${record}/signatures`]!.post!.requestBody!.content['application/json']!.example
  await tell('POST', `${record}/signatures`, { id }, json(signature))
  await tell('POST', `${record}/signatures`, { id }, json(signature))
  await tell('POST', `${record}/signatures`, { id }, json({ role: 'king', meaning: 'x' }))
  await tell('GET', `${record}/signatures`, { id })
  await tell('POST', `${record}/reverify`, { id })
  await tell('POST', `${record}/reverify`, { id: 'none' })

  const { key } = await makeKey(store, { name: 'reader', scopes: ['read'], projects: [slug] })
  await tell('GET', project, { slug })
  await tell('PUT', project, { slug }, json(put, { authorization: `Bearer ${key}` }))
  const stored = Object.entries(paths).flatMap(([path, operations]) =>
    /projects|assessments\/\{/.test(path) ? Object.keys(operations).map((m) => `${m.toUpperCase()} ${path}`) : [],
  )
  expect(Object.keys(statuses).sort()).toEqual(stored.sort())
  expect(new Set(Object.values(statuses).flat())).toEqual(
    new Set([200, 201, 202, 304, 400, 401, 403, 404, 406, 409, 412, 413, 415, 422, 428]),
  )
})

describe('the typed client', () => {
  test('keeps a schedule, reads it back, signs it; a retry after a lost answer makes no second record', async () => {
    const { key } = await makeKey(store, {
      name: 'Exporter',
      scopes: ['calculate', 'read', 'write', 'sign'],
      projects: ['dock'],
    })
    let lost = 0
    const lossy: typeof fetch = async (input, init) => {
      const reply = await fetch(input, init)
      if (new URL((input as Request).url).pathname !== '/v1/projects/dock/assessments' || lost > 0) return reply
      lost++
      await reply.arrayBuffer()
      throw new TypeError('the connection was lost')
    }
    const client = kentledge({ baseUrl, key, fetch: lossy })
    expect(await client.putProject('dock', 'Dock')).toMatchObject({ slug: 'dock', revision: 0 })
    const record = await client.record('dock', example)
    expect([lost, record.revision, record.actor]).toEqual([1, 1, 'Exporter'])
    expect((await client.assessments('dock')).items.map((r) => r.id)).toEqual([record.id])
    const marks: string[] = []
    for await (const cap of client.caps(record.id)) marks.push(cap.mark)
    expect(marks).toEqual(example.caps.map((cap) => cap.mark))
    expect((await client.cap(record.id, marks[0]!)).result.checks.length).toBeGreaterThan(0)
    const second = await client.record('dock', { ...example, title: 'Second' })
    expect((await client.changes(second.id)).inputs).toMatchObject([
      { part: 'title', before: example.title, after: 'Second' },
    ])
    expect((await client.sign(record.id, { role: 'originator', meaning: 'mine' })).signedHash).toBe(record.recordHash)
    const { checkpoint, holds } = await client.integrity('dock')
    expect([holds, checkpoint]).toEqual([true, { revision: 2, hash: second.recordHash }])
    expect((await client.integrity('dock', checkpoint)).holds).toBe(true)
    expect((await client.reverify(record.id)).identical).toBe(true)
    const fault = await client.assessment('none').catch((e: unknown) => e)
    expect((fault as KentledgeProblem).problem.type).toBe('/problems/no-such-assessment')
    expect(fault).toBeInstanceOf(KentledgeProblem)
  })

  test('puts a schedule in line, waits for its record, and hears why there is none', async () => {
    const { key } = await makeKey(store, { name: 'Pipeline', scopes: ['read', 'write'], projects: ['pier'] })
    const client = kentledge({ baseUrl, key })
    await client.putProject('pier', 'Pier')
    const { id, state } = await client.queue('pier', example)
    expect(state).toBe('queued')
    const told: Schemas['Job']['progress'][] = []
    const record = await client.waitFor(id, (progress) => told.push(progress))
    expect(record).toMatchObject({ id, revision: 1, state: 'completed', actor: 'Pipeline' })
    expect(told.length).toBeGreaterThan(0)
    const problemOf = (run: Promise<unknown>) => run.catch((e: unknown) => (e as KentledgeProblem).problem.type)
    const wrong = { ...example, title: '' }
    expect(await problemOf(client.queue('pier', wrong).then((job) => client.waitFor(job.id)))).toBe(
      '/problems/invalid-request',
    )
    const one = await client.queue('pier', slowSchedule(300) as never)
    expect((await client.cancel(one.id)).state).toBe('cancelled')
    expect(await problemOf(client.waitFor(one.id))).toBe('/problems/assessment-cancelled')
    expect(await problemOf(client.cancel(id))).toBe('/problems/assessment-ended')
  })
})
