import { factor, solveFactored } from '../../numerics/cholesky.ts'
import type { SolvedPile } from './single-pile.ts'

/** Ultimate resistance of each element, base last, kN; and how far a hyperbola has come to its asymptote when it is reached. */
export type Ultimate = { readonly forces: Float64Array; readonly failureRatio: Float64Array }
/** kN and m; `residual` of the solve that found the point, relative. */
export type CurvePoint = { readonly load: number; readonly settlement: number; readonly residual: number }
export type Pushed = { readonly load: number; readonly forces: Float64Array; readonly residual: number }

/** Newton steps at one settlement of the head. */
const STEPS = 60
/** Convergence of an element's movement, of the head's. */
const CLOSE = 1e-11

/**
 * A pile whose own springs soften: the movement that an element's own force causes in the ground grows by 1/(1 - R_f Q/Q_u) (Fleming 1992;
 * Randolph's R_f), what one element does to the others stays elastic. At Q_u an element slips and holds its force.
 * Pushes the head down by w (m, from `start`, the forces of a smaller push) and gives the load.
 */
export function pushHead(
  pile: SolvedPile,
  ground: Float64Array,
  ultimate: Ultimate,
  w: number,
  start: Float64Array,
): Pushed {
  const n = ground.length
  const { flexibility } = pile
  const { forces: most, failureRatio: ratio } = ultimate
  const q = Float64Array.from(start)
  const movement = new Float64Array(n)
  let residual = Number.POSITIVE_INFINITY
  for (let step = 0; step < STEPS && residual > CLOSE; step++) {
    const free: number[] = []
    residual = 0
    for (let i = 0; i < n; i++) {
      let sum = 0
      for (let j = 0; j < n; j++) sum += flexibility[i * n + j]! * q[j]!
      const used = Math.min(q[i]! / most[i]!, 1)
      movement[i] = sum + ground[i]! * q[i]! * (1 / (1 - ratio[i]! * used) - 1)
      // An element at its resistance moves less than the head would have it: it slips.
      if (q[i]! >= most[i]! && movement[i]! <= w) continue
      free.push(i)
      residual = Math.max(residual, Math.abs(movement[i]! - w) / w)
    }
    if (residual <= CLOSE || free.length === 0) break
    const m = free.length
    const tangent = new Float64Array(m * m)
    const gap = new Float64Array(m)
    for (const [a, i] of free.entries()) {
      for (const [b, j] of free.entries()) tangent[a * m + b] = flexibility[i * n + j]!
      const left = 1 - ratio[i]! * Math.min(q[i]! / most[i]!, 1)
      tangent[a * m + a]! += ground[i]! * (1 / (left * left) - 1)
      gap[a] = w - movement[i]!
    }
    if (!factor(tangent, m)) break
    solveFactored(tangent, m, gap)
    for (const [a, i] of free.entries()) q[i] = Math.min(most[i]!, q[i]! + gap[a]!)
  }
  let load = 0
  for (const force of q) load += force
  return { load, forces: q, residual }
}

/** A point whose elements depart by more than this from the head's movement is not found. */
export const FOUND = 1e-8

/** Share of the ultimate load up to which a curve is drawn. */
const LAST = 0.98
const POINTS = 60

/** The load-settlement curve (kN, m) from rest to 98 % of the ultimate resistance, or to a settlement of twice the diameter. */
export function loadCurve(pile: SolvedPile, ground: Float64Array, ultimate: Ultimate): CurvePoint[] {
  const total = ultimate.forces.reduce((s, q) => s + q, 0)
  const out: CurvePoint[] = [{ load: 0, settlement: 0, residual: 0 }]
  let w = (0.02 * total) / pile.stiffness
  let forces: Float64Array = new Float64Array(ground.length)
  const end = 4 * pile.soil.pile.radius
  const growth = (end / w) ** (1 / POINTS)
  for (let i = 0; i <= POINTS; i++, w *= growth) {
    const pushed = pushHead(pile, ground, ultimate, w, forces)
    forces = pushed.forces
    if (pushed.residual > FOUND) break
    out.push({ load: pushed.load, settlement: w, residual: pushed.residual })
    if (pushed.load >= LAST * total) break
  }
  return out
}

/** Settlement of the head (m) under a load below the last of the curve: between its points by regula falsi on the pushed pile. */
export function settlementUnder(
  pile: SolvedPile,
  ground: Float64Array,
  ultimate: Ultimate,
  curve: readonly CurvePoint[],
  load: number,
): { settlement: number; forces: Float64Array; residual: number } | undefined {
  const above = curve.findIndex((p) => p.load >= load)
  if (above <= 0)
    return above === 0 ? { settlement: 0, forces: new Float64Array(ground.length), residual: 0 } : undefined
  let [low, high] = [curve[above - 1]!, curve[above]!]
  let pushed: Pushed = { load: low.load, forces: new Float64Array(ground.length), residual: 0 }
  let w = low.settlement
  for (let step = 0; step < 60; step++) {
    // Every third step halves: on a bent curve one end of a regula falsi would stand still.
    const share = step % 3 === 2 ? 0.5 : (load - low.load) / (high.load - low.load || 1)
    w = low.settlement + share * (high.settlement - low.settlement)
    pushed = pushHead(pile, ground, ultimate, w, pushed.forces)
    if (Math.abs(pushed.load - load) <= 1e-10 * load) break
    if (pushed.load < load) low = { ...pushed, settlement: w }
    else high = { ...pushed, settlement: w }
  }
  return { settlement: w, forces: pushed.forces, residual: Math.max(pushed.residual, Math.abs(pushed.load / load - 1)) }
}
