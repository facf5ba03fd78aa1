import type { FastifyInstance } from 'fastify'
import { afterAll, beforeAll, describe, expect, test } from 'vitest'
import { buildApp } from '../../src/app.ts'
import { readConfig } from '../../src/config.ts'
import { readExamples } from '../../src/contract/examples.ts'
import { access, accessOf } from '../../src/http/access.ts'
import { type Scope, scopes } from '../../src/store/actor.ts'
import { makeKey } from '../../src/store/keys.ts'
import { openStore } from '../../src/store/open-store.ts'

/** Object and function authorization, made from the table of routes: every route with every key. */

const keys = new Map<string, string>()
const rows = Object.entries(access).map(([route, needed]) => {
  const [method, url] = route.split(' ') as ['GET' | 'POST' | 'PUT' | 'DELETE', string]
  return { route, method, url, needed }
})
let app: FastifyInstance
let id = ''
beforeAll(async () => {
  const store = await openStore()
  app = await buildApp(readConfig({ LOG_LEVEL: 'silent', WORKERS: '1' }), store)
  const make = async (label: string, own: readonly Scope[], projects: string[], more = {}) =>
    keys.set(label, (await makeKey(store, { name: label, scopes: own, projects, ...more })).key)
  const every: readonly Scope[] = scopes.filter((scope) => scope !== 'admin')
  await make('admin', ['admin'], ['*'])
  for (const scope of every)
    await make(
      `without ${scope}`,
      every.filter((s) => s !== scope),
      ['quay'],
    )
  await make('all on quay', every, ['quay'])
  await make('all elsewhere', every, ['bridge'])
  await make('expired', every, ['quay'], { expiresAt: new Date(0) })
  expect((await ask('PUT', '/v1/projects/quay', 'admin', { title: 'Quay' })).statusCode).toBe(201)
  expect((await ask('PUT', '/v1/projects/bridge', 'admin', { title: 'Bridge' })).statusCode).toBe(201)
  const made = await ask('POST', '/v1/projects/quay/assessments', 'admin', readExamples().assessment as object)
  id = made.json().id
})
afterAll(() => app.close())

const fill = (url: string) =>
  url
    .replace(':slug', 'quay')
    .replace(':id', url.includes('assessments') ? id : 'navfac-1986')
    .replace(':mark', 'A1')
    .replace(':code', 'overloaded')
function ask(method: 'GET' | 'POST' | 'PUT' | 'DELETE', url: string, key: string | undefined, body?: object) {
  const authorization = key && `Bearer ${keys.get(key) ?? key}`
  const payload = method === 'GET' ? undefined : (body ?? {})
  return app.inject({ method, url, ...(payload && { payload }), headers: { ...(authorization && { authorization }) } })
}

test('the table holds every route, and no other', () => {
  const path: string[] = []
  const registered = app
    .printRoutes({ commonPrefix: false })
    .split('\n')
    .flatMap((line) => {
      const found = /^(.*)[├└]── (\S+)(?: \((.*)\))?/.exec(line)
      if (!found) return []
      path.length = found[1]!.length / 4
      path.push(found[2]!)
      const methods = found[3]?.split(', ') ?? []
      return methods.filter((m) => m !== 'HEAD' && m !== 'OPTIONS').map((method) => `${method} ${path.join('')}`)
    })
  const page = (route: string) => /^GET \/(reference|graphql\/explorer)(\/|$)/.test(route)
  expect(registered.filter((route) => !page(route)).sort()).toEqual(Object.keys(access).sort())
  expect(registered.filter(page).length).toBeGreaterThan(1)
  expect(accessOf('POST', '/v1/new')).toEqual(['admin'])
})

describe.each(rows)('$route', ({ method, url, needed }) => {
  const status = async (key: string | undefined) => (await ask(method, fill(url), key)).statusCode
  const isObject = url.includes(':slug') || url.includes('/v1/assessments/:id')

  test('without a key, or with one that is unknown or expired', async () => {
    for (const key of [undefined, 'nonsense', 'expired']) {
      const reply = await ask(method, fill(url), key)
      if (needed === 'public') expect(reply.statusCode).toBe(200)
      else
        expect([reply.statusCode, reply.headers['www-authenticate'], reply.json().type]).toEqual([
          401,
          'Bearer',
          '/problems/unauthenticated',
        ])
    }
  })

  test('with each scope missing', async () => {
    for (const scope of scopes.filter((s) => s !== 'admin')) {
      const refused = Array.isArray(needed) && needed.includes(scope)
      if (refused) expect([scope, await status(`without ${scope}`)]).toEqual([scope, 403])
      else expect([401, 403, 404]).not.toContain(await status(`without ${scope}`))
    }
  })

  test('with all scopes: on its project, as administrator, and on another project', async () => {
    for (const key of ['all on quay', 'admin']) expect([401, 403, 404]).not.toContain(await status(key))
    const elsewhere = await status('all elsewhere')
    if (isObject) expect(elsewhere).toBe(404)
    else expect([401, 403, 404]).not.toContain(elsewhere)
  })
})

test("another project's record is told like a missing one", async () => {
  const gone = id.replace(/.$/, (last) => (last === '0' ? '1' : '0'))
  for (const rest of [
    '',
    '/events',
    '/content',
    '/caps',
    '/caps/A1',
    '/signatures',
    '/sheet',
    '/caps/A1/sheet',
    '/piles',
    '/piles.csv',
  ]) {
    const told = async (one: string) => {
      const { traceId, ...document } = (await ask('GET', `/v1/assessments/${one}${rest}`, 'all elsewhere')).json()
      return JSON.stringify(document).replaceAll(one, 'ID')
    }
    expect(await told(id)).toBe(await told(gone))
  }
  const projects = (await ask('GET', '/v1/projects', 'all elsewhere')).json().items as { slug: string }[]
  expect(projects.map((p) => p.slug)).toEqual(['bridge'])
})

test('a calculator of GraphQL needs the scope of its route', async () => {
  const query = 'query ($r: SinglePileRequestInput!) { singlePile(request: $r) { result { toeDepth } } }'
  const variables = { r: readExamples()['single-pile'] }
  const send = async (key: string) => (await ask('POST', '/graphql', key, { query, variables })).json()
  expect((await send('without calculate')).errors[0].extensions).toMatchObject({ code: 'missing-scope', status: 403 })
  expect((await send('all on quay')).data.singlePile.result.toeDepth).toBeGreaterThan(0)
})
