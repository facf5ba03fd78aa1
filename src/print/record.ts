import type { Schedule } from '../engine/assessment/schedule.ts'
import type {
  assess,
  calculateBlock,
  calculateGroup,
  calculateSettlement,
  calculateSinglePile,
} from '../engine/index.ts'
import type { Notice } from '../engine/notice.ts'
import type { GroupRequest, SettlementRequest, SinglePileRequest } from '../engine/requests.ts'
import type { Trace } from '../engine/trace/step.ts'

/** What the pages are made from: plain objects as they are stored or answered. Nothing here is made up by `print/`. */

export type Signature = {
  readonly role: 'originator' | 'checker' | 'approver'
  readonly actor: string
  readonly signedAt: string
}

/** What the title block says. All but engine and hash is left out of an answer that is not stored. */
export type Issue = {
  readonly project?: { readonly slug: string; readonly title: string }
  readonly revision?: number
  readonly id?: string
  readonly actor?: string
  readonly createdAt?: string
  readonly contentHash: string
  readonly recordHash?: string
  readonly engine: string
  readonly signatures: readonly Signature[]
}

export type AssessmentResult = ReturnType<typeof assess>['result']
export type AssessmentReply = {
  readonly result: AssessmentResult
  readonly notices: readonly Notice[]
  readonly trace?: Trace
}
export type CapResult = AssessmentResult['caps'][number]
export type CheckResult = CapResult['checks'][number]
export type NeighbourResult = AssessmentResult['neighbours'][number]

/** An assessment with the schedule that it answers, in the engine's units. */
export type AssessmentRecord = Issue & { readonly schedule: Schedule; readonly reply: AssessmentReply }

/** A calculator's question and answer. */
export type Calculation = { readonly meta: { readonly engine: string; readonly requestHash: string } } & (
  | {
      readonly kind: 'single-pile'
      readonly request: SinglePileRequest
      readonly answer: ReturnType<typeof calculateSinglePile>
    }
  | { readonly kind: 'block'; readonly request: GroupRequest; readonly answer: ReturnType<typeof calculateBlock> }
  | { readonly kind: 'group'; readonly request: GroupRequest; readonly answer: ReturnType<typeof calculateGroup> }
  | {
      readonly kind: 'settlement'
      readonly request: SettlementRequest
      readonly answer: ReturnType<typeof calculateSettlement>
    }
)
