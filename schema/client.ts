import createClient from 'openapi-fetch'
import { type Patience, patient, waitSeconds } from './client-retry.ts'
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

export type ClientOptions = Partial<Patience> & {
  readonly baseUrl: string
  /** The key that the operator made; left out where the service runs without keys. */
  readonly key?: string
}
/** What makes a retry of a stored assessment safe: the same key for the same schedule. A fresh one where it is left out. */
export type RecordOptions = { readonly idempotencyKey?: string }

type Trace = { readonly trace?: 'none'; readonly of?: string; readonly cap?: string }
type CapQuery = {
  readonly check?: string
  readonly utilisationAtLeast?: string
  readonly exceeded?: 'true' | 'false'
  readonly ground?: string
  readonly pileType?: string
  readonly mark?: string
  readonly order?: 'schedule' | 'mark' | 'utilisation' | 'settlement'
}

function formOf(schedule: object, loads: string | Blob): FormData {
  const form = new FormData()
  form.set('schedule', JSON.stringify(schedule))
  form.set('loads', typeof loads === 'string' ? new Blob([loads], { type: 'text/csv' }) : loads, 'loads.csv')
  return form
}

/** Longest time between two looks, s: the first ones come sooner. */
const SELDOM = 2

async function waitFor(
  look: (id: string) => Promise<Schemas['AssessmentOrJob']>,
  id: string,
  told: (progress: Schemas['Job']['progress']) => void = () => undefined,
): Promise<Schemas['Assessment']> {
  for (let pause = 0.1; ; pause = Math.min(SELDOM, 1.5 * pause)) {
    const found = await look(id)
    if (found.state === 'completed') return found
    if (found.problem) throw new KentledgeProblem(found.problem)
    told(found.progress)
    await waitSeconds(pause)
  }
}

/** The way an exporter written in TypeScript calls the service: typed requests and answers, problems as errors. */
export function kentledge({ baseUrl, key, retries = 3, fetch: base = globalThis.fetch }: ClientOptions) {
  const http = patient({ retries, fetch: base })
  const headers = key === undefined ? {} : { authorization: `Bearer ${key}` }
  // The pages that the same routes answer with are for eyes.
  const client = createClient<paths, 'application/json'>({ baseUrl, headers, fetch: (request) => http(request) })
  // Named by their schemas: the types that openapi-fetch derives turn readonly lists into objects.
  const taken = <Name extends keyof Schemas>({ data, error }: { data?: unknown; error?: unknown }): Schemas[Name] => {
    if (data !== undefined) return data as Schemas[Name]
    throw new KentledgeProblem(error as Schemas['Problem'])
  }
  const send = async <Name extends keyof Schemas>(url: string, body: FormData, more: Record<string, string> = {}) => {
    const reply = await http(new Request(baseUrl + url, { method: 'POST', body, headers: { ...headers, ...more } }))
    const read: unknown = await reply.json()
    return taken<Name>(reply.ok ? { data: read } : { error: read })
  }
  const onceKey = ({ idempotencyKey = crypto.randomUUID() }: RecordOptions) => ({ 'Idempotency-Key': idempotencyKey })
  const assessment = async (id: string) =>
    taken<'AssessmentOrJob'>(await client.GET('/v1/assessments/{id}', { params: { path: { id } } }))
  return {
    singlePile: async (body: Schemas['SinglePileRequest'], query: Trace = {}) =>
      taken<'SinglePileAnswer'>(await client.POST('/v1/single-pile', { body, params: { query } })),
    block: async (body: Schemas['GroupRequest'], query: Trace = {}) =>
      taken<'BlockAnswer'>(await client.POST('/v1/block', { body, params: { query } })),
    group: async (body: Schemas['GroupRequest'], query: Trace = {}) =>
      taken<'GroupAnswer'>(await client.POST('/v1/group', { body, params: { query } })),
    settlement: async (body: Schemas['SettlementRequest'], query: Trace = {}) =>
      taken<'SettlementAnswer'>(await client.POST('/v1/settlement', { body, params: { query } })),
    replay: async (body: Schemas['ReplayRequest']) => taken<'ReplayAnswer'>(await client.POST('/v1/replay', { body })),
    methods: async () => taken<'MethodList'>(await client.GET('/v1/methods')),
    assess: async (body: Schemas['Schedule'], query: Trace = {}) =>
      taken<'AssessmentAnswer'>(await client.POST('/v1/assessments', { body, params: { query } })),
    /** The schedule without `loads.rows`, the rows as CSV with a header. */
    assessCsv: (schedule: object, loads: string | Blob, query: Trace = {}) =>
      send<'AssessmentAnswer'>(
        `/v1/assessments?${new URLSearchParams(query as Record<string, string>)}`,
        formOf(schedule, loads),
      ),

    /** Makes a project; leaves one of this title as it is. */
    putProject: async (slug: string, title: string) =>
      taken<'Project'>(await client.PUT('/v1/projects/{slug}', { body: { title }, params: { path: { slug } } })),
    /** Assesses a schedule and keeps it as the next revision of a project. */
    record: async (slug: string, body: Schemas['Schedule'], options: RecordOptions = {}) =>
      taken<'Assessment'>(
        await client.POST('/v1/projects/{slug}/assessments', {
          body,
          params: { path: { slug }, header: onceKey(options) },
        }),
      ),
    recordCsv: (slug: string, schedule: object, loads: string | Blob, options: RecordOptions = {}) =>
      send<'Assessment'>(
        `/v1/projects/${encodeURIComponent(slug)}/assessments`,
        formOf(schedule, loads),
        onceKey(options),
      ),
    assessments: async (slug: string, cursor?: string) =>
      taken<'AssessmentList'>(
        await client.GET('/v1/projects/{slug}/assessments', { params: { path: { slug }, query: { cursor } } }),
      ),
    /** As `record`, but answers as soon as the schedule stands in line. */
    queue: async (slug: string, body: Schemas['Schedule'], options: RecordOptions = {}) =>
      taken<'Job'>(
        await client.POST('/v1/projects/{slug}/assessments', {
          body,
          params: { path: { slug }, header: { ...onceKey(options), Prefer: 'respond-async' } },
        }),
      ),
    assessment,
    /** Waits until an assessment is completed, and tells how far it is. Throws the problem of one that fails or is cancelled. */
    waitFor: (id: string, told?: (progress: Schemas['Job']['progress']) => void) => waitFor(assessment, id, told),
    cancel: async (id: string) =>
      taken<'Job'>(await client.DELETE('/v1/assessments/{id}', { params: { path: { id } } })),
    content: async (id: string) =>
      taken<'Content'>(await client.GET('/v1/assessments/{id}/content', { params: { path: { id } } })),
    /** Every cap of a record that the filters let through, page after page. */
    async *caps(id: string, query: CapQuery = {}): AsyncGenerator<Schemas['CapRow']> {
      for (let cursor: string | undefined; ; ) {
        const params = { path: { id }, query: { ...query, cursor } }
        const page: Schemas['CapList'] = taken<'CapList'>(await client.GET('/v1/assessments/{id}/caps', { params }))
        yield* page.items
        if (page.next === undefined) return
        cursor = page.next
      }
    },
    cap: async (id: string, mark: string, query: Pick<Trace, 'trace'> = {}) =>
      taken<'CapReply'>(
        await client.GET('/v1/assessments/{id}/caps/{mark}', { params: { path: { id, mark }, query } }),
      ),
    /** What differs from another revision of the project; without `since` from the one right before. */
    changes: async (id: string, since?: string) =>
      taken<'ChangesReply'>(
        await client.GET('/v1/assessments/{id}/changes', { params: { path: { id }, query: { since } } }),
      ),
    sign: async (id: string, body: Schemas['SignatureRequest']) =>
      taken<'Signature'>(await client.POST('/v1/assessments/{id}/signatures', { body, params: { path: { id } } })),
    integrity: async (slug: string, checkpoint?: { readonly revision: number; readonly hash: string }) =>
      taken<'IntegrityReply'>(
        await client.GET('/v1/projects/{slug}/integrity', {
          params: {
            path: { slug },
            query: checkpoint && { revision: String(checkpoint.revision), hash: checkpoint.hash },
          },
        }),
      ),
    reverify: async (id: string) =>
      taken<'ReverifyReply'>(await client.POST('/v1/assessments/{id}/reverify', { params: { path: { id } } })),
  }
}
