import { positions } from '../engine/index.ts'
import type { PileType } from '../engine/piles/pile-type.ts'
import type { AssessmentRecord, CheckResult } from './record.ts'

/** One pile as the drawing office needs it: places in m in plan, depths in m below the surface, loads in kN. */
export type PileRow = {
  readonly cap: string
  readonly pile: number
  readonly type: string
  readonly x: number
  readonly y: number
  readonly cutOff: number
  readonly toe: number
  /** The largest pile load of its cap, of the check that it governs, and what resists it. */
  readonly check: CheckResult | undefined
}

/**
 * Every pile of an assessment. A place is the cap's plus the pile's own in its layout, to the millimetre; the load is the largest
 * of the cap in compression, or in uplift where that is utilised more, since all piles of a cap are built alike.
 */
export function pileRows({ schedule, reply }: AssessmentRecord): PileRow[] {
  return schedule.caps.flatMap((cap, index) => {
    const result = reply.result.caps[index]!
    const pile: PileType = schedule.pileTypes[cap.pileType]!
    const own = result.checks.filter((c) => c.check === 'pile-compression' || c.check === 'pile-uplift')
    const check = own.reduce<CheckResult | undefined>(
      (a, b) => (!a || b.utilisation > a.utilisation ? b : a),
      undefined,
    )
    return positions(cap.layout).map((p, i) => ({
      cap: cap.mark,
      pile: i + 1,
      type: cap.pileType,
      x: millimetres(cap.x + p.x),
      y: millimetres(cap.y + p.y),
      cutOff: pile.headDepth ?? 0,
      toe: result.single.toeDepth,
      check,
    }))
  })
}

const millimetres = (m: number): number => Math.round(m * 1000) / 1000 + 0
