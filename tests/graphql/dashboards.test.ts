import { readFileSync } from 'node:fs'
import { buildSchema, type GraphQLObjectType, getNamedType, isObjectType } from 'graphql'
import { afterAll, beforeAll, describe, expect, test } from 'vitest'
import { access, links } from '../../src/graphql/access.ts'
import { limits } from '../../src/graphql/limits.ts'
import { draftRecord } from '../../src/operations/draft-record.ts'
import { anonymous, scopes } from '../../src/store/actor.ts'
import { appendRecord } from '../../src/store/append-record.ts'
import { bothDatabases } from '../store/databases.ts'
import { type Seeded, schedule, seeded } from './seeded.ts'

const file = (path: string) => readFileSync(new URL(path, import.meta.url), 'utf8')
const sdl = buildSchema(file('../../schema/schema.graphql'))
const objectOf = (name: string) => sdl.getType(name) as GraphQLObjectType
/** Every scalar field of a type. */
const flat = (name: string) =>
  Object.values(objectOf(name).getFields())
    .filter((field) => !isObjectType(getNamedType(field.type)))
    .map((field) => field.name)
    .join(' ')
/** GraphQL says null where JSON leaves a field out. */
const withoutNulls = (value: unknown) => JSON.parse(JSON.stringify(value), (_key, inner) => inner ?? undefined)
const codes = (sent: { errors?: readonly { extensions: Record<string, unknown> }[] }) =>
  sent.errors?.map((error) => error.extensions.code)

describe.each(bothDatabases())('on $name', (database) => {
  let all: Seeded
  beforeAll(async () => {
    all = await seeded(database)
  }, 120_000)
  afterAll(() => all.app.close())
  const caps = (args: string, fields = flat('Cap')) =>
    `query ($id: ID!${args.includes('$after') ? ', $after: String' : ''}) { assessment(id: $id) { caps(${args}) { totalCount pageInfo { hasNextPage endCursor } nodes { ${fields} } } } }`

  test('projects, assessments, signatures and hashes are those of the routes', async () => {
    const [, , , last] = all.quay
    const { data } = await all.send(
      `{ projects { totalCount nodes { ${flat('Project')} latest { id } } }
         project(slug: "quay") { assessments { totalCount nodes { ${flat('Assessment')} summary { ${flat('Summary')} worst { ${flat('WorstCheck')} } checks { ${flat('KindOfCheck')} } } } } }
         assessment(id: "${last}") { signatures { ${flat('Signature')} } previous { revision next { id } } next { id } project { title } } }`,
    )
    const listed = data.projects.nodes as { latest: { id: string } | null }[]
    expect(withoutNulls(listed.map(({ latest, ...project }) => project))).toEqual((await all.get('/v1/projects')).items)
    expect(listed.map((p) => p.latest?.id)).toEqual([all.bridge, undefined, last])
    const assessments = data.project.assessments.nodes.map(({ projectSlug, ...rest }: { projectSlug: string }) => ({
      ...rest,
      project: projectSlug,
    }))
    expect(withoutNulls(assessments)).toEqual(withoutNulls((await all.get('/v1/projects/quay/assessments')).items))
    expect([data.projects.totalCount, data.project.assessments.totalCount]).toEqual([3, 4])
    expect(data.assessment).toEqual({
      signatures: (await all.get(`/v1/assessments/${last}/signatures`)).items,
      previous: { revision: 3, next: { id: last } },
      next: null,
      project: { title: 'Quay' },
    })
  })

  test('caps are those of the route, with every filter and order, and share its cursors both ways', async () => {
    const id = all.quay[1]!
    const url = `/v1/assessments/${id}/caps`
    const whole = (await all.get(url)).items as Record<string, string | number | boolean>[]
    const { ground, pileType, mark } = whole[1]! as Record<string, string>
    const figure = whole.map((c) => c.utilisation as number).sort((a, b) => a - b)[Math.floor(whole.length / 2)]!
    const half = Math.floor(figure * 1e6) / 1e6
    for (const [args, kept] of [
      ['', () => true],
      [`ground: "${ground}"`, (c) => c.ground === ground],
      [`pileType: "${pileType}"`, (c) => c.pileType === pileType],
      [`mark: "${mark!.slice(-1)}"`, (c) => String(c.mark).includes(mark!.slice(-1))],
      ['mark: "%"', () => false],
      ['exceeded: true', (c) => c.exceeded === true],
      ['exceeded: false', (c) => c.exceeded === false],
      [`utilisationAtLeast: ${half}`, (c) => (c.utilisation as number) >= half],
    ] as [string, (c: (typeof whole)[number]) => boolean][]) {
      const rest = args.replaceAll(/(\w+): "?([^",]+)"?/g, '$1=$2')
      const { data } = await all.send(caps(`first: 100 ${args}`), { id })
      expect([args, data.assessment.caps.nodes]).toEqual([args, whole.filter(kept)])
      expect(data.assessment.caps.totalCount).toBe(whole.filter(kept).length)
      expect((await all.get(`${url}?${encodeURI(rest)}`)).items).toEqual(whole.filter(kept))
    }
    for (const order of ['schedule', 'mark', 'utilisation', 'settlement']) {
      const { items } = await all.get(`${url}?order=${order}`)
      const walked: unknown[] = []
      let after: string | undefined
      for (let page = 0; page < whole.length; page++) {
        if (page % 2 === 0) {
          const { nodes, pageInfo } = (await all.send(caps(`order: ${order}, first: 2, after: $after`), { id, after }))
            .data.assessment.caps
          walked.push(...nodes)
          after = pageInfo.hasNextPage ? pageInfo.endCursor : undefined
        } else {
          const page = await all.get(`${url}?order=${order}&limit=1&cursor=${after}`)
          walked.push(...page.items)
          after = page.next
        }
        if (after === undefined) break
      }
      expect([order, walked]).toEqual([order, items])
      expect(items).toHaveLength(whole.length)
      if (order === 'utilisation' || order === 'settlement') {
        const figures = items.map((c: Record<string, number>) => c[order])
        expect(figures).toEqual([...figures].sort((a, b) => b - a))
      }
    }
    const byCheck = (
      await all.send(caps('check: "settlement", order: utilisation', 'mark checks { check utilisation }'), { id })
    ).data.assessment.caps.nodes as { checks: { check: string; utilisation: number }[] }[]
    const figures = byCheck.map((cap) => cap.checks.find((c) => c.check === 'settlement')!.utilisation)
    expect(figures.length).toBeGreaterThan(1)
    expect(figures).toEqual([...figures].sort((a, b) => b - a))
  })

  test('checks, neighbours and traces are those of the stored result', async () => {
    const id = all.quay[0]!
    const { result } = await all.get(`/v1/assessments/${id}/content`)
    const mark = result.caps[1].mark as string
    const trace = `{ results sources { key } steps { id kind symbol value unit } }`
    const { data, errors } = await all.send(
      `query ($id: ID!, $mark: String!) { assessment(id: $id) {
        cap(mark: $mark) { mark checks { ${flat('Check')} } trace ${trace} } none: cap(mark: "none") { mark }
        neighbours(first: 100) { totalCount nodes { ${flat('Neighbours')} } }
        steepest: neighbours(order: distortion, first: 1) { nodes { angularDistortion } pageInfo { endCursor } } } }`,
      { id, mark },
    )
    const { cap, none, neighbours, steepest } = data.assessment
    expect(errors).toBeUndefined()
    expect(none).toBeNull()
    const bySize = [...result.caps[1].checks].sort((a, b) => b.utilisation - a.utilisation)
    expect(withoutNulls(cap.checks.map(({ limitState, ...check }: { limitState: string }) => check))).toEqual(bySize)
    const stored = (await all.get(`/v1/assessments/${id}/caps/${mark}`)).trace
    expect(cap.trace.results).toEqual(stored.results)
    expect(cap.trace.steps.map((s: { id: string }) => s.id)).toEqual(stored.steps.map((s: { id: string }) => s.id))
    expect(withoutNulls(neighbours.nodes)).toEqual(result.neighbours)
    expect(neighbours.totalCount).toBe(result.neighbours.length)
    const slopes = result.neighbours.map((n: { angularDistortion: number }) => n.angularDistortion)
    expect(steepest.nodes[0].angularDistortion).toBe(Math.max(...slopes))
    const rest = await all.send(
      'query ($id: ID!, $after: String) { assessment(id: $id) { neighbours(order: distortion, first: 100, after: $after) { nodes { angularDistortion } } } }',
      { id, after: steepest.pageInfo.endCursor },
    )
    const walked = rest.data.assessment.neighbours.nodes.map((n: { angularDistortion: number }) => n.angularDistortion)
    expect(walked).toEqual([...slopes].sort((a, b) => b - a).slice(1))
  })

  test('changes are those of the route', async () => {
    const [first, second] = all.quay
    const verdict = '{ combination utilisation satisfied }'
    const governing = '{ check combination utilisation satisfied }'
    const { data } = await all.send(
      `query ($id: ID!, $since: ID) { assessment(id: $id) { changes(since: $since, first: 100) {
        before { id } after { id } counts { ${flat('ChangeCounts')} }
        verdicts { ${flat('TurnedVerdict')} before ${verdict} after ${verdict} }
        caps { ${flat('CapChange')} pointer { before after } governing { before ${governing} after ${governing} }
          checks { check by before ${verdict} after ${verdict} } settlement { before after by } verticalStiffness { before after by } }
        added { mark } gone { mark } inputs { ${flat('InputChange')} pointer { before after } }
        neighbours { a b check by before ${verdict} after ${verdict} angularDistortion { before after by } } } } }`,
      { id: second, since: first },
    )
    const found = await all.get(`/v1/assessments/${second}/changes?since=${first}`)
    expect(found.counts.turnedExceeded + found.counts.turnedSatisfied).toBeGreaterThan(0)
    expect(found.verdicts[0].turned).toBe('exceeded')
    expect(Object.keys(found.counts.inputs)).toEqual(['reaction', 'title'])
    const told = { ...found, before: { id: first }, after: { id: second } }
    expect(withoutNulls(data.assessment.changes)).toEqual(withoutNulls(told))
    expect(await all.get(`/v1/assessments/${second}/changes`)).toEqual(found)
    const refused = async (since: string | undefined, id = second) =>
      codes(
        await all.send(
          'query ($id: ID!, $since: ID) { assessment(id: $id) { changes(since: $since) { counts { caps } } } }',
          { id, since },
        ),
      )
    expect(await refused('none')).toEqual(['no-such-assessment'])
    expect(await refused(all.bridge)).toEqual(['not-comparable'])
    expect(await refused(undefined, first)).toEqual(['not-comparable'])
  })

  test('aggregates are those that counting gives', async () => {
    const id = all.quay[1]!
    const { data } = await all.send(
      `query ($id: ID!) { assessment(id: $id) { caps(first: 100) { nodes { ${flat('Cap')} checks { ${flat('Check')} } } }
        aggregates { byCheck { ${flat('CapAggregate')} } byGround { ${flat('CapAggregate')} } byPileType { ${flat('CapAggregate')} } } }
        assessments { aggregates { ${flat('AssessmentAggregates')} byWorstCheck { ${flat('WorstCheckAggregate')} } } nodes { summary { caps exceeded worst { check utilisation } } } }
        latest: assessments(latest: true) { totalCount aggregates { count } } bad: assessments(exceeded: true) { totalCount } }`,
      { id },
    )
    type Line = { name: string; mark: string; exceeded: boolean; utilisation: number }
    const nodes = data.assessment.caps.nodes
    const by = (lines: Line[]) =>
      [...new Set(lines.map((line) => line.name))].sort().map((name) => {
        const own = lines.filter((line) => line.name === name)
        const worst = own.reduce((a, b) => (b.utilisation > a.utilisation ? b : a))
        const exceeded = own.filter((line) => line.exceeded).length
        return { name, count: own.length, exceeded, largestUtilisation: worst.utilisation, cap: worst.mark }
      })
    const told = (list: Record<string, unknown>[]) => list.map(({ combination, ...rest }) => rest)
    const { byCheck, byGround, byPileType } = data.assessment.aggregates
    expect(told(byGround)).toEqual(by(nodes.map((c: Line & { ground: string }) => ({ ...c, name: c.ground }))))
    expect(told(byPileType)).toEqual(by(nodes.map((c: Line & { pileType: string }) => ({ ...c, name: c.pileType }))))
    const checks = nodes.flatMap(
      (c: { mark: string; checks: { check: string; utilisation: number; satisfied: boolean }[] }) =>
        c.checks.map((k) => ({ name: k.check, mark: c.mark, exceeded: !k.satisfied, utilisation: k.utilisation })),
    )
    expect(told(byCheck)).toEqual(by(checks))
    const summaries = data.assessments.nodes.map((n: { summary: object }) => n.summary) as {
      caps: number
      exceeded: number
      worst: { check: string; utilisation: number }
    }[]
    const sum = (values: number[]) => values.reduce((a, b) => a + b, 0)
    expect(data.assessments.aggregates).toMatchObject({
      count: 5,
      exceeded: summaries.filter((s) => s.exceeded > 0).length,
      caps: sum(summaries.map((s) => s.caps)),
      capsExceeded: sum(summaries.map((s) => s.exceeded)),
      largestUtilisation: Math.max(...summaries.map((s) => s.worst.utilisation)),
    })
    expect(sum(data.assessments.aggregates.byWorstCheck.map((w: { count: number }) => w.count))).toBe(5)
    expect([data.latest.totalCount, data.latest.aggregates.count]).toEqual([2, 2])
    expect(data.bad.totalCount).toBe(summaries.filter((s) => s.exceeded > 0).length)
  })

  test('a query asks the store as often as it has levels, however many rows there are', async () => {
    const query = `query ($first: Int) { projects(first: $first) { nodes { slug latest { id } assessments(first: $first) { totalCount aggregates { caps } nodes {
      project { title } previous { id } signatures { role } aggregates { byCheck { name } byGround { name } } neighbours(first: 3) { totalCount nodes { a } }
      caps(first: 1, order: utilisation) { totalCount nodes { mark checks { check } trace { results } } } } } } } }`
    const count = async (first: number) => {
      all.calls.length = 0
      const sent = await all.send(query, { first })
      expect(sent.errors).toBeUndefined()
      return {
        calls: all.calls.length,
        assessments: sent.data.projects.nodes.flatMap((p: { assessments: { nodes: [] } }) => p.assessments.nodes)
          .length,
      }
    }
    // `first: 3` gives no page of `bridge` that is shorter than its list.
    const [one, many] = [await count(2), await count(3)]
    expect([one.assessments, many.assessments]).toEqual([1, 4])
    // Who asks, projects, and one for each of the 15 kinds below.
    expect(many.calls).toBe(17)
    expect(one.calls).toBeLessThanOrEqual(many.calls)
  })

  test('pages: clean errors for sizes and cursors that are none, and for other filters', async () => {
    const id = all.quay[0]!
    for (const first of [0, -1, 1001, 2 ** 31 - 1])
      expect([
        first,
        codes(await all.send(`query ($f: Int) { projects(first: $f) { totalCount } }`, { f: first })),
      ]).toEqual([first, ['bad-query']])
    expect(codes(await all.send('{ projects(first: 1.5) { totalCount } }'))).toEqual(['graphql-invalid'])
    const { endCursor } = (await all.send(caps('first: 2'), { id })).data.assessment.caps.pageInfo
    for (let i = 0; i < endCursor.length; i++) {
      const after = endCursor.slice(0, i) + (endCursor[i] === 'A' ? 'B' : 'A') + endCursor.slice(i + 1)
      expect(codes(await all.send(caps('first: 2, after: $after'), { id, after }))).toEqual(['bad-cursor'])
    }
    expect(codes(await all.send(caps('order: mark, after: $after'), { id, after: endCursor }))).toEqual(['bad-cursor'])
    expect(codes(await all.send(caps('after: $after'), { id: all.quay[1], after: endCursor }))).toEqual(['bad-cursor'])
    expect(codes(await all.send(caps('check: "none"'), { id }))).toEqual(['bad-query'])
    for (const from of ['yesterday', '2030-02-30x', '2030-13-01'])
      expect(
        codes(await all.send('query ($from: String) { assessments(from: $from) { totalCount } }', { from })),
      ).toEqual(['bad-query'])
  })

  test('a walk misses nothing and gives nothing twice while a writer adds; times and orders', async () => {
    const draft = draftRecord(schedule(0.9))
    let writing = true
    const writer = (async () => {
      while (writing) {
        await appendRecord(all.store, 'bridge', anonymous, draft)
        // SQLite answers within one turn of the event loop: the walk needs some, too.
        await new Promise((resolve) => setTimeout(resolve, 5))
      }
    })()
    const query =
      'query ($after: String, $order: AssessmentOrder) { assessments(first: 3, after: $after, order: $order) { nodes { id createdAt summary { worst { utilisation } } } pageInfo { hasNextPage endCursor } } }'
    type Node = { id: string; createdAt: string; summary: { worst: { utilisation: number } } }
    const walk = async (order: string, most = 20) => {
      const seen: Node[] = []
      for (let after: string | undefined; seen.length < most; ) {
        const { nodes, pageInfo } = (await all.send(query, { after, order })).data.assessments
        seen.push(...nodes)
        if (!pageInfo.hasNextPage) break
        after = pageInfo.endCursor
      }
      return seen
    }
    const before = (await all.send('{ assessments(first: 1000) { nodes { id } } }')).data.assessments.nodes as Node[]
    const ways = {
      oldest: await walk('oldest'),
      newest: await walk('newest', 1000),
      utilisation: await walk('utilisation', 1000),
    }
    writing = false
    await writer
    for (const [order, seen] of Object.entries(ways)) {
      expect([order, new Set(seen.map((n) => n.id)).size]).toEqual([order, seen.length])
      if (order !== 'oldest') expect(before.filter((b) => !seen.some((n) => n.id === b.id))).toEqual([])
    }
    expect(ways.oldest.slice(0, before.length).map((n) => n.id)).toEqual(
      before.slice(0, ways.oldest.length).map((n) => n.id),
    )
    const times = ways.newest.map((n) => n.createdAt)
    expect(times).toEqual([...times].sort().reverse())
    const figures = ways.utilisation.map((n) => n.summary.worst.utilisation)
    expect(figures).toEqual([...figures].sort((a, b) => b - a))
    const from = ways.oldest[2]!.createdAt
    const { data } = await all.send(
      'query ($from: String) { a: assessments(from: $from, first: 1) { nodes { createdAt } } b: assessments(to: $from, first: 1000) { nodes { createdAt } } none: assessments(project: "none") { totalCount } one: assessments(project: "quay", order: newest, first: 1) { nodes { revision } } }',
      { from },
    )
    expect(data.a.nodes[0].createdAt).toBe(from)
    expect(data.b.nodes.every((n: Node) => n.createdAt < from)).toBe(true)
    expect([data.none.totalCount, data.one.nodes[0].revision]).toEqual([0, 4])
  })

  test('cost: by the rows that are asked for, as literals and as variables, also through fragments', async () => {
    const costly = async (query: string, variables = {}) => codes(await all.send(query, variables))
    const query = (first: string) =>
      `{ assessments(first: ${first}) { nodes { caps(first: ${first}) { nodes { checks { check } } } } } }`
    expect(await costly(query('20'))).toBeUndefined()
    expect(await costly(query('40'))).toEqual(['query-too-costly'])
    expect(await costly(query('-3'))).toEqual(['bad-query'])
    const withVariable = query('$first').replace('{', 'query ($first: Int) {')
    for (let round = 0; round < 3; round++) {
      expect(await costly(withVariable, { first: 20 })).toBeUndefined()
      const sent = await all.send(withVariable, { first: 100 })
      expect(codes(sent)).toEqual(['query-too-costly'])
      expect(sent.errors![0]!.extensions).toMatchObject({ got: 1 + 100 * (1 + 1 + 100 * (1 + 9)), limit: limits.cost })
    }
    const half =
      'fragment Half on AssessmentConnection { nodes { caps(first: 50) { nodes { mark checks { check } } } } }'
    expect(await costly(`{ a: assessments(first: 10) { ...Half } } ${half}`)).toBeUndefined()
    expect(
      await costly(`{ a: assessments(first: 10) { ...Half } b: assessments(first: 10) { ...Half } } ${half}`),
    ).toEqual(['query-too-costly'])
    const trace = (first: number) =>
      `query ($id: ID!) { assessment(id: $id) { caps(first: ${first}) { nodes { trace { results } } } } }`
    expect(await costly(trace(20), { id: all.quay[0] })).toBeUndefined()
    expect(await costly(trace(22), { id: all.quay[0] })).toEqual(['query-too-costly'])
  })

  test.each(['dashboard-projects', 'dashboard-assessment'])(
    'the example %s, interpreted and compiled',
    async (name) => {
      const query = file(`../../schema/examples/${name}.graphql`)
      const [first, second] = [await all.send(query, { id: all.quay[1] }), await all.send(query, { id: all.quay[1] })]
      expect([first.status, first.errors]).toEqual([200, undefined])
      for (let round = 0; round < 3; round++) await all.send(query, { id: all.quay[1] })
      expect((await all.send(query, { id: all.quay[1] })).data).toEqual(second.data)
      if (name === 'dashboard-assessment') {
        const { caps, changes, project } = first.data.assessment
        expect(caps.nodes.length).toBeGreaterThan(0)
        for (const cap of caps.nodes) expect(cap.checks[0].utilisation).toBe(cap.utilisation)
        expect(changes.counts.turnedExceeded).toBe(changes.verdicts.length)
        expect(project).toEqual({ slug: 'quay', title: 'Quay' })
      } else {
        const quay = first.data.projects.nodes.find((p: { slug: string }) => p.slug === 'quay')
        expect(quay.latest.signatures.map((s: { role: string }) => s.role)).toEqual(['originator'])
        expect(quay.latest.caps.totalCount).toBe(quay.latest.summary.exceeded)
        expect(first.data.assessments.aggregates.count).toBe(2)
      }
    },
  )
})

describe('rights', () => {
  let all: Seeded
  const [sqlite] = bothDatabases()
  beforeAll(async () => {
    all = await seeded(sqlite!)
  }, 120_000)
  afterAll(() => all.app.close())
  const roots = [sdl.getQueryType()!, sdl.getSubscriptionType()].flatMap((type) =>
    type ? Object.values(type.getFields()).map((field) => ({ type, field, row: `${type.name}.${field.name}` })) : [],
  )

  test('the table holds every field at the root, and no other; the links every way between stored things', () => {
    expect(Object.keys(access).sort()).toEqual(roots.map((r) => r.row).sort())
    const stored = ['Project', 'Assessment', 'Cap', 'Job']
    const ways = stored.flatMap((name) =>
      Object.values(objectOf(name).getFields())
        .filter((field) => field.args.length > 0 || isObjectType(getNamedType(field.type)))
        // Part of the record itself.
        .filter((field) => getNamedType(field.type).name !== 'Summary')
        .map((field) => `${name}.${field.name}`),
    )
    expect(ways.sort()).toEqual([...links].sort())
  })

  const asked = (name: string) => {
    const own: Record<string, string> = {
      project: 'project(slug: "quay") { slug assessments { nodes { id } } }',
      projects: 'projects { nodes { slug } totalCount }',
      assessment: `assessment(id: "${all.quay[0]}") { id }`,
      assessments: 'assessments { nodes { projectSlug } totalCount }',
      method: 'method(id: "x") { id }',
      methods: 'methods { id }',
      sources: 'sources { key }',
      limits: 'limits { depth }',
      jobs: 'jobs { nodes { id } totalCount }',
    }
    const pile = '{ section: { shape: "circular", diameter: 1 }, length: 10, installation: "bored" }'
    const ground =
      '{ layers: [{ name: "clay", unitWeight: 20, soil: "cohesive", undrainedShearStrength: 80, youngsModulus: 20000 }] }'
    const layout = 'layout: { kind: "grid", columns: 2, rows: 2, spacing: 3 }'
    const more = name === 'settlement' ? 'load: { V: 100 }' : name === 'singlePile' ? '' : layout
    return `{ ${own[name] ?? `${name}(request: { pile: ${pile}, ground: ${ground}, ${more} }) { meta { engine } }`} }`
  }
  test.each(roots.filter((r) => r.type.name === 'Query'))('$row with each scope missing', async ({ field, row }) => {
    const needed = access[row]!
    for (const scope of scopes.filter((s) => s !== 'admin')) {
      const key = await all.key(
        scopes.filter((s) => s !== scope && s !== 'admin'),
        ['quay'],
      )
      const sent = await all.send(asked(field.name), {}, key)
      if (Array.isArray(needed) && needed.includes(scope)) {
        expect([scope, codes(sent)]).toEqual([scope, ['missing-scope']])
        expect(sent.errors![0]!.extensions.status).toBe(403)
      } else expect([scope, codes(sent)]).toEqual([scope, undefined])
    }
  })

  test("another project's things are not told, and told like missing ones", async () => {
    const key = await all.key(['read'], ['bridge'])
    const ask = async (query: string) => all.send(query, {}, key)
    expect(codes(await ask(asked('project')))).toEqual(['no-such-project'])
    expect(codes(await ask(asked('assessment')))).toEqual(['no-such-assessment'])
    const told = (await ask(asked('assessment'))).errors![0]!.message.replace(all.quay[0]!, 'ID')
    expect(told).toBe((await ask('{ assessment(id: "none") { id } }')).errors![0]!.message.replace('none', 'ID'))
    const { data } = await ask(
      '{ projects { nodes { slug } totalCount } assessments { nodes { projectSlug } totalCount aggregates { count byWorstCheck { count } } } quay: assessments(project: "quay") { nodes { id } totalCount aggregates { count } } }',
    )
    expect(data.projects).toEqual({ nodes: [{ slug: 'bridge' }], totalCount: 1 })
    expect(data.assessments.nodes.map((n: { projectSlug: string }) => n.projectSlug)).toEqual(['bridge'])
    expect([data.assessments.totalCount, data.assessments.aggregates.count]).toEqual([1, 1])
    expect(data.quay).toEqual({ nodes: [], totalCount: 0, aggregates: { count: 0 } })
    const since = `{ assessment(id: "${all.bridge}") { changes(since: "${all.quay[0]}") { counts { caps } } } }`
    expect(codes(await ask(since))).toEqual(['no-such-assessment'])
  })
})
