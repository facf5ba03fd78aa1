import { readFileSync } from 'node:fs'
import type { FastifyInstance } from 'fastify'
import { afterAll, beforeAll, expect, test } from 'vitest'
import { buildApp } from '../../src/app.ts'
import { readConfig } from '../../src/config.ts'
import { catalogue } from '../../src/errors.ts'

type Body = Record<string, unknown>
type Case = {
  id: string
  request: Body & { layout: Body }
  expected: Record<'single' | 'block' | 'group', Record<string, number | string>>
}
const { cases } = JSON.parse(readFileSync(new URL('../published/capacity.json', import.meta.url), 'utf8')) as {
  cases: Case[]
}

let app: FastifyInstance
beforeAll(async () => {
  app = await buildApp(readConfig({ LOG_LEVEL: 'silent', BODY_LIMIT: '150000' }))
})
afterAll(() => app.close())

const post = (url: string, payload: unknown) =>
  app.inject({
    method: 'POST',
    url,
    payload: typeof payload === 'string' ? payload : JSON.stringify(payload),
    headers: { 'content-type': 'application/json' },
  })

const pile = { section: { shape: 'circular', diameter: 0.75 }, length: 14, headDepth: 1, installation: 'bored' }
const clay = { name: 'stiff clay', unitWeight: 20, soil: 'cohesive', undrainedShearStrength: 100 }
const request = { pile, ground: { layers: [clay] } }

test.each(cases.map((c) => [c.id, c] as const))('%s through the routes', async (_, c) => {
  const { layout, ...single } = c.request
  const asked = {
    'single-pile': [single, c.expected.single],
    block: [c.request, c.expected.block],
    group: [c.request, c.expected.group],
  } as const
  for (const [route, [body, expected]] of Object.entries(asked)) {
    const reply = await post(`/v1/${route}`, body)
    expect(reply.statusCode, reply.body.slice(0, 300)).toBe(200)
    const { result, notices, meta } = reply.json()
    for (const [field, value] of Object.entries(expected)) {
      if (typeof value === 'string') expect(result[field]).toBe(value)
      else expect(Math.abs(result[field] - value) / Math.abs(value), field).toBeLessThan(1e-6)
    }
    expect(notices[0].code).toBe('usual-cautions')
    expect(meta.requestHash).toMatch(/^sha256:[0-9a-f]{64}$/)
  }
})

test('the same request in other units gives the same result and hash', async () => {
  const feet = {
    pile: { ...pile, section: { shape: 'circular', diameter: '750 mm' }, length: '1400 cm', headDepth: '1000 mm' },
    ground: { layers: [{ ...clay, undrainedShearStrength: '0.1 MPa' }] },
  }
  const [a, b] = [(await post('/v1/single-pile', request)).json(), (await post('/v1/single-pile', feet)).json()]
  expect(b.result).toEqual(a.result)
  expect(b.meta.requestHash).toBe(a.meta.requestHash)
})

test('the trace can be left out, or cut to one number', async () => {
  const whole = (await post('/v1/single-pile', request)).json()
  const none = (await post('/v1/single-pile?trace=none', request)).json()
  const base = (await post('/v1/single-pile?of=/unitBaseResistance', request)).json()
  expect(none.trace).toBeUndefined()
  expect(none.result).toEqual(whole.result)
  expect(base.trace.steps.length).toBeLessThan(whole.trace.steps.length)
  expect(base.trace.steps.at(-1).value).toBe(whole.result.unitBaseResistance)
})

const bad: [string, Body, [pointer: string, code: string][]][] = [
  [
    'a stress as a diameter',
    { ...request, pile: { ...pile, section: { shape: 'circular', diameter: '600 kPa' } } },
    [['/pile/section/diameter', 'wrong-dimension']],
  ],
  [
    'a misspelt field',
    { ...request, ground: { layers: [{ ...clay, undrainedShearStrenght: 3 }] } },
    [['/ground/layers/0/undrainedShearStrenght', 'unknown-field']],
  ],
  [
    'a layer without strength',
    { ...request, ground: { layers: [{ name: 'clay', unitWeight: 20, soil: 'cohesive' }] } },
    [['/ground/layers/0', 'missing-parameter']],
  ],
  [
    'a pile longer than the known ground',
    { ...request, ground: { layers: [{ ...clay, thickness: 10 }] } },
    [['/pile/length', 'pile-below-known-ground']],
  ],
  ['no layer', { ...request, ground: { layers: [] } }, [['/ground/layers', 'too-few-items']]],
  [
    'negative strength',
    { ...request, ground: { layers: [{ ...clay, undrainedShearStrength: -3 }] } },
    [['/ground/layers/0/undrainedShearStrength', 'out-of-range']],
  ],
  ['a missing pile', { ground: request.ground }, [['/pile', 'missing-field']]],
  [
    'an unknown method',
    { ...request, methods: { cohesiveShaft: 'guess' } },
    [['/methods/cohesiveShaft', 'unknown-choice']],
  ],
  [
    'two faults at once',
    { ...request, colour: 1, pile: { ...pile, length: '14 kN' } },
    [
      ['/pile/length', 'wrong-dimension'],
      ['/colour', 'unknown-field'],
    ],
  ],
  [
    'a wrong side of a varying strength',
    { ...request, ground: { layers: [{ ...clay, undrainedShearStrength: { top: 3, bottom: '4 m' } }] } },
    [['/ground/layers/0/undrainedShearStrength/bottom', 'wrong-dimension']],
  ],
]
test.each(bad)('%s is told as it is', async (_, body, faults) => {
  const reply = await post('/v1/single-pile', body)
  expect(reply.statusCode).toBe(422)
  expect(reply.headers['content-type']).toContain('application/problem+json')
  const found = reply.json().errors.map((e: { pointer: string; code: string }) => [e.pointer, e.code])
  expect(found.sort()).toEqual([...faults].sort())
})

test('overlapping piles are named, each pair by the numbers of the piles', async () => {
  const reply = await post('/v1/block', {
    ...request,
    layout: {
      kind: 'points',
      points: [
        { x: 0, y: 0 },
        { x: 3, y: 0 },
        { x: 3.1, y: 0 },
        { x: 0.2, y: 0 },
      ],
    },
  })
  expect(reply.json().errors).toMatchObject([
    { pointer: '/layout', code: 'piles-overlap', first: 1, second: 4 },
    { pointer: '/layout', code: 'piles-overlap', first: 2, second: 3 },
  ])
})

test('every layer without strength is named in one answer', async () => {
  const bare = { ...clay, undrainedShearStrength: undefined }
  const layers = [{ ...bare, thickness: 3 }, { ...bare, soil: 'granular', thickness: 3 }, bare]
  const reply = await post('/v1/single-pile', { ...request, ground: { layers } })
  const told = reply.json().errors.map((e: { code: string; pointer: string }) => `${e.code} ${e.pointer}`)
  expect(told).toEqual(layers.map((_, i) => `missing-parameter /ground/layers/${i}`))
})

test.each<[string, string, string, string | undefined, number]>([
  ['GET', '/nowhere', '', undefined, 404],
  ['GET', '/v1/single-pile', '', undefined, 405],
  ['POST', '/v1/single-pile', '{"pile":', 'application/json', 400],
  ['POST', '/v1/single-pile', '', 'application/json', 400],
  ['POST', '/v1/single-pile', 'x', 'text/plain', 415],
  ['POST', '/v1/single-pile', `"${'x'.repeat(200_000)}"`, 'application/json', 413],
  ['GET', '/v1/methods/none', '', undefined, 404],
  ['GET', '/%ff', '', undefined, 400],
])('%s %s answers with a problem document', async (method, url, payload, type, status) => {
  const reply = await app.inject({
    method: method as 'GET',
    url,
    ...(payload || type ? { payload } : {}),
    ...(type && { headers: { 'content-type': type } }),
  })
  expect(reply.statusCode).toBe(status)
  expect(reply.headers['content-type']).toContain('application/problem+json')
  expect((await app.inject(reply.json().type)).statusCode).toBe(200)
})

test('every code of the catalogue resolves', async () => {
  for (const code of Object.keys(catalogue)) expect((await app.inject(`/problems/${code}`)).json().code).toBe(code)
})

test('a trace sent back holds, and a bent one names its step', async () => {
  const { trace } = (await post('/v1/single-pile', request)).json()
  const whole = (await post('/v1/replay', { trace, request })).json().result
  expect(whole).toMatchObject({ holds: true, count: trace.steps.length })
  const bent = trace.steps.findIndex((s: { kind: string }) => s.kind === 'formula')
  trace.steps[bent].value *= 1.001
  const { result } = (await post('/v1/replay', { trace, request })).json()
  expect(result.steps.filter((s: { holds: boolean }) => !s.holds)).toHaveLength(1)
  expect(result.steps[bent].holds).toBe(false)
})

test('the OpenAPI document states the unit and bounds of quantities, and every route of version 1', async () => {
  const document = (await app.inject('/openapi.json')).json()
  expect(document.openapi).toMatch(/^3\.1/)
  const registered = app
    .printRoutes({ commonPrefix: false })
    .match(/v1\/[a-z-]+/g)!
    .map((path) => `/${path}`)
  expect(registered.length).toBeGreaterThan(8)
  for (const path of registered) expect(Object.keys(document.paths)).toContain(path)
  const pile = document.components.schemas.PileType
  expect(pile.properties.length).toMatchObject({ 'x-unit': 'm', minimum: 0.1, maximum: 500 })
})

const example = JSON.parse(readFileSync(new URL('../../schema/examples/assessment.json', import.meta.url), 'utf8'))
function form(csv: string) {
  const { rows: _, ...loads } = example.loads
  const data = new FormData()
  data.set('schedule', JSON.stringify({ ...example, loads }))
  data.set('loads', new Blob([csv], { type: 'text/csv' }), 'loads.csv')
  return app.inject({ method: 'POST', url: '/v1/assessments?trace=none', payload: data as never })
}
const columns = ['cap', 'combination', 'Fx', 'Fy', 'Fz', 'Mx', 'My', 'Mz']
const lines = example.loads.rows.map((row: Record<string, unknown>) => columns.map((c) => row[c]).join(','))

test('loads as CSV give the answer of the same rows in JSON', async () => {
  const [csv, json] = [
    await form([columns.join(','), ...lines].join('\n')),
    await post('/v1/assessments?trace=none', example),
  ]
  expect(csv.statusCode, csv.body).toBe(200)
  expect(csv.json()).toEqual(json.json())
})

test('text where a number stands, and a missing column, are told with line and column', async () => {
  const bent = [...lines]
  bent[3] = bent[3].replace(/,[^,]*$/, ',oops')
  expect((await form([columns.join(','), ...bent].join('\n'))).json().errors).toMatchObject([
    { pointer: '/loads/rows/3/Mz', code: 'csv-malformed', line: 5, column: 'Mz' },
  ])
  expect((await form(['cap,combination,Fx,Fy,Mx,My,Mz', 'A1,W1,0,0,1,1,1'].join('\n'))).json().errors).toMatchObject([
    { code: 'csv-malformed', column: 'Fz' },
  ])
})
