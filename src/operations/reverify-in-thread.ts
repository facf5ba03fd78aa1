import { Problem } from '../errors.ts'
import { outcomeOf, type Work } from '../jobs/pool.ts'
import { unpack } from '../store/blobs.ts'
import type { Draft } from '../store/draft.ts'
import { type Difference, differences } from './differences.ts'
import { draftRecord } from './draft-record.ts'

/** The stored parts of a record that a new run is held against. */
export type Stored = {
  readonly request: Uint8Array
  readonly outcome: Uint8Array
  readonly notices: string
  readonly caps: readonly Uint8Array[]
}
export type Reverified = Pick<Draft['record'], 'content_hash' | 'engine'> & {
  readonly count: number
  readonly changes: readonly Difference[]
}

/** So many differences are told one by one. */
const MOST = 1000

const contentOf = (parts: Pick<Stored, 'outcome' | 'notices' | 'caps'>) => ({
  notices: JSON.parse(parts.notices),
  result: { caps: parts.caps.map((cap) => JSON.parse(unpack(cap))), ...JSON.parse(unpack(parts.outcome)) },
})

function reverify(stored: Stored): Reverified {
  let draft: Draft
  try {
    draft = draftRecord(JSON.parse(unpack(stored.request)))
  } catch (problem) {
    if (!(problem instanceof Problem)) throw problem
    throw new Problem('engine-refuses-record', { reason: problem.message }, problem.errors)
  }
  const computed = { ...draft.record, caps: draft.caps.map((cap) => cap.body) }
  const found = differences(contentOf(stored), contentOf(computed))
  const { content_hash, engine } = draft.record
  return { content_hash, engine, count: found.length, changes: found.slice(0, MOST) }
}

export const reverifyInThread = (stored: Stored) => outcomeOf(() => reverify(stored))

export const reverifying: Work<Stored, Reverified> = { entry: new URL(import.meta.url), name: 'reverifyInThread' }
