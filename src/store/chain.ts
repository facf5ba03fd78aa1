import { hashOf, sha256 } from '../canonical.ts'
import type { RecordRow, SignatureRow } from './tables.ts'

/** Stands before the first record of a project and the first signature of a record. */
export const NOTHING = `sha256:${'0'.repeat(64)}`

/** What the hash of a record covers: texts and one whole number, so that any canonical JSON printer gives the same bytes. */
export type Link = Pick<
  RecordRow,
  | 'id'
  | 'project'
  | 'revision'
  | 'title'
  | 'created_at'
  | 'actor'
  | 'actor_key'
  | 'engine'
  | 'request_hash'
  | 'content_hash'
  | 'trace_hash'
  | 'previous_hash'
>

/** The fields of a link by the names of the contract. */
export const linkOf = (r: Link) => ({
  id: r.id,
  project: r.project,
  revision: r.revision,
  title: r.title,
  createdAt: r.created_at,
  actor: r.actor,
  actorKey: r.actor_key,
  engine: r.engine,
  requestHash: r.request_hash,
  contentHash: r.content_hash,
  traceHash: r.trace_hash,
  previousHash: r.previous_hash,
})
export const recordHash = (record: Link): string => hashOf(linkOf(record))

export type Signed = Omit<SignatureRow, 'signature_hash'>
/** Over all that a signature binds, and the signature before it. */
export const signatureHash = (s: Signed): string =>
  hashOf({
    id: s.id,
    record: s.record,
    ordinal: s.ordinal,
    role: s.role,
    meaning: s.meaning,
    actor: s.actor,
    actorKey: s.actor_key,
    signedAt: s.signed_at,
    signedHash: s.signed_hash,
    previousHash: s.previous_hash,
  })

/** The stored parts of a record's content, each canonical JSON. */
export type ContentParts = {
  readonly notices: string
  /** `{"neighbours":…,"summary":…}` */
  readonly outcome: string
  readonly caps: readonly string[]
  readonly request: string
}

/** The content of a record as canonical JSON, in pieces: `{ notices, request, result: { caps, neighbours, summary } }`. */
export function* contentPieces({ notices, outcome, caps, request }: ContentParts): Generator<string> {
  yield `{"notices":${notices},"request":${request},"result":{"caps":[`
  for (const [i, cap] of caps.entries()) yield i === 0 ? cap : `,${cap}`
  yield `],${outcome.slice(1)}}`
}
export const contentHash = (parts: ContentParts): string => sha256(contentPieces(parts))

/** Over the parts of the trace of a record, in their order. */
export const traceHash = (traces: readonly { readonly cap: number; readonly text: string }[]): string =>
  sha256(traces.flatMap(({ cap, text }) => [`${cap}\n`, text, '\n']))
