import { isDeepStrictEqual } from 'node:util'
import { sha256 } from '../canonical.ts'
import { unpack } from './blobs.ts'
import { contentHash, NOTHING, recordHash, signatureHash, traceHash } from './chain.ts'
import { flatRows } from './flat-rows.ts'
import type { WholeRecord } from './whole-record.ts'

/** Where the database is not as it was written. */
export type Flaw = {
  readonly table: 'records' | 'caps' | 'checks' | 'neighbours' | 'traces' | 'signatures' | 'projects'
  /** The cap, pair, role or column that is wrong, where it can be told. */
  readonly at?: string
  readonly what: string
}

/** Rows against those that the record's own content gives; each row is named by `name`. */
function compareRows(
  table: Flaw['table'],
  stored: readonly object[],
  derived: readonly object[],
  name: (row: never) => string,
) {
  const flaws: Flaw[] = []
  const bare = (row: object) => ({ ...row, record: undefined, body: undefined }) as Record<string, unknown>
  const byName = new Map(stored.map((row) => [name(row as never), bare(row)]))
  for (const row of derived) {
    const at = name(row as never)
    const found = byName.get(at)
    byName.delete(at)
    if (!found) flaws.push({ table, at, what: 'the row is missing' })
    else {
      const wanted = bare(row)
      const columns = Object.keys(wanted).filter((column) => found[column] !== wanted[column])
      if (columns.length > 0) flaws.push({ table, at, what: `the row was changed: ${columns.join(', ')}` })
    }
  }
  for (const at of byName.keys()) flaws.push({ table, at, what: 'the row does not belong to the record' })
  return flaws
}

/** Everything of one record that can be recomputed from itself. */
export function verifyRecord({ record, caps, checks, neighbours, traces, signatures }: WholeRecord): Flaw[] {
  const flaws: Flaw[] = []
  const flaw = (table: Flaw['table'], what: string, at?: string) => flaws.push({ table, what, ...(at && { at }) })
  const read = (table: Flaw['table'], at: string, blob: Uint8Array): string => {
    try {
      return unpack(blob)
    } catch {
      flaw(table, 'the compressed bytes were changed', at)
      return ''
    }
  }
  if (recordHash(record) !== record.record_hash) flaw('records', 'the fields do not give the record hash')
  const parts = {
    notices: record.notices,
    outcome: read('records', 'outcome', record.outcome),
    caps: caps.map((cap) => read('caps', cap.mark, cap.body)),
    request: read('records', 'request', record.request),
  }
  if (sha256([parts.request]) !== record.request_hash) flaw('records', 'the request does not give its hash', 'request')
  if (contentHash(parts) !== record.content_hash) flaw('records', 'the content does not give its hash', 'content')
  const texts = traces.map(({ cap, trace }) => ({ cap, text: read('traces', String(cap), trace) }))
  if (traceHash(texts) !== record.trace_hash) flaw('traces', 'the traces do not give their hash')
  try {
    const bodies = parts.caps.map((text) => JSON.parse(text))
    const rows = flatRows(JSON.parse(parts.request), { caps: bodies, ...JSON.parse(parts.outcome) })
    const { summary } = rows
    const wrong = Object.entries(summary).filter(([column, value]) => record[column as keyof typeof summary] !== value)
    if (wrong.length > 0) flaw('records', `the row was changed: ${wrong.map(([column]) => column).join(', ')}`)
    flaws.push(
      ...compareRows('caps', caps, rows.caps, (row: { mark: string }) => row.mark),
      ...compareRows(
        'checks',
        checks,
        rows.checks,
        (row: { mark: string; check_kind: string }) => `${row.mark} ${row.check_kind}`,
      ),
      ...compareRows('neighbours', neighbours, rows.neighbours, (row: { ordinal: number }) => String(row.ordinal)),
    )
  } catch {
    flaw('records', 'the content cannot be read')
  }
  let previous = NOTHING
  for (const [i, signature] of signatures.entries()) {
    const { signature_hash, ...signed } = signature
    const holds =
      signatureHash(signed) === signature_hash &&
      isDeepStrictEqual(
        [signature.ordinal, signature.previous_hash, signature.signed_hash],
        [i + 1, previous, record.record_hash],
      )
    if (!holds) flaw('signatures', 'the signature was changed, or one before it is gone', signature.role)
    previous = signature_hash
  }
  return flaws
}
