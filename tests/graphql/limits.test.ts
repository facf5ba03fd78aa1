import Fastify, { type FastifyInstance } from 'fastify'
import { afterAll, beforeAll, describe, expect, test } from 'vitest'
import { limits } from '../../src/graphql/limits.ts'
import { graphqlPlugin } from '../../src/graphql/plugin.ts'
import { anonymous } from '../../src/store/actor.ts'
import { emptyOffice } from './office.ts'

const apps: Record<'development' | 'production', FastifyInstance> = { development: Fastify(), production: Fastify() }
beforeAll(async () => {
  await graphqlPlugin(apps.development, { production: false, actorOf: () => anonymous, office: await emptyOffice() })
  await graphqlPlugin(apps.production, { production: true, actorOf: () => anonymous, office: await emptyOffice() })
})
afterAll(() => Promise.all(Object.values(apps).map((app) => app.close())))

type Sent = {
  status: number
  body: { data?: unknown; errors?: { message: string; extensions: Record<string, unknown> }[] }
}
async function send(payload: unknown, app = apps.production, headers: Record<string, string> = {}): Promise<Sent> {
  const accept = 'application/graphql-response+json'
  const reply = await app.inject({
    method: 'POST',
    url: '/graphql',
    headers: { accept, ...headers },
    payload: payload as object,
  })
  return { status: reply.statusCode, body: reply.json() }
}
const codes = ({ body }: Sent) => body.errors?.map((error) => error.extensions.code)
const aliased = (count: number) => Array.from({ length: count }, (_, i) => `a${i}: __typename`).join(' ')

describe('limits of a document', () => {
  test('as many aliases as allowed pass, one more does not', async () => {
    expect((await send({ query: `{ ${aliased(limits.aliases)} }` })).status).toBe(200)
    const more = await send({ query: `{ ${aliased(limits.aliases + 1)} }` })
    expect([more.status, codes(more)]).toEqual([400, ['too-many-aliases']])
    expect(more.body.errors?.[0]?.extensions).toMatchObject({ got: limits.aliases + 1, limit: limits.aliases })
  })
  test('aliases multiply through fragments', async () => {
    const spread = Array.from({ length: 6 }, (_, i) => `b${i}: limits { ...Six }`).join(' ')
    const six = Array.from({ length: 6 }, (_, i) => `c${i}: depth`).join(' ')
    const sent = await send({ query: `{ ${spread} } fragment Six on Limits { ${six} }` })
    expect(codes(sent)).toEqual(['too-many-aliases'])
    expect(sent.body.errors?.[0]?.extensions.got).toBe(42)
  })
  test('20 000 aliases fail by their tokens, and fast', async () => {
    const started = performance.now()
    const sent = await send({ query: `{ ${'a: __typename '.repeat(2_300)} }` })
    expect(codes(sent)).toEqual(['too-many-tokens'])
    expect(codes(await send({ query: `{ ${aliased(20_000)} }` }))).toEqual(['query-too-long'])
    expect(performance.now() - started).toBeLessThan(500)
  })
  test('depth', async () => {
    const deep = (levels: number) => `{ methods ${'{ formulas '.repeat(levels)} { symbol } ${'}'.repeat(levels)} }`
    expect(codes(await send({ query: deep(1) }))).toBeUndefined()
    expect(codes(await send({ query: deep(7) }))).toContain('query-too-deep')
    expect(codes(await send({ query: '{ ...A } fragment A on Query { ...A }' }))).toEqual(['graphql-invalid'])
  })
  test('cost: too many calculators in one request', async () => {
    const query = `query ($r: GroupRequestInput!) { ${Array.from({ length: 11 }, (_, i) => `s${i}: group(request: $r) { meta { engine } }`).join(' ')} }`
    expect(codes(await send({ query, variables: { r: {} } }))).toEqual(['query-too-costly'])
  })
  test('a parsed document in place of a text is not a way around', async () => {
    for (const query of ['{"kind":"Document","definitions":[]}', 'null', '[]', '"x"', ' { "a": 1 }', '{}', '1']) {
      expect([query, codes(await send({ query }))]).toEqual([query, ['graphql-syntax']])
    }
  })
  test('a variable inside a literal scalar would be lost by the compiler', async () => {
    const layer = (strength: string) =>
      `{ name: "clay", unitWeight: 20, soil: "cohesive", undrainedShearStrength: ${strength} }`
    const pile = '{ section: { shape: "circular", diameter: 1 }, length: 10, installation: "bored" }'
    const query = (strength: string) =>
      `query ($c: Varying) { singlePile(request: { pile: ${pile}, ground: { layers: [${layer(strength)}] } }) { meta { engine } } }`
    for (let round = 0; round < 3; round++) {
      expect(codes(await send({ query: query('{ top: 10, bottom: $c }'), variables: { c: 20 } }))).toEqual([
        'variable-in-literal',
      ])
    }
    // The whole value as one variable reaches the calculator.
    expect(codes(await send({ query: query('$c'), variables: { c: 20 } }))).toBeUndefined()
  })
  test('batches', async () => {
    const sent = await send([{ query: '{ __typename }' }])
    expect([sent.status, codes(sent)]).toEqual([400, ['batch-refused']])
  })
  test('the limits are told', async () => {
    const { depth, aliases, tokens, cost } = limits
    const { body } = await send({ query: '{ limits { depth aliases tokens cost bodyBytes } }' })
    expect(body).toEqual({ data: { limits: { depth, aliases, tokens, cost, bodyBytes: 1_048_576 } } })
  })
})

describe('production', () => {
  test('no introspection, no suggestions, no explorer', async () => {
    expect((await send({ query: '{ __schema { queryType { name } } }' })).status).toBe(400)
    expect((await send({ query: '{ __schema { queryType { name } } }' }, apps.development)).status).toBe(200)
    const typo = '{ singlePil }'
    expect((await send({ query: typo })).body.errors?.[0]?.message).not.toMatch(/Did you mean|singlePile/)
    expect((await send({ query: typo }, apps.development)).body.errors?.[0]?.message).toMatch(/singlePile/)
    expect((await apps.production.inject('/graphql/explorer')).statusCode).toBe(404)
  })
  test('a misspelt field of a variable is not answered with a suggestion', async () => {
    const query = 'query ($p: PointInput!, $r: GroupRequestInput!) { group(request: $r) { meta { engine } } }'
    const { body } = await send({ query, variables: { p: { x: 1, y: 2, xx: 3 } } })
    expect(JSON.stringify(body)).not.toMatch(/Did you mean/)
  })
})

describe('exchange', () => {
  test('each operation of a document has its own answer, however often it is sent', async () => {
    const query = 'query A { __typename } query B { limits { depth } }'
    for (let round = 0; round < 4; round++) {
      expect((await send({ query, operationName: 'A' })).body).toEqual({ data: { __typename: 'Query' } })
      expect((await send({ query, operationName: 'B' })).body).toEqual({ data: { limits: { depth: limits.depth } } })
    }
    expect((await send({ query, operationName: 'C' })).status).toBe(400)
    expect((await send({ query })).status).toBe(400)
  })
  test('an unknown operation by GET is a 400, not a failure', async () => {
    const url = `/graphql?query=${encodeURIComponent('query A { __typename }')}&operationName=B`
    const accept = 'application/graphql-response+json'
    expect((await apps.production.inject({ url, headers: { accept } })).statusCode).toBe(400)
  })
  test('media types', async () => {
    const types = async (accept: string | undefined) => {
      const headers = accept === undefined ? {} : { accept }
      const reply = await apps.production.inject({ method: 'POST', url: '/graphql', headers, payload: { query: '{' } })
      return `${reply.statusCode} ${reply.headers['content-type']?.toString().split(';')[0]}`
    }
    expect(await types(undefined)).toBe('200 application/json')
    expect(await types('*/*')).toBe('200 application/json')
    expect(await types('application/json, application/graphql-response+json')).toBe(
      '400 application/graphql-response+json',
    )
    expect(await types('application/json, application/graphql-response+json;q=0.5')).toBe('200 application/json')
    expect(await types('application/json;q=0, */*')).toBe('400 application/graphql-response+json')
    expect(await types('text/html')).toMatch(/^406 /)
  })
  test('a body that is not JSON by its type is a 415', async () => {
    const payload = '{ "query": "{ __typename }" }'
    for (const type of ['text/plain', 'application/graphql', 'application/x-www-form-urlencoded']) {
      const headers = { 'content-type': type }
      expect((await apps.production.inject({ method: 'POST', url: '/graphql', headers, payload })).statusCode).toBe(415)
    }
  })
})

describe('explorer', () => {
  test('three files of our own under a closed policy', async () => {
    const page = await apps.development.inject('/graphql/explorer')
    expect(page.headers['content-security-policy']).toMatch(
      /^default-src 'none'; script-src 'self'; style-src 'self'; connect-src 'self'/,
    )
    expect(page.body).not.toMatch(/https?:|<style|style=| on\w+=|<script(?![^>]* src=)/)
    const links = [...page.body.matchAll(/(?:src|href)="([^"]+)"/g)].map(
      ([, link]) => new URL(link!, 'http://x/graphql/explorer').pathname,
    )
    expect(links).toHaveLength(2)
    for (const link of links) expect((await apps.development.inject(link)).statusCode).toBe(200)
  })
})
