import type { FastifyInstance } from 'fastify'
import { afterAll, beforeAll, describe, expect, test } from 'vitest'
import { buildApp } from '../../src/app.ts'
import { readConfig } from '../../src/config.ts'
import { readExamples } from '../../src/contract/examples.ts'

type Fault = { pointer: string; code: string; detail: string; line?: number; column?: string }
type Row = Record<string, string | number>
type Schedule = { loads: { rows: Row[] } & Record<string, unknown> } & Record<string, unknown>

let app: FastifyInstance
beforeAll(async () => {
  app = await buildApp(readConfig({ LOG_LEVEL: 'silent', WORKERS: '1', BODY_LIMIT: '9000000' }))
})
afterAll(() => app.close())

const single = readExamples()['single-pile'] as object
const schedule = readExamples().assessment as Schedule
const post = (url: string, payload: string | object, type = 'application/json') =>
  app.inject({
    method: 'POST',
    url,
    payload: typeof payload === 'string' ? payload : JSON.stringify(payload),
    headers: { 'content-type': type },
  })
const brief = (errors: Fault[]) => errors.map((e) => [e.pointer, e.code])

describe('loads as CSV', () => {
  const columns = ['cap', 'combination', 'Fx', 'Fy', 'Fz', 'Mx', 'My', 'Mz']
  const lines = schedule.loads.rows.map((row) => columns.map((c) => row[c]).join(','))
  const { rows: _, ...loads } = schedule.loads
  function form(csv: string, change: (data: FormData) => void = () => undefined) {
    const data = new FormData()
    data.set('schedule', JSON.stringify({ ...schedule, loads }))
    data.set('loads', new Blob([csv], { type: 'text/csv' }), 'loads.csv')
    change(data)
    return app.inject({ method: 'POST', url: '/v1/assessments?trace=none', payload: data as never })
  }
  const whole = [columns.join(','), ...lines].join('\n')
  const withCell = (index: number, cell: string) =>
    [columns.join(','), ...lines.map((line, i) => (i === index ? line.replace(/,[^,]*$/, `,${cell}`) : line))].join(
      '\n',
    )

  test('a column that stands twice is refused: the last would win in silence', async () => {
    const csv = [[...columns, 'Fz'].join(','), ...lines.map((line) => `${line},1`)].join('\n')
    const reply = await form(csv)
    expect(reply.statusCode).toBe(422)
    expect(reply.json().errors).toMatchObject([{ code: 'csv-malformed', column: 'Fz' }])
  })

  test('the line is that of the file, with its blank lines', async () => {
    const csv = [columns.join(','), lines[0], '', '', lines[1], lines[2]!.replace(/,[^,]*$/, ',oops')].join('\r\n')
    expect((await form(csv)).json().errors).toMatchObject([{ pointer: '/loads/rows/2/Mz', line: 6, column: 'Mz' }])
  })

  test.each(['0x10', 'Infinity', '1.5.2', '1 000'])('%s is no number', async (cell) => {
    expect((await form(withCell(0, cell))).json().errors).toMatchObject([{ code: 'csv-malformed', line: 2 }])
  })

  test.each(['-1.5e2', '+3.', '.5'])('%s is a number', async (cell) => {
    expect((await form(withCell(0, cell))).statusCode).toBe(200)
  })

  test('faults of schema and engine name line and column too', async () => {
    const tooLarge = (await form(withCell(1, '1e20'))).json().errors as Fault[]
    expect(tooLarge).toMatchObject([{ pointer: '/loads/rows/1/Mz', code: 'out-of-range', line: 3, column: 'Mz' }])
    expect(tooLarge[0]!.detail).toMatch(/^Line 3, column Mz: /)
    const stranger = await form(`${whole}\n${lines[0]!.replace(/^[^,]*/, 'ZZ')}`)
    expect(stranger.json().errors).toMatchObject([
      { code: 'unknown-reference', line: lines.length + 2, column: 'cap', name: 'ZZ' },
    ])
  })

  test.each<[string, (data: FormData) => void, number, unknown]>([
    ['rows in both places', (d) => d.set('schedule', JSON.stringify(schedule)), 422, 'loads-twice'],
    ['a part that is not known', (d) => d.set('colour', 'red'), 422, 'unknown-field'],
    ['a part that comes twice', (d) => d.append('loads', new Blob(['x']), 'more.csv'), 422, 'too-many-items'],
    ['no loads', (d) => d.delete('loads'), 422, 'missing-field'],
    ['a schedule that is null', (d) => d.set('schedule', 'null'), 422, 'wrong-type'],
    ['a schedule that is no JSON', (d) => d.set('schedule', '{'), 400, 'malformed-json'],
    [
      'a field that says JSON and is none',
      (d) => d.set('schedule', new Blob(['{'], { type: 'application/json' })),
      400,
      'malformed-json',
    ],
    ['parts larger together than a body', (d) => d.set('schedule', ' '.repeat(8_999_900)), 413, 'body-too-large'],
  ])('%s', async (_, change, status, code) => {
    const reply = await form(whole, change)
    expect(reply.statusCode, reply.body.slice(0, 300)).toBe(status)
    const { type, errors } = reply.json() as { type: string; errors?: Fault[] }
    expect(errors?.[0]?.code ?? type.replace('/problems/', '')).toBe(code)
  })

  test.each(['multipart/form-data', 'multipart/form-data; boundary=b'])(
    'a broken form of %s is a 400',
    async (type) => {
      const reply = await post('/v1/assessments', 'no form', type)
      expect(reply.json()).toMatchObject({ type: '/problems/malformed-form', status: 400 })
    },
  )
})

describe('text and depth', () => {
  test('half a surrogate pair is told with its place, on every calculator', async () => {
    const bent = JSON.stringify(single).replace('"name":"', '"name":"\\ud800')
    const reply = await post('/v1/single-pile', bent)
    expect(reply.statusCode).toBe(422)
    expect(reply.json().errors.map((e: Fault) => e.code)).toEqual(['not-unicode'])
    const title = JSON.stringify(schedule).replace('"title":"', '"title":"\\udc00')
    expect(brief((await post('/v1/assessments', title)).json().errors)).toEqual([['/title', 'not-unicode']])
  })

  test('a whole pair is text like any other', async () => {
    const reply = await post('/v1/single-pile', JSON.stringify(single).replace('"name":"', '"name":"\\ud83d\\udea7'))
    expect(reply.statusCode).toBe(200)
  })

  test('a trace sent back with a request nested half a million deep is refused', async () => {
    const { trace } = (await post('/v1/single-pile', single)).json()
    const deep = `${'['.repeat(500_000)}${']'.repeat(500_000)}`
    const reply = await post('/v1/replay', `{"trace":${JSON.stringify(trace)},"request":${deep}}`)
    expect(reply.json()).toMatchObject({ type: '/problems/too-deep', status: 422 })
  })

  test.each(['ground', 'pileTypes'])('the name __proto__ in %s does not vanish', async (field) => {
    const bent = JSON.stringify(schedule).replace(`"${field}":{`, `"${field}":{"__proto__":{},`)
    expect(brief((await post('/v1/assessments', bent)).json().errors)).toEqual([
      [`/${field}/__proto__`, 'unknown-field'],
    ])
  })
})

test('a name that stands twice in one object is refused, on every route; in two objects it may', async () => {
  const bent = JSON.stringify(single)
    .replace('"length":', '"length":1,"len\\u0067th":')
    .replace('"layers":[{', '"layers":[{"a/b~":{"x":1},"a/b~":[{"x":1},{"x":2,"x":3}],')
  const faults = [
    ['/pile/length', 'duplicate-field'],
    ['/ground/layers/0/a~1b~0', 'duplicate-field'],
    ['/ground/layers/0/a~1b~0/1/x', 'duplicate-field'],
  ]
  const reply = await post('/v1/single-pile', bent)
  expect(reply.statusCode).toBe(422)
  expect(new Set(brief(reply.json().errors).map(String))).toEqual(new Set(faults.map(String)))
  const title = JSON.stringify(schedule).replace('"title":', '"title":"one, {: \\"two\\"","title":')
  expect(brief((await post('/v1/assessments', title)).json().errors)).toEqual([['/title', 'duplicate-field']])
  expect((await post('/v1/single-pile', single)).statusCode).toBe(200)
})

describe('the query', () => {
  test.each([
    ['trase=none', 'trase'],
    ['of=/a&of=/b', 'of'],
    ['of=shaftResistance', 'of'],
    ['cap=A1&cap=A2', 'cap'],
    ['trace=half', 'trace'],
  ])('?%s is refused', async (query, field) => {
    const reply = await post(`/v1/assessments?${query}`, schedule)
    expect(reply.statusCode).toBe(422)
    expect(reply.json().type).toBe('/problems/bad-query')
    expect(reply.json().detail).toContain(`parameter ${field} must be`)
  })
})

test('no body at all is told as such', async () => {
  const reply = await app.inject({ method: 'POST', url: '/v1/single-pile' })
  expect(reply.statusCode).toBe(422)
  expect(reply.json().errors).toMatchObject([{ pointer: '', code: 'wrong-type', got: 'no body' }])
})

test('a file that is not there is a 404; a path with other methods lists them', async () => {
  expect((await app.inject('/reference/static/nothing.js')).statusCode).toBe(404)
  for (const [url, allow] of [
    ['/v1/methods', 'GET, HEAD'],
    ['/v1/single-pile', 'POST'],
  ] as const) {
    const reply = await app.inject({ method: 'DELETE', url })
    expect([reply.statusCode, reply.headers.allow]).toEqual([405, allow])
  }
})
