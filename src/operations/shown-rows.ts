import type { CheckRow, NeighbourRow } from '../store/tables.ts'

/** A check as the result has it, with the limit state of its combination. */
export const showCheck = (c: CheckRow) => ({
  check: c.check_kind,
  combination: c.combination,
  limitState: c.limit_state,
  demand: c.demand,
  resistance: c.resistance,
  utilisation: c.utilisation,
  satisfied: c.exceeded === 0,
  pile: c.pile,
})

export const showNeighbours = (n: NeighbourRow) => ({
  a: n.a,
  b: n.b,
  distance: n.distance,
  combination: n.combination,
  differentialSettlement: n.differential_settlement,
  angularDistortion: n.angular_distortion,
  utilisation: n.utilisation,
  satisfied: n.exceeded === null ? null : n.exceeded === 0,
})
