import { refuse } from '../faults.ts'
import type { CapTerms } from '../piles/pile-plan.ts'
import type { Sheet } from '../trace/sheet.ts'
import { pushGroup } from './continuum/hyperbolic-group.ts'
import type { CurvePoint } from './continuum/hyperbolic-pile.ts'
import type { CapLoad, ElasticGroup, Plane } from './group.ts'
import type { PileResponse } from './pile-response.ts'
import { planeModes } from './plane-modes.ts'
import type { PreparedGroup } from './prepared-group.ts'
import { curveTerms, type Softening } from './softening.ts'

/** Newton's method factors n x n at every step: so many piles are solved at once. */
export const SOFT_PILES = 225

/** A solution is one when a step of Newton changes no load by more than this share of the largest. */
export const SOFT_TOLERANCE = 1e-6

export const SOFT_SOLVE = 'rigid plane on softening piles, elastic between them; Newton'

export type SoftPlane = { readonly plane: Plane; readonly loads: Float64Array; readonly residual: number }

/** A rigid cap on softening piles. Loads in kN and kN.m at the cap's origin. */
export function softPlane(
  group: ElasticGroup,
  pile: PileResponse,
  soft: Softening,
  load: CapLoad,
  pointer: string,
): SoftPlane {
  return (
    tryPlane(group, pile, soft, load, pointer) ??
    refuse('load-beyond-resistance', pointer, {
      load: Math.abs(load.V),
      resistance: group.points.length * soft.curve.at(-1)!.load,
      unit: 'kN',
    })
  )
}

/** Undefined where the piles cannot carry the load. */
function tryPlane(
  group: ElasticGroup,
  pile: PileResponse,
  soft: Softening,
  load: CapLoad,
  pointer: string,
): SoftPlane | undefined {
  group.assertTaken(load, pointer)
  const { points, centroid } = group
  if (points.length > SOFT_PILES)
    refuse('method-not-applicable', '/nonlinearity', {
      method: 'elastic-continuum',
      reason: `nonlinearity "hyperbolic" takes up to ${SOFT_PILES} piles under a rigid cap, ${points.length} are laid out`,
    })
  if (Math.abs(load.V) >= points.length * soft.curve.at(-1)!.load) return undefined
  const x = Float64Array.from(points, (p) => p.x - centroid.x)
  const y = Float64Array.from(points, (p) => p.y - centroid.y)
  const modes = planeModes(x, y, false)
  const about = { V: load.V, My: load.My - load.V * centroid.x, Mx: load.Mx - load.V * centroid.y }
  const k = pile.stiffness.value
  const { loads, movement, residual } = pushGroup(
    points,
    soft.pile,
    (distance) => pile.interaction(distance) / k,
    modes.map((mode) => Float64Array.from(x, (xi, i) => mode.v + mode.x * xi + mode.y * y[i]!)),
    modes.map((mode) => mode.v * about.V + mode.x * about.My + mode.y * about.Mx),
  )
  if (!(residual < SOFT_TOLERANCE)) return undefined
  const part = (name: 'v' | 'x' | 'y') => modes.reduce((sum, mode, a) => sum + mode[name] * movement[a]!, 0)
  return { plane: { centre: part('v'), alongX: part('x'), alongY: part('y') }, loads, residual }
}

/** Settlements of given pile loads: each pile's own curve, the others' elastic share. m. */
export function softSettlements(
  { points }: ElasticGroup,
  pile: PileResponse,
  soft: Softening,
  loads: Float64Array,
): Float64Array {
  const k = pile.stiffness.value
  return Float64Array.from(points, (p, i) =>
    points.reduce(
      (sum, q, j) => (i === j ? sum : sum + (pile.interaction(Math.hypot(p.x - q.x, p.y - q.y)) * loads[j]!) / k),
      soft.pile(loads[i]!).settlement,
    ),
  )
}

/** Shares of the piles' summed resistance at which the curve of a group is found. */
const SHARES = [0.1, 0.2, 0.3, 0.4, 0.5, 0.6, 0.7, 0.8, 0.85, 0.9, 0.94]

/** Settlement at the centroid as the load grows in proportion; ends before a point that is not found. */
function groupCurve(group: ElasticGroup, pile: PileResponse, soft: Softening, load: CapLoad): CurvePoint[] {
  const out: CurvePoint[] = [{ load: 0, settlement: 0, residual: 0 }]
  if (load.V <= 0) return out
  for (const share of SHARES) {
    const V = share * group.points.length * soft.ultimate
    const grown = { V, Mx: (load.Mx * V) / load.V, My: (load.My * V) / load.V }
    const found = tryPlane(group, pile, soft, grown, '')
    if (!found) break
    out.push({ load: V, settlement: found.plane.centre, residual: found.residual })
  }
  return out
}

/** Load-settlement curve of the group under a rigid cap, as terms. */
export function softCurve(
  sheet: Sheet,
  { pile, load }: { readonly pile: PileResponse; readonly load: CapTerms },
  { elastic, basis }: PreparedGroup,
  soft: Softening,
) {
  const points = groupCurve(elastic, pile, soft, { V: load.V.value, Mx: load.Mx.value, My: load.My.value })
  return curveTerms(sheet.within('curve'), points, {
    chosen: 'load',
    method: SOFT_SOLVE,
    tolerance: SOFT_TOLERANCE,
    operands: [...soft.operands, ...basis],
  })
}
