import { readFileSync } from 'node:fs'
import { Validator } from '@seriousme/openapi-schema-validator'
import { Ajv2020 } from 'ajv/dist/2020.js'
import type { FastifyInstance } from 'fastify'
import { afterAll, beforeAll, describe, expect, test } from 'vitest'
import { KentledgeProblem, kentledge } from '../../schema/client.ts'
import { generated } from '../../schema/generate.ts'
import { buildApp } from '../../src/app.ts'
import { readConfig } from '../../src/config.ts'
import { readExamples } from '../../src/contract/examples.ts'
import { calculators, openapi } from '../../src/contract/openapi.ts'

const file = (path: string) => readFileSync(new URL(`../../${path}`, import.meta.url), 'utf8')
const document = openapi(readExamples())
const ajv = new Ajv2020({ strict: false, allErrors: true })
ajv.addSchema({ $id: 'contract', components: document.components })
const faultsOf = (schema: string, value: unknown) => {
  const validate = ajv.getSchema(`contract#/components/schemas/${schema}`)!
  return validate(value) ? [] : validate.errors
}

let app: FastifyInstance
let baseUrl: string
beforeAll(async () => {
  app = await buildApp(readConfig({ LOG_LEVEL: 'silent' }))
  baseUrl = await app.listen({ port: 0, host: '127.0.0.1' })
})
afterAll(() => app.close())

test('what is generated is up to date (npm run schema)', async () => {
  for (const [path, text] of Object.entries(await generated())) expect(file(path) === text, path).toBe(true)
})

test('the document is valid OpenAPI 3.1', async () => {
  expect(await new Validator().validate(structuredClone(document) as never)).toMatchObject({ valid: true })
})

test('every number of a request carries its unit, or is a count', () => {
  const bare: string[] = []
  const walk = (node: unknown, path: string): void => {
    if (typeof node !== 'object' || node === null) return
    const schema = node as { type?: unknown; 'x-unit'?: string }
    if (
      (schema.type === 'number' || (Array.isArray(schema.type) && schema.type.includes('number'))) &&
      !schema['x-unit']
    )
      bare.push(path)
    for (const [key, child] of Object.entries(node)) if (key !== 'example') walk(child, `${path}/${key}`)
  }
  for (const name of [
    'GroundProfile',
    'PileType',
    'Layout',
    'DesignBasis',
    'MethodChoices',
    'SettlementRequest',
    'Schedule',
  ])
    walk(document.components.schemas[name], name)
  expect(bare).toEqual([])
})

/** Paths of the printed route tree: children stand deeper by four columns. */
function registeredPaths(): string[] {
  const path: string[] = []
  return app
    .printRoutes({ commonPrefix: false })
    .split('\n')
    .flatMap((line) => {
      const found = /^(.*)[├└]── (\S+)( \(.*\))?/.exec(line)
      if (!found) return []
      const depth = found[1]!.length / 4
      path.length = depth
      path[depth] = found[2]!
      return found[3] ? [path.join('').replaceAll(/:(\w+)/g, '{$1}')] : []
    })
}

test('routes of version 1 registered = routes documented', () => {
  const registered = registeredPaths().filter((path) => path.startsWith('/v1/'))
  expect(new Set(registered)).toEqual(new Set(Object.keys(document.paths)))
})

describe('every example, sent', () => {
  test.each(Object.entries(calculators).filter(([, c]) => c.example))(
    '%s',
    async (path, { request, answer, example }) => {
      const body = readExamples()[example!]
      expect(faultsOf(request, body)).toEqual([])
      const reply = await app.inject({ method: 'POST', url: path, payload: body as object })
      expect(reply.statusCode, reply.body.slice(0, 500)).toBe(200)
      expect(faultsOf(answer, reply.json())).toEqual([])
      const trace = reply.json().trace
      const replayed = await app.inject({ method: 'POST', url: '/v1/replay', payload: { trace } })
      expect(faultsOf('ReplayAnswer', replayed.json())).toEqual([])
      expect(replayed.json().result.holds).toBe(true)
      const wrong = await app.inject({ method: 'POST', url: path, payload: { ...(body as object), surplus: 1 } })
      expect(faultsOf('Problem', wrong.json())).toEqual([])
    },
  )

  test.each([
    '/v1/methods:MethodList',
    '/v1/methods/navfac-1986:MethodReply',
    '/v1/sources:SourceList',
    '/v1/limits:LimitList',
  ])('%s', async (line) => {
    const [path, schema] = line.split(':') as [string, string]
    expect(faultsOf(schema, (await app.inject(path)).json())).toEqual([])
  })
})

describe('the typed client', () => {
  const single = readExamples()['single-pile'] as Parameters<ReturnType<typeof kentledge>['singlePile']>[0]

  test('gives typed answers', async () => {
    const client = kentledge({ baseUrl })
    const { result } = await client.singlePile(single, { trace: 'none' })
    expect(result.ultimateResistance).toBeGreaterThan(0)
    expect((await client.methods()).methods.length).toBe(25)
  })

  test('turns a problem into an error with its faults', async () => {
    const wrong = { ...single, pile: { ...single.pile, length: '3 kPa' } }
    const fault = await kentledge({ baseUrl })
      .singlePile(wrong)
      .catch((e: unknown) => e)
    expect(fault).toBeInstanceOf(KentledgeProblem)
    expect((fault as KentledgeProblem).problem.errors?.[0]).toMatchObject({
      pointer: '/pile/length',
      code: 'wrong-dimension',
    })
  })

  test('sends a schedule with its loads as CSV', async () => {
    const schedule = JSON.parse(file('schema/examples/demo-schedule.json'))
    const { result } = await kentledge({ baseUrl }).assessCsv(schedule, file('schema/examples/demo-loads.csv'), {
      trace: 'none',
    })
    expect(result.summary.caps).toBe(12)
  })

  test('waits and tries again where the service is busy', async () => {
    let calls = 0
    const busy: typeof fetch = async (input, init) => {
      calls++
      return calls < 3 ? new Response('{}', { status: 503, headers: { 'retry-after': '0' } }) : fetch(input, init)
    }
    expect((await kentledge({ baseUrl, fetch: busy }).singlePile(single)).result.toeDepth).toBeGreaterThan(0)
    expect(calls).toBe(3)
  })
})

test('the reference page loads nothing from elsewhere', async () => {
  const page = await app.inject('/reference/')
  expect(page.statusCode).toBe(200)
  expect(page.body.match(/(?:src|href)="https?:/g)).toBeNull()
  expect(page.headers['content-security-policy']).toContain("default-src 'none'; script-src 'self'")
})
