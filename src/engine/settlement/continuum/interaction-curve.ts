import { naturalSpline } from '../../numerics/spline.ts'
import { type SolvedPile, unitForces } from './single-pile.ts'

/** Interaction factor of two equal piles by their spacing: extra settlement over own settlement, at equal loads. */
export type InteractionCurve = {
  readonly spacings: Float64Array
  readonly alpha: Float64Array
  readonly at: (spacing: number) => number
}

/** Spacings in diameters and lengths: from touching piles to where the far field has its final shape. */
const NODES = 24

/** Two equal piles at a spacing, equally loaded: alpha = f_2/f_1 - 1. */
export function interactionAt(pile: SolvedPile, spacing: number): number {
  const { soil } = pile
  const pair = soil.between(spacing)
  for (let i = 0; i < pair.length; i++) pair[i]! += pile.flexibility[i]!
  let stiffness = 0
  for (const q of unitForces(pair, soil.size)) stiffness += q
  return pile.stiffness / stiffness - 1
}

/** The curve on a log-spaced grid; between its nodes a cubic spline of spacing times factor over ln(spacing). Beyond the last it falls as 1/s; closer than a diameter it stays. */
export function interactionCurve(pile: SolvedPile, nodes = NODES): InteractionCurve {
  const { radius, toe } = pile.soil.pile
  const least = 2 * radius
  const most = 30 * Math.max(toe, 4 * radius)
  const step = Math.log(most / least) / (nodes - 1)
  const spacings = Float64Array.from({ length: nodes }, (_, i) => least * Math.exp(i * step))
  const alpha = spacings.map((s) => interactionAt(pile, s))
  const spline = naturalSpline(spacings.map((s, i) => s * alpha[i]!))
  const last = spacings[nodes - 1]! * alpha[nodes - 1]!
  return {
    spacings,
    alpha,
    at: (s) => {
      const place = Math.log(s / least) / step
      if (place >= nodes - 1) return last / s
      return place <= 0 ? alpha[0]! : spline(place) / s
    },
  }
}
