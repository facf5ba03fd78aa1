import type { CheckKind } from './check-words.ts'
import type { AssessmentRecord, CapResult, CheckResult } from './record.ts'

/** One cap as the plan shows it. */
export type PlanCap = {
  readonly mark: string
  readonly index: number
  readonly x: number
  readonly y: number
  readonly result: CapResult
  /** The check that is shown: the asked kind, or the one of the largest utilisation. */
  readonly shown: CheckResult | undefined
  /** Settlement in mm in the combination where it is largest. */
  readonly settlement: number | undefined
}

/** The caps of a record, in its order. */
export function planCaps({ schedule, reply }: AssessmentRecord, check: CheckKind | undefined): PlanCap[] {
  return reply.result.caps.map((result, index) => {
    const { x, y } = schedule.caps[index]!
    const shown = check
      ? result.checks.find((c) => c.check === check)
      : result.checks.reduce<CheckResult | undefined>(
          (a, b) => (!a || b.utilisation > a.utilisation ? b : a),
          undefined,
        )
    const settlements = result.settlement.map((s) => s.settlement)
    return {
      mark: result.mark,
      index,
      x,
      y,
      result,
      shown,
      settlement: settlements.length > 0 ? Math.max(...settlements) : undefined,
    }
  })
}

/** Largest utilisation first; caps without the asked check last. */
export const byUtilisation = (caps: readonly PlanCap[]): PlanCap[] =>
  [...caps].sort((a, b) => (b.shown?.utilisation ?? -1) - (a.shown?.utilisation ?? -1))

/** What of a cap's question differs between two revisions, in words. */
export function inputChanges(before: AssessmentRecord, after: AssessmentRecord): Map<string, readonly string[]> {
  const [old, now] = [questions(before), questions(after)]
  const out = new Map<string, readonly string[]>()
  for (const [mark, question] of now) {
    const earlier = old.get(mark)
    if (!earlier) continue
    const changed = Object.keys(question).filter((part) => question[part] !== earlier[part])
    if (changed.length > 0) out.set(mark, changed)
  }
  return out
}

function questions({ schedule }: AssessmentRecord): Map<string, Record<string, string>> {
  const rows = Map.groupBy(schedule.loads.rows, (row) => row.cap)
  const basis = JSON.stringify([schedule.designBasis, schedule.methods, schedule.limits])
  return new Map(
    schedule.caps.map((cap) => [
      cap.mark,
      {
        place: JSON.stringify([cap.x, cap.y]),
        ground: JSON.stringify(schedule.ground[cap.ground]),
        'pile type': JSON.stringify(schedule.pileTypes[cap.pileType]),
        layout: JSON.stringify(cap.layout),
        weight: JSON.stringify(cap.capWeight ?? 0),
        loads: JSON.stringify([rows.get(cap.mark), schedule.loads.signs, schedule.loads.loadsAre]),
        'basis, methods or limits': basis,
      },
    ]),
  )
}
