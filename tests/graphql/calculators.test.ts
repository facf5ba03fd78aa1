import { readFileSync } from 'node:fs'
import Fastify from 'fastify'
import { buildSchema, type GraphQLNamedType, getNamedType, isInterfaceType, isObjectType } from 'graphql'
import { afterAll, beforeAll, describe, expect, test } from 'vitest'
import { Problem } from '../../src/errors.ts'
import { calculators } from '../../src/graphql/calculators.ts'
import { graphqlPlugin } from '../../src/graphql/plugin.ts'
import { anonymous } from '../../src/store/actor.ts'
import { emptyOffice } from './office.ts'

const file = (path: string) => readFileSync(new URL(path, import.meta.url), 'utf8')
const schema = buildSchema(file('../../schema/schema.graphql'))
const { cases } = JSON.parse(file('../published/capacity.json')) as {
  cases: { id: string; request: Record<string, unknown> }[]
}

const inputs = { singlePile: 'SinglePileRequestInput', block: 'GroupRequestInput', group: 'GroupRequestInput' } as const
type Role = keyof typeof inputs
/** The resistance calculators, which share their cases; settlement has a test of its own. */
const roles = Object.keys(inputs) as Role[]

/** Every field below a type. */
function everything(type: GraphQLNamedType): string {
  if (!isObjectType(type) && !isInterfaceType(type)) return ''
  return `{ ${Object.values(type.getFields())
    .map((field) => `${field.name} ${everything(getNamedType(field.type))}`)
    .join(' ')} }`
}
const queryOf = (role: Role) =>
  `query ($request: ${inputs[role]}!) { ${role}(request: $request) ${everything(getNamedType(schema.getQueryType()!.getFields()[role]!.type))} }`

/** Of all that is promised only the year of a source may be null. */
const withoutYears = (value: unknown) =>
  JSON.parse(JSON.stringify(value), (key, inner) => (key === 'year' && inner === null ? undefined : inner))
/** GraphQL says null where JSON leaves a field out. */
const withoutNulls = (value: unknown) => JSON.parse(JSON.stringify(value), (_key, inner) => inner ?? undefined)
const requestOf = (role: Role, { layout, ...rest }: Record<string, unknown>) =>
  role === 'singlePile' ? rest : { ...rest, layout }

const app = Fastify()
beforeAll(async () => graphqlPlugin(app, { production: true, actorOf: () => anonymous, office: await emptyOffice() }))
afterAll(() => app.close())
async function send(query: string, variables: unknown) {
  const headers = { accept: 'application/graphql-response+json' }
  const reply = await app.inject({ method: 'POST', url: '/graphql', headers, payload: { query, variables } as object })
  return { status: reply.statusCode, body: reply.json() }
}
function problemOf(role: Role, request: unknown): Problem {
  try {
    calculators[role](request, { trace: false })
  } catch (problem) {
    if (problem instanceof Problem) return problem
    throw problem
  }
  throw new Error('no problem')
}

describe.each(roles)('%s', (role) => {
  test('gives what the operation gives, every field, trace and hash, interpreted and compiled', async () => {
    expect(cases.length).toBeGreaterThan(5)
    for (const { id, request } of cases) {
      const sent = requestOf(role, request)
      const { status, body } = await send(queryOf(role), { request: sent })
      expect([id, status]).toEqual([id, 200])
      expect(withoutNulls(body.data[role]), id).toEqual(withoutYears(calculators[role](sent, { trace: true })))
    }
  })

  test('tells the same faults, whoever finds them first', async () => {
    const good = requestOf(role, cases[0]!.request) as { pile: object; ground: { layers: object[] } }
    const bad: Record<string, unknown>[] = [
      { ...good, pile: { ...good.pile, length: '3 kPa', lenght: 3 } },
      { ...good, pile: { ...good.pile, length: -1 } },
      { ...good, pile: { ...good.pile, installation: 7 } },
      { ...good, ground: { layers: [{ ...good.ground.layers[0], soil: 'mud' }] } },
      { ...good, ground: { layers: [] } },
      { ...good, methods: { cohesiveShaft: 'unheard-of' }, surplus: 1 },
      { pile: good.pile },
      {},
    ]
    for (let round = 0; round < 3; round++) {
      for (const request of bad) {
        const { code, status, errors, message } = problemOf(role, request)
        const sent = await send(`query ($r: ${inputs[role]}!) { ${role}(request: $r) { meta { engine } } }`, {
          r: request,
        })
        expect(sent.status).toBe(status)
        expect(sent.body.errors).toHaveLength(1)
        expect(sent.body.errors[0].extensions).toEqual(JSON.parse(JSON.stringify({ code, status, errors })))
        expect(sent.body.errors[0].message).toBe(message)
      }
    }
  })
})

test('null means not given, and the trace is left out where it is not selected', async () => {
  const request = requestOf('singlePile', cases[0]!.request)
  const query =
    'query ($r: SinglePileRequestInput!) { singlePile(request: $r) { meta { requestHash } trace @skip(if: true) { results } } }'
  const { body } = await send(query, { r: { ...request, methods: request.methods ?? null, direction: null } })
  expect(body.data.singlePile.meta.requestHash).toBe(
    calculators.singlePile({ ...request, direction: undefined }, { trace: false }).meta.requestHash,
  )
})

test('methods, one method, sources', async () => {
  const { body } = await send(
    '{ methods { id kind source { key } parameters { key unit } formulas { formula operands } } method(id: "skempton-1951") { kind } none: method(id: "x") { id } sources { key basis } }',
    {},
  )
  expect(body.errors).toBeUndefined()
  expect(body.data.methods.length).toBeGreaterThan(5)
  expect(body.data.method).toEqual({ kind: 'cohesive-base' })
  expect(body.data.none).toBeNull()
  expect(body.data.sources.length).toBeGreaterThan(5)
})
