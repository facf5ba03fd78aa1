import type { Insertable, Selectable } from 'kysely'

/**
 * The tables. One set of types in both databases: times are ISO 8601 texts in UTC with milliseconds, so that they sort;
 * yes and no are 1 and 0; hashes are `sha256:…`; blobs are zstd.
 */
export type Flag = 0 | 1

export type ProjectTable = {
  slug: string
  title: string
  created_at: string
  updated_at: string
  /** Revision and record hash of the newest record: 0 and the hash of nothing before the first. */
  revision: number
  head: string
}

/** A completed assessment. Never changed: triggers refuse it. */
export type RecordTable = {
  /** UUID version 7: sorts by time. */
  id: string
  project: string
  /** 1, 2, 3 … in its project. */
  revision: number
  title: string
  created_at: string
  /** The person or pipeline that the key belongs to, and the key's id; no key where keys are off. */
  actor: string
  actor_key: string | null
  engine: string
  /** Over the canonical request; over the canonical request, result and notices; over the traces. */
  request_hash: string
  content_hash: string
  trace_hash: string
  /** record_hash of the record before it in its project; `noRecord` for the first. */
  previous_hash: string
  record_hash: string
  caps: number
  satisfied: number
  exceeded: number
  worst_cap: string | null
  worst_check: string | null
  worst_combination: string | null
  worst_utilisation: number | null
  /** Canonical JSON as text: the summary of the result, of which the columns above are a part; the notices of the answer. */
  summary: string
  notices: string
  /** Canonical JSON, compressed: `{ neighbours, summary }` of the result; the request. */
  outcome: Uint8Array
  request: Uint8Array
}

/** One cap of a record, flat for queries; its part of the result as canonical JSON, compressed. */
export type CapTable = {
  record: string
  mark: string
  ordinal: number
  ground: string
  pile_type: string
  pile_count: number
  x: number
  y: number
  /** The check of the largest utilisation; none where nothing was checked. */
  governing_check: string | null
  governing_combination: string | null
  utilisation: number | null
  exceeded: Flag
  /** Largest over the combinations: mm; ratio along x or y. */
  settlement: number | null
  tilt: number | null
  /** kN/m; kN.m/rad. */
  stiffness_vertical: number
  stiffness_rocking_x: number
  stiffness_rocking_y: number
  body: Uint8Array
}

export type CheckTable = {
  record: string
  cap: number
  mark: string
  check_kind: string
  limit_state: string
  combination: string
  demand: number
  resistance: number
  utilisation: number
  exceeded: Flag
  pile: number | null
}

export type NeighbourTable = {
  record: string
  ordinal: number
  a: string
  b: string
  distance: number
  combination: string
  differential_settlement: number
  angular_distortion: number
  utilisation: number | null
  exceeded: Flag | null
}

/**
 * A part of the trace: that of one cap (`cap` is its ordinal), and of summary and neighbours after the last cap. Steps that
 * several caps need lie in the first of them; a part names those that it uses.
 */
export type TraceTable = { record: string; cap: number; trace: Uint8Array }

export type SignatureTable = {
  id: string
  record: string
  ordinal: number
  role: 'originator' | 'checker' | 'approver'
  meaning: string
  actor: string
  actor_key: string | null
  signed_at: string
  /** The record's hash; the signature before it; over this signature. */
  signed_hash: string
  previous_hash: string
  signature_hash: string
}

export type KeyTable = {
  id: string
  /** SHA-256 of the whole key. The key itself is shown once and kept nowhere. */
  hash: string
  name: string
  /** JSON lists; projects may be `["*"]`. */
  scopes: string
  projects: string
  created_at: string
  expires_at: string | null
  revoked_at: string | null
  replaces: string | null
}

export type IdempotencyTable = {
  /** Id of the API key, so that two keys may use the same string. */
  owner: string
  key: string
  fingerprint: string
  /** `running` until its lease ends or the reply stands. */
  state: 'running' | 'done'
  runner: string
  lease_until: string
  expires_at: string
  status: number | null
  headers: string | null
  body: Uint8Array | null
}

/** An assessment that is not a record yet: it waits, runs, or ended without one. Its row goes when its record comes. */
export type JobTable = {
  /** That of the record to come. UUID version 7: jobs are begun in this order. */
  id: string
  project: string
  state: 'queued' | 'running' | 'failed' | 'cancelled'
  actor: string
  actor_key: string | null
  /** Trace id of the request that asked for it. */
  trace_id: string
  created_at: string
  started_at: string | null
  finished_at: string | null
  /** How often it was begun, and by which run it is held now. */
  attempts: number
  runner: string | null
  /** Caps done of caps; none are known before the schedule has been read. */
  done: number
  caps: number | null
  /** A problem document as JSON, where it ended without a record. */
  problem: string | null
  /** The schedule as it came, JSON and CSV, compressed; gone when the job has ended. */
  schedule: Uint8Array | null
  loads: Uint8Array | null
}

export type VersionTable = { version: number; name: string; applied_at: string }
export type ProbeTable = { id: number; written_at: string }

export type Tables = {
  projects: ProjectTable
  records: RecordTable
  caps: CapTable
  checks: CheckTable
  neighbours: NeighbourTable
  traces: TraceTable
  signatures: SignatureTable
  keys: KeyTable
  idempotency: IdempotencyTable
  jobs: JobTable
  schema_versions: VersionTable
  probe: ProbeTable
}

export type ProjectRow = Selectable<ProjectTable>
export type RecordRow = Selectable<RecordTable>
export type CapRow = Selectable<CapTable>
export type CheckRow = Selectable<CheckTable>
export type NeighbourRow = Selectable<NeighbourTable>
export type TraceRow = Selectable<TraceTable>
export type SignatureRow = Selectable<SignatureTable>
export type KeyRow = Selectable<KeyTable>
export type JobRow = Selectable<JobTable>
export type IdempotencyRow = Insertable<IdempotencyTable>
