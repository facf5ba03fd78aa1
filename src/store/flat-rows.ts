import { canonicalText } from '../canonical.ts'
import type { Schedule } from '../engine/assessment/schedule.ts'
import type { assess } from '../engine/index.ts'
import type { Draft } from './draft.ts'
import type { CapRow } from './tables.ts'

type Result = ReturnType<typeof assess>['result']
type Cap = Result['caps'][number]

const flag = (yes: boolean) => (yes ? 1 : 0)
const largest = (values: readonly number[]) => (values.length === 0 ? null : Math.max(...values))

function capRow(schedule: Schedule, ordinal: number, cap: Cap): Omit<CapRow, 'record' | 'body'> {
  const asked = schedule.caps[ordinal]!
  const governing = cap.checks.reduce<Cap['checks'][number] | undefined>(
    (a, b) => (!a || b.utilisation > a.utilisation ? b : a),
    undefined,
  )
  return {
    mark: cap.mark,
    ordinal,
    ground: asked.ground,
    pile_type: asked.pileType,
    pile_count: cap.pileCount,
    x: asked.x,
    y: asked.y,
    governing_check: governing?.check ?? null,
    governing_combination: governing?.combination ?? null,
    utilisation: governing?.utilisation ?? null,
    exceeded: flag(cap.checks.some((c) => !c.satisfied)),
    settlement: largest(cap.settlement.map((s) => s.settlement)),
    tilt: largest(cap.settlement.map((s) => s.tilt)),
    stiffness_vertical: cap.stiffness.vertical,
    stiffness_rocking_x: cap.stiffness.rockingAlongX,
    stiffness_rocking_y: cap.stiffness.rockingAlongY,
  }
}

/** The rows that queries read, all of them derived from request and result: an integrity check derives them again. */
export function flatRows(schedule: Schedule, result: Pick<Result, 'caps' | 'neighbours' | 'summary'>) {
  const { caps, satisfied, exceeded, worst } = result.summary
  return {
    summary: {
      caps,
      satisfied,
      exceeded,
      worst_cap: worst?.cap ?? null,
      worst_check: worst?.check ?? null,
      worst_combination: worst?.combination ?? null,
      worst_utilisation: worst?.utilisation ?? null,
      summary: canonicalText(result.summary),
    },
    caps: result.caps.map((cap, ordinal) => capRow(schedule, ordinal, cap)),
    checks: result.caps.flatMap((cap, ordinal) =>
      cap.checks.map((c) => ({
        cap: ordinal,
        mark: cap.mark,
        check_kind: c.check,
        limit_state: schedule.loads.combinations[c.combination]!.limitState,
        combination: c.combination,
        demand: c.demand,
        resistance: c.resistance,
        utilisation: c.utilisation,
        exceeded: flag(!c.satisfied),
        pile: c.pile ?? null,
      })),
    ) satisfies Draft['checks'],
    neighbours: result.neighbours.map((n, ordinal) => ({
      ordinal,
      a: n.a,
      b: n.b,
      distance: n.distance,
      combination: n.combination,
      differential_settlement: n.differentialSettlement,
      angular_distortion: n.angularDistortion,
      utilisation: n.utilisation ?? null,
      exceeded: n.satisfied === undefined ? null : flag(!n.satisfied),
    })) satisfies Draft['neighbours'],
  }
}
