import createClient from 'openapi-fetch'
import type { components, paths } from './openapi.d.ts'

export type Schemas = components['schemas']

/** A refusal of the service, with every fault as data. */
export class KentledgeProblem extends Error {
  readonly problem: Schemas['Problem']
  constructor(problem: Schemas['Problem']) {
    super([problem.detail, ...(problem.errors ?? []).map((e) => `${e.pointer}: ${e.detail}`)].join('\n'))
    this.name = 'KentledgeProblem'
    this.problem = problem
  }
}

export type ClientOptions = { readonly baseUrl: string; readonly retries?: number; readonly fetch?: typeof fetch }

const wait = (seconds: number) => new Promise((resolve) => setTimeout(resolve, seconds * 1000))

/** fetch that waits as `Retry-After` says and tries again where the service is busy (503). The calculators are pure, so a retry is safe. */
function patient(retries: number, base: typeof fetch): typeof fetch {
  return async (input, init) => {
    for (let left = retries; ; left--) {
      const reply = await base(input instanceof Request ? input.clone() : input, init)
      if (reply.status !== 503 || left <= 0) return reply
      await wait(Number(reply.headers.get('retry-after') ?? 1))
    }
  }
}

/** The way an exporter written in TypeScript calls the service: typed requests and answers, problems as errors. */
export function kentledge({ baseUrl, retries = 3, fetch: base = globalThis.fetch }: ClientOptions) {
  const http = patient(retries, base)
  // The pages that the same routes answer with are for eyes.
  const client = createClient<paths, 'application/json'>({ baseUrl, fetch: (request) => http(request) })
  type Trace = { readonly trace?: 'none'; readonly of?: string; readonly cap?: string }
  const taken = <T>({ data, error }: { data?: T; error?: unknown }): T => {
    if (data !== undefined) return data
    throw new KentledgeProblem(error as Schemas['Problem'])
  }
  return {
    singlePile: async (body: Schemas['SinglePileRequest'], query: Trace = {}) =>
      taken(await client.POST('/v1/single-pile', { body, params: { query } })),
    block: async (body: Schemas['GroupRequest'], query: Trace = {}) =>
      taken(await client.POST('/v1/block', { body, params: { query } })),
    group: async (body: Schemas['GroupRequest'], query: Trace = {}) =>
      taken(await client.POST('/v1/group', { body, params: { query } })),
    settlement: async (body: Schemas['SettlementRequest'], query: Trace = {}) =>
      taken(await client.POST('/v1/settlement', { body, params: { query } })),
    replay: async (body: Schemas['ReplayRequest']) => taken(await client.POST('/v1/replay', { body })),
    methods: async () => taken(await client.GET('/v1/methods')),
    assess: async (body: Schemas['Schedule'], query: Trace = {}) =>
      taken(await client.POST('/v1/assessments', { body, params: { query } })),
    /** The schedule without `loads.rows`, the rows as CSV with a header. */
    assessCsv: async (
      schedule: object,
      loads: string | Blob,
      query: Trace = {},
    ): Promise<Schemas['AssessmentAnswer']> => {
      const form = new FormData()
      form.set('schedule', JSON.stringify(schedule))
      form.set('loads', typeof loads === 'string' ? new Blob([loads], { type: 'text/csv' }) : loads, 'loads.csv')
      const search = new URLSearchParams(query as Record<string, string>)
      const reply = await http(`${baseUrl}/v1/assessments?${search}`, { method: 'POST', body: form })
      const read: unknown = await reply.json()
      return taken(reply.ok ? { data: read as Schemas['AssessmentAnswer'] } : { error: read })
    },
  }
}
