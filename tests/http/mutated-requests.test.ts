import fc from 'fast-check'
import type { FastifyInstance } from 'fastify'
import { afterAll, beforeAll, expect, test } from 'vitest'
import { buildApp } from '../../src/app.ts'
import { readConfig } from '../../src/config.ts'
import { readExamples } from '../../src/contract/examples.ts'

type Body = Record<string, unknown>

let app: FastifyInstance
beforeAll(async () => {
  app = await buildApp(readConfig({ LOG_LEVEL: 'silent' }))
})
afterAll(() => app.close())

const junk = fc.oneof(
  fc.string(),
  fc.integer(),
  fc.double(),
  fc.constant(null),
  fc.boolean(),
  fc.constant([]),
  fc.constant({}),
  fc.constant([{}, null]),
  fc.constantFrom(
    '600 kPa',
    '-1 m',
    '1e400',
    '__proto__',
    1e308,
    -1e308,
    5e-324,
    0,
    -0,
    1e-9,
    1e15,
    '0',
    ' ',
    '1e-300 mm',
    '=1+1',
  ),
)

/** Every place of a document: the object and the key. */
function placesOf(body: Body): [Body, string][] {
  const places: [Body, string][] = []
  const walk = (node: unknown): void => {
    if (typeof node !== 'object' || node === null) return
    for (const key of Object.keys(node)) {
      places.push([node as Body, key])
      walk((node as Body)[key])
    }
  }
  walk(body)
  return places
}

const at = (document: unknown, pointer: string) =>
  pointer
    .split('/')
    .slice(1)
    .map((k) => k.replaceAll('~1', '/').replaceAll('~0', '~'))
    .reduce<unknown>(
      (n, k) => (typeof n === 'object' && n !== null && Object.hasOwn(n, k) ? (n as Body)[k] : undefined),
      document,
    )

/** A pointer resolves in the body, or its parent does for a missing field. */
const resolves = (document: unknown, pointer: string) =>
  pointer === '' ||
  at(document, pointer) !== undefined ||
  at(document, pointer.slice(0, pointer.lastIndexOf('/'))) !== undefined

/** No NaN, Infinity or null stands where a result promises a number: JSON prints all three as null. */
const finite = (node: unknown): boolean =>
  typeof node === 'number'
    ? Number.isFinite(node)
    : node !== null && (typeof node !== 'object' || Object.values(node).every(finite))

test.each(['single-pile', 'block', 'group', 'settlement', 'assessment'])(
  '2000 mutated requests of %s: never a 5xx, never a null for a number, each pointer resolves',
  { timeout: 240_000 },
  async (name) => {
    const seed = JSON.stringify(readExamples()[name])
    const url = name === 'assessment' ? '/v1/assessments?trace=none' : `/v1/${name}`
    const seen = new Map<number, number>()
    await fc.assert(
      fc.asyncProperty(
        fc.nat(),
        junk,
        fc.constantFrom('put', 'put', 'drop', 'add'),
        fc.nat(),
        async (where, value, how, second) => {
          const body = JSON.parse(seed) as Body
          const places = placesOf(body)
          for (const n of second % 3 === 0 ? [where, second] : [where]) {
            const [node, key] = places[n % places.length]!
            if (how === 'drop') delete node[key]
            else if (how === 'add' && !Array.isArray(node)) node[`${key}x`] = value
            else node[key] = value
          }
          const payload = JSON.stringify(body)
          const reply = await app.inject({
            method: 'POST',
            url,
            payload,
            headers: { 'content-type': 'application/json' },
          })
          seen.set(reply.statusCode, (seen.get(reply.statusCode) ?? 0) + 1)
          expect(reply.statusCode, reply.body).toBeLessThan(500)
          const answer = reply.json()
          if (reply.statusCode === 200) {
            expect(finite(answer.result)).toBe(true)
            return
          }
          expect(answer.errors.length).toBeGreaterThan(0)
          const sent = JSON.parse(payload)
          for (const { pointer, code } of answer.errors)
            expect(resolves(sent, pointer), `${code} at ${pointer}`).toBe(true)
        },
      ),
      { numRuns: 2000 },
    )
    console.info(`${name}: ${[...seen].map(([status, n]) => `${n} × ${status}`).join(', ')}`)
    expect(seen.get(422) ?? 0).toBeGreaterThan(500)
  },
)

test.each(['/v1/single-pile', '/v1/replay', '/v1/assessments', '/graphql'])(
  '%s refuses JSON nested a million deep',
  async (url) => {
    const deep = `{"request":${'['.repeat(1_000_000)}${']'.repeat(1_000_000)},"trace":{"steps":[{}]}}`
    const reply = await app.inject({
      method: 'POST',
      url,
      payload: deep,
      headers: { 'content-type': 'application/json' },
    })
    expect(reply.statusCode).toBeGreaterThanOrEqual(400)
    expect(reply.statusCode).toBeLessThan(500)
  },
)
