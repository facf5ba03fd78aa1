import type { FastifyInstance } from 'fastify'
import { buildApp } from '../../src/app.ts'
import { readConfig } from '../../src/config.ts'
import { readExamples } from '../../src/contract/examples.ts'
import { draftRecord } from '../../src/operations/draft-record.ts'
import type { Scope } from '../../src/store/actor.ts'
import { appendRecord } from '../../src/store/append-record.ts'
import { makeKey } from '../../src/store/keys.ts'
import { openStore, type Store } from '../../src/store/open-store.ts'
import { putProject } from '../../src/store/projects.ts'
import { sign } from '../../src/store/signatures.ts'
import type { Database } from '../store/databases.ts'

type Example = {
  title: string
  caps: { mark: string; capWeight?: number }[]
  loads: { rows: Record<string, number>[] }
  limits?: object
}
/** The example, with its loads times so much. */
export function schedule(factor = 1): Example {
  const made = structuredClone(readExamples().assessment) as Example
  made.title = `Example, loads times ${factor}`
  for (const row of made.loads.rows)
    for (const force of ['V', 'Fz', 'Mx', 'My']) if (row[force] !== undefined) row[force] *= factor
  return made
}

export type Sent = {
  readonly status: number
  // biome-ignore lint/suspicious/noExplicitAny: the tests say what they expect
  readonly data: any
  readonly errors?: readonly { readonly message: string; readonly extensions: Record<string, unknown> }[]
}
/** A service over a store with two projects: `quay` with four revisions, the last one signed, and `bridge` with one. */
export type Seeded = {
  readonly app: FastifyInstance
  readonly store: Store
  /** Ids of the revisions of quay, and the one of bridge. */
  readonly quay: readonly string[]
  readonly bridge: string
  readonly calls: string[]
  readonly send: (query: string, variables?: object, key?: string) => Promise<Sent>
  // biome-ignore lint/suspicious/noExplicitAny: any document of the service
  readonly get: (url: string, key?: string) => Promise<any>
  readonly key: (scopes: readonly Scope[], projects: readonly string[]) => Promise<string>
}

export async function seeded(database: Database): Promise<Seeded> {
  const calls: string[] = []
  const store = await openStore({ ...(await database.place()).options, watch: (sql) => calls.push(sql) })
  const app = await buildApp(readConfig({ LOG_LEVEL: 'silent', WORKERS: '1' }), store)
  const drafts = [1, 1.3, 0.7, 1.1].map((factor) => draftRecord(schedule(factor)))
  await putProject(store, 'quay', 'Quay')
  await putProject(store, 'bridge', 'Bridge')
  await putProject(store, 'empty', 'Nothing yet')
  const actor = { name: 'Exporter', key: null, scopes: ['admin'], projects: ['*'] } as const
  const records = []
  for (const draft of drafts) records.push(await appendRecord(store, 'quay', actor, draft))
  const bridge = await appendRecord(store, 'bridge', actor, drafts[1]!)
  await sign(store, records[3]!, actor, { role: 'originator', meaning: 'mine' })
  const key = async (scopes: readonly Scope[], projects: readonly string[]) =>
    (await makeKey(store, { name: 'Reader', scopes, projects })).key
  const admin = await key(['admin'], ['*'])
  return {
    app,
    store,
    quay: records.map((record) => record.id),
    bridge: bridge.id,
    calls,
    key,
    send: async (query, variables = {}, key = admin) => {
      const headers = { authorization: `Bearer ${key}`, accept: 'application/graphql-response+json' }
      const reply = await app.inject({ method: 'POST', url: '/graphql', headers, payload: { query, variables } })
      return { status: reply.statusCode, ...reply.json() }
    },
    get: async (url, key = admin) => (await app.inject({ url, headers: { authorization: `Bearer ${key}` } })).json(),
  }
}
