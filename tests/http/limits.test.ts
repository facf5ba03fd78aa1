import { afterAll, beforeAll, expect, test } from 'vitest'
import { buildApp } from '../../src/app.ts'
import { readConfig } from '../../src/config.ts'
import { readExamples } from '../../src/contract/examples.ts'

type App = Awaited<ReturnType<typeof buildApp>>
let app: App
beforeAll(async () => {
  app = await buildApp(
    readConfig({ LOG_LEVEL: 'silent', BODY_LIMIT: '60000', REQUEST_TIMEOUT: '7', WORK_TIMEOUT: '11', WORK_QUEUE: '3' }),
  )
})
afterAll(() => app.close())

const limits = async () => (await app.inject('/v1/limits')).json()
// biome-ignore lint/suspicious/noExplicitAny: an example that the tests bend out of shape
const example = (name: string): any => structuredClone(readExamples()[name])
const send = async (url: string, payload: object) => {
  const reply = await app.inject({ method: 'POST', url, payload })
  return { status: reply.statusCode, codes: reply.json().errors?.map((e: { code: string }) => e.code) }
}

test('the limits are those of the settings', async () => {
  expect(await limits()).toMatchObject({
    bodyBytes: 60_000,
    requestSeconds: 7,
    assessmentSeconds: 11,
    assessmentsWaiting: 3,
    graphql: { depth: 8, aliases: 30 },
  })
})

test('so many layers and piles are accepted, one more is refused', async () => {
  const { layers, pilesPerCap } = await limits()
  const single = (count: number) => {
    const body = example('single-pile')
    const thin = { unitWeight: 18, soil: 'cohesive', undrainedShearStrength: 40 }
    body.ground.layers = Array.from({ length: count }, (_, i) => ({ ...thin, name: `l${i}`, thickness: 0.5 }))
    return body
  }
  expect((await send('/v1/single-pile?trace=none', single(layers))).status).toBe(200)
  expect(await send('/v1/single-pile', single(layers + 1))).toEqual({ status: 422, codes: ['too-many-items'] })
  const block = (columns: number, rows: number) => ({
    ...example('block'),
    layout: { kind: 'grid', columns, rows, spacing: 3 },
  })
  expect((await send('/v1/block?trace=none', block(50, pilesPerCap / 50))).status).toBe(200)
  expect(await send('/v1/block', block(pilesPerCap + 1, 1))).toMatchObject({ status: 422 })
})

test('a body above the limit is a 413, a longer header a 431', async () => {
  const { bodyBytes, headerBytes } = await limits()
  const body = JSON.stringify(example('single-pile'))
  const post = (payload: string) =>
    app.inject({ method: 'POST', url: '/v1/single-pile', headers: { 'content-type': 'application/json' }, payload })
  expect((await post(body.padEnd(bodyBytes))).statusCode).toBe(200)
  expect((await post(body.padEnd(bodyBytes + 1))).statusCode).toBe(413)
  const url = await app.listen({ host: '127.0.0.1', port: 0 })
  expect((await fetch(`${url}/livez`, { headers: { 'x-long': 'x'.repeat(headerBytes) } })).status).toBe(431)
})

test('OpenAPI bounds its lists by the same limits and says where they are told', async () => {
  const document = (await app.inject('/openapi.json')).json()
  const { layers, caps, rows } = await limits()
  const { GroundProfile, Schedule } = document.components.schemas
  expect(GroundProfile.properties.layers.maxItems).toBe(layers)
  expect(Schedule.properties.caps.maxItems).toBe(caps)
  const variants = Schedule.properties.loads.oneOf as { properties: { rows: { maxItems: number } } }[]
  expect(variants.map((v) => v.properties.rows.maxItems)).toEqual([rows, rows, rows])
  expect(document.info.description).toContain('GET /v1/limits')
})
