import type { Trace } from '../engine/trace/step.ts'
import type { AssessmentRecord, Issue } from '../print/record.ts'
import { unpack } from '../store/blobs.ts'

/** A record for the printer as it lies in the store, so that a thread unpacks it: with those caps and that trace which the page needs. */
export type PackedRecord = {
  readonly issue: Issue
  readonly request: Uint8Array
  readonly outcome: Uint8Array
  readonly notices: string
  readonly caps: readonly Uint8Array[]
  readonly trace?: Trace | undefined
}

export const unpackRecord = ({ issue, trace, ...packed }: PackedRecord): AssessmentRecord => ({
  ...issue,
  schedule: JSON.parse(unpack(packed.request)),
  reply: {
    result: { caps: packed.caps.map((cap) => JSON.parse(unpack(cap))), ...JSON.parse(unpack(packed.outcome)) },
    notices: JSON.parse(packed.notices),
    ...(trace && { trace }),
  },
})
