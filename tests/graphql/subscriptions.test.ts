import { once } from 'node:events'
import { type Client, createClient } from 'graphql-ws'
import { afterAll, beforeAll, describe, expect, test } from 'vitest'
import { WebSocket } from 'ws'
import { slowSchedule } from '../jobs/slow-schedule.ts'
import { startService } from '../service/start-service.ts'
import { bothDatabases } from '../store/databases.ts'
import { type Seeded, seeded } from './seeded.ts'

type Told = { id: string; state: string; done: number; caps: number | null }
const query = 'subscription ($id: ID!) { assessmentProgress(id: $id) { id state done caps } }'

describe.each(bothDatabases())('on $name', (database) => {
  let all: Seeded
  let url = ''
  const keys: Record<string, string> = {}
  const clients: Client[] = []
  beforeAll(async () => {
    all = await seeded(database)
    url = (await all.app.listen({ host: '127.0.0.1', port: 0 })).replace('http', 'ws')
    keys.quay = await all.key(['read', 'write'], ['quay'])
    keys.bridge = await all.key(['read'], ['bridge'])
    keys.writer = await all.key(['write'], ['quay'])
  }, 120_000)
  afterAll(async () => {
    for (const client of clients) await client.dispose()
    await all.app.close()
  })

  function clientOf(key: string) {
    class Keyed extends WebSocket {
      constructor(address: string, protocols: string | string[]) {
        super(address, protocols, { headers: { authorization: `Bearer ${key}` } })
      }
    }
    const client = createClient({ url: `${url}/graphql`, webSocketImpl: Keyed, retryAttempts: 0, lazyCloseTimeout: 0 })
    clients.push(client)
    return client
  }
  /** Every event until the end, or the errors. */
  async function watch(key: string, id: string, document = query) {
    const events: Told[] = []
    try {
      for await (const { data, errors } of clientOf(key).iterate<{ assessmentProgress: Told }>({
        query: document,
        variables: { id },
      })) {
        if (errors) return { events, codes: errors.map((error) => error.extensions?.code) }
        events.push(data!.assessmentProgress)
      }
    } catch (fault) {
      const list = Array.isArray(fault) ? fault : [fault]
      return { events, codes: list.map((error) => error.extensions?.code ?? String(error.reason ?? error.message)) }
    }
    return { events }
  }
  const post = async (caps: number) => {
    const headers = { authorization: `Bearer ${keys.quay}`, prefer: 'respond-async' }
    const payload = slowSchedule(caps)
    const reply = await all.app.inject({ method: 'POST', url: '/v1/projects/quay/assessments', headers, payload })
    expect(reply.statusCode).toBe(202)
    return reply.json().id as string
  }

  test('the progress of an assessment until it is a record; jobs are listed meanwhile', async () => {
    const id = await post(12)
    const listed = await all.send(
      '{ jobs(project: "quay") { totalCount nodes { id projectSlug state done caps attempts } } }',
    )
    expect(listed.data.jobs).toMatchObject({ totalCount: 1, nodes: [{ id, projectSlug: 'quay' }] })
    const { events } = await watch(keys.quay!, id)
    expect(events.length).toBeGreaterThan(1)
    expect(events.map((event) => event.done)).toEqual([...events.map((event) => event.done)].sort((a, b) => a - b))
    expect(events.at(-1)).toEqual({ id, state: 'completed', done: 12, caps: 12 })
    expect((await all.send('{ jobs { totalCount } }')).data.jobs.totalCount).toBe(0)
    expect((await all.send(`{ assessment(id: "${id}") { summary { caps } } }`)).data.assessment.summary.caps).toBe(12)
    // Of what is completed one event is told.
    expect((await watch(keys.quay!, all.quay[0]!)).events).toMatchObject([{ state: 'completed' }])
  })

  test('refusals: no key, another project, no scope, no such assessment, queries, limits', async () => {
    const told = async (key: string, id = all.quay[0]!, document = query) => (await watch(key, id, document)).codes
    expect(await told('nonsense')).toEqual([expect.stringContaining('401')])
    expect(await told(keys.bridge!)).toEqual(['no-such-assessment'])
    expect(await told(keys.writer!)).toEqual(['missing-scope'])
    expect(await told(keys.quay!, 'none')).toEqual(['no-such-assessment'])
    expect(await told(keys.quay!, '', '{ limits { depth } }')).toEqual(['graphql-request'])
    expect(await told(keys.quay!, '', 'subscription { none }')).toEqual(['graphql-invalid'])
    expect(await told(keys.quay!, '', `subscription { ${'a '.repeat(3000)} }`)).toEqual(['too-many-tokens'])
    const aliases = Array.from({ length: 40 }, (_, i) => `a${i}: id`).join(' ')
    expect(
      await told(keys.quay!, '1', `subscription ($id: ID!) { assessmentProgress(id: $id) { ${aliases} } }`),
    ).toEqual(['too-many-aliases'])
  })

  test('a socket that is refused is closed', async () => {
    const open = () => new Promise<number>((resolve) => all.app.server.getConnections((_, count) => resolve(count)))
    await expect.poll(open, { timeout: 10_000 }).toBe(0)
    await watch('nonsense', all.quay[0]!)
    await expect.poll(open, { timeout: 10_000 }).toBe(0)
  })

  test('so many subscriptions in one socket and no more; they end with the service', async () => {
    const id = await post(400)
    const client = clientOf(keys.quay!)
    const codes: unknown[] = []
    const streams = Array.from({ length: 11 }, () => client.iterate({ query, variables: { id } }))
    const ends = streams.map(async (stream) => {
      try {
        for await (const { errors } of stream) codes.push(...(errors ?? []).map((error) => error.extensions?.code))
      } catch (fault) {
        if (Array.isArray(fault)) codes.push(...fault.map((error) => error.extensions?.code))
      }
    })
    await expect.poll(() => codes, { timeout: 20_000 }).toEqual(['too-many-subscriptions'])
    await all.app.close()
    await Promise.all(ends)
  })
})

test('SIGTERM: a socket that watches is told that the service stops, and holds it up no longer', async () => {
  const { child, address } = await startService({ env: { AUTH: 'off', WORKERS: '1' } })
  const json = { 'content-type': 'application/json' }
  await fetch(`${address}/v1/projects/quay`, { method: 'PUT', headers: json, body: '{ "title": "Quay" }' })
  const asked = {
    method: 'POST',
    headers: { ...json, prefer: 'respond-async' },
    body: JSON.stringify(slowSchedule(400)),
  }
  const { id } = (await (await fetch(`${address}/v1/projects/quay/assessments`, asked)).json()) as { id: string }
  const client = createClient({
    url: `${address.replace('http', 'ws')}/graphql`,
    webSocketImpl: WebSocket,
    retryAttempts: 0,
  })
  const closed = new Promise<number>((resolve) => client.on('closed', (event) => resolve((event as CloseEvent).code)))
  const stream = client.iterate({ query, variables: { id } })
  expect((await stream.next()).value).toMatchObject({ data: { assessmentProgress: { id } } })
  const exit = once(child, 'exit')
  child.kill('SIGTERM')
  expect(await closed).toBe(1001)
  expect((await exit)[0]).toBe(0)
  await expect(
    (async () => {
      for await (const _ of stream);
    })(),
  ).rejects.toMatchObject({ code: 1001 })
})
