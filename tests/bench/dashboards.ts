import { mkdtempSync, readFileSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { DatabaseSync, type SQLInputValue, StatementSync } from 'node:sqlite'
import type { FastifyInstance } from 'fastify'
import { sql } from 'kysely'
import { buildApp } from '../../src/app.ts'
import { readConfig } from '../../src/config.ts'
import { anonymous } from '../../src/store/actor.ts'
import { appendRecord } from '../../src/store/append-record.ts'
import type { Draft } from '../../src/store/draft.ts'
import { FILE, type Store } from '../../src/store/open-store.ts'
import { type Finding, median, quantile, sink } from './measure.ts'
import { drafts, seed } from './seed.ts'

/** So many records; 10 000 takes some minutes. */
const RECORDS = Number(process.env.BENCH_RECORDS ?? 300)
const ROUNDS = 60
const WARM_UP = 8
/** ms */
const AIM = 100

const example = (name: string) =>
  readFileSync(new URL(`../../schema/examples/${name}.graphql`, import.meta.url), 'utf8')
const head = 'id projectSlug revision title createdAt actor summary { caps exceeded worst { cap check utilisation } }'
const queries: Readonly<Record<string, string>> = {
  'flat list, newest first, 50 rows, total': `{ assessments(order: newest, first: 50) { totalCount nodes { ${head} } } }`,
  'one project in a time, exceeded, 50 rows, total': `query ($slug: String, $from: String, $to: String) { assessments(project: $slug, from: $from, to: $to, exceeded: true, first: 50) { totalCount nodes { ${head} } } }`,
  'worst first, 50 rows': `{ assessments(order: utilisation, first: 50) { nodes { ${head} } } }`,
  'aggregates over every record':
    '{ assessments(first: 1) { aggregates { count exceeded caps capsExceeded largestUtilisation byWorstCheck { check count exceeded largestUtilisation } } } }',
  'newest of each project, worst first, with aggregates': `{ assessments(latest: true, order: utilisation, first: 20) { totalCount aggregates { count exceeded } nodes { ${head} aggregates { byCheck { name largestUtilisation } } } } }`,
  'caps of one, exceeded, worst first, with checks':
    'query ($id: ID!) { assessment(id: $id) { caps(exceeded: true, order: utilisation, first: 50) { totalCount nodes { mark utilisation checks { check utilisation satisfied } } } } }',
  'example dashboard-projects': example('dashboard-projects'),
  'example dashboard-assessment (compares in a thread)': example('dashboard-assessment'),
}

type Statement = { readonly text: string; readonly values: readonly SQLInputValue[] }
let seen: Statement[] | undefined
/** Notes the statements that go to SQLite, so that the same can be run by hand. */
function watchStatements(): void {
  for (const name of ['all', 'iterate'] as const) {
    const run = StatementSync.prototype[name]
    StatementSync.prototype[name] = function (this: StatementSync, ...values: SQLInputValue[]) {
      seen?.push({ text: this.sourceSQL, values })
      return (run as unknown as (...values: SQLInputValue[]) => never).apply(this, values)
    } as never
  }
}

type Ask = (
  query: string,
  variables: object,
) => Promise<{ assessments: { nodes: { id: string }[]; pageInfo: { hasNextPage: boolean; endCursor: string } } }>
const asking =
  (app: FastifyInstance): Ask =>
  async (query, variables) => {
    const reply = await app.inject({ method: 'POST', url: '/graphql', payload: { query, variables } })
    const { data, errors } = reply.json()
    if (errors) throw new Error(JSON.stringify(errors))
    return data
  }
const elapsed = async (run: () => unknown): Promise<number> => {
  const from = performance.now()
  await run()
  return performance.now() - from
}
const ms = (value: number) => `${value.toFixed(value < 10 ? 2 : 1)} ms`

/** Each query by GraphQL and its statements by hand, turn by turn. */
async function measured(
  ask: Ask,
  byHand: DatabaseSync,
  what: string,
  query: string,
  variables: () => object,
): Promise<Finding> {
  const [asked, hand]: [number[], number[]] = [[], []]
  for (let round = -WARM_UP; round < ROUNDS; round++) {
    const given = variables()
    seen = []
    const one = await elapsed(() => ask(query, given))
    const statements = seen
    seen = undefined
    const two = await elapsed(() => {
      for (const { text, values } of statements) sink.sum += byHand.prepare(text).all(...values).length
    })
    if (round < 0) continue
    asked.push(one)
    hand.push(two)
  }
  const [p95, own] = [quantile(asked, 0.95), quantile(hand, 0.95)]
  const times = median(asked.map((value, i) => value / hand[i]!))
  const value = `p95 ${ms(p95)}, SQL by hand ${ms(own)}, ${times.toFixed(1)} times it`
  return { part: 'g', what, value, aim: `< ${AIM} ms`, holds: p95 < AIM }
}

/** Walks every record by cursor while a writer adds some: each is seen once. */
async function walked(ask: Ask, store: Store, made: Draft): Promise<Finding[]> {
  const query =
    'query ($after: String) { assessments(first: 100, after: $after) { nodes { id } pageInfo { hasNextPage endCursor } } }'
  let writing = true
  let added = 0
  const writer = (async () => {
    for (; writing; added++) {
      await appendRecord(store, 'project-0', anonymous, made)
      await new Promise((resolve) => setTimeout(resolve, 20))
    }
  })()
  const ids: string[] = []
  const times: number[] = []
  for (let after: string | undefined; ; ) {
    let page: Awaited<ReturnType<Ask>>['assessments'] | undefined
    times.push(
      await elapsed(async () => {
        page = (await ask(query, { after })).assessments
      }),
    )
    ids.push(...page!.nodes.map((node) => node.id))
    if (!page!.pageInfo.hasNextPage) break
    after = page!.pageInfo.endCursor
  }
  writing = false
  await writer
  const once = new Set(ids).size === ids.length && ids.length >= RECORDS && ids.length <= RECORDS + added
  const value = `${ids.length} seen once each, ${added} added meanwhile, page p95 ${ms(quantile(times, 0.95))}`
  return [{ part: 'g', what: `walk over ${RECORDS} records while a writer adds`, value, aim: 'each once', holds: once }]
}

/** Pages of caps by cursor, of ten records each, while a writer adds: against what one page gives. */
async function cappedPages(app: FastifyInstance, store: Store, ids: readonly string[], made: Draft): Promise<Finding> {
  let writing = true
  const writer = (async () => {
    while (writing) {
      await appendRecord(store, 'project-0', anonymous, made)
      await new Promise((resolve) => setTimeout(resolve, 20))
    }
  })()
  const times: number[] = []
  let same = true
  for (const id of ids) {
    const marks: string[] = []
    for (let url: string | undefined = `/v1/assessments/${id}/caps?limit=10&order=utilisation`; url; ) {
      const at: string = url
      times.push(
        await elapsed(async () => {
          const reply = await app.inject(at)
          marks.push(...reply.json().items.map((cap: { mark: string }) => cap.mark))
          url = /<([^>]+)>/.exec(String(reply.headers.link ?? ''))?.[1]
        }),
      )
    }
    const whole = (await app.inject(`/v1/assessments/${id}/caps?limit=1000&order=utilisation`)).json().items
    same &&= JSON.stringify(marks) === JSON.stringify(whole.map((cap: { mark: string }) => cap.mark))
  }
  writing = false
  await writer
  const value = `page p95 ${ms(quantile(times, 0.95))}, ${times.length} pages`
  return { part: 'g', what: 'cap pages by cursor while a writer adds', value, aim: 'the same', holds: same }
}

/** Bytes of a record in a store of a hundred, with and without its traces. */
async function sizes(folder: string, made: readonly Draft[]): Promise<Finding> {
  const few = 100
  const bytes: number[] = []
  for (const traces of [true, false]) {
    const store = await seed(join(folder, `size-${traces}`), few, made, traces)
    bytes.push(await store.capabilities.size(store.reader))
    await store.close()
  }
  const [all, without] = bytes.map((size) => `${(size / few / 1024).toFixed(0)} KiB`)
  return { part: 'g', what: 'store size of an assessment of 50 caps', value: `${all}, without traces ${without}` }
}

/** (g) Dashboard queries over a store of years, on SQLite: p95, and against the same SQL by hand. */
export async function dashboards(): Promise<Finding[]> {
  const folder = mkdtempSync(join(tmpdir(), 'kentledge-bench-'))
  try {
    const made = drafts()
    const size = await sizes(folder, made)
    let store!: Store
    const seeding = await elapsed(async () => {
      store = await seed(join(folder, 'store'), RECORDS, made)
    })
    const bytes = await store.capabilities.size(store.reader)
    await sql`pragma synchronous = full`.execute(store.db)
    const rows = await store.reader
      .selectFrom('records')
      .select(['id', 'project', 'created_at'])
      .orderBy('id')
      .execute()
    const app = await buildApp(readConfig({ LOG_LEVEL: 'silent', AUTH: 'off' }), store)
    watchStatements()
    const byHand = new DatabaseSync(join(folder, 'store', FILE), { readOnly: true })
    byHand.exec('pragma cache_size = -32000')
    const ask = asking(app)
    let turn = 0
    const variables = () => {
      // A stride that has no factor in common with the revisions of a project; never the first revision, which has none before it.
      turn += 37
      const at = rows[turn % rows.length]!
      const own = turn % 50 === 0 ? rows[(turn + 1) % rows.length]! : at
      const day = new Date(Date.parse(own.created_at) + 86_400_000).toISOString()
      return { id: own.id, slug: own.project, from: own.created_at, to: day }
    }
    const found: Finding[] = [
      {
        part: 'g',
        what: `seeded: ${RECORDS} records of 50 caps`,
        value: `${(bytes / 2 ** 20).toFixed(0)} MiB, ${ms(seeding / RECORDS)} a record`,
      },
      size,
    ]
    for (const [what, query] of Object.entries(queries)) {
      const names = [...query.matchAll(/\$(\w+):/g)].map((one) => one[1]!)
      const given = () => {
        const all = variables() as Record<string, unknown>
        return Object.fromEntries(names.filter((name) => name in all).map((name) => [name, all[name]]))
      }
      found.push(await measured(ask, byHand, what, query, given))
    }
    byHand.close()
    found.push(...(await walked(ask, store, made[0]!)))
    found.push(
      await cappedPages(
        app,
        store,
        rows.slice(0, 20).map((row) => row.id),
        made[0]!,
      ),
    )
    await app.close()
    return found
  } finally {
    rmSync(folder, { recursive: true, force: true })
  }
}
