import type { PileStiffness } from './randolph-wroth-1978.ts'

/**
 * Interaction factor of two equal piles, extra settlement over own settlement at equal loads: the shaft's logarithm
 * (0 beyond r_m) and the base's 2 r_b / (pi s), weighted by the shares of the load that shaft and base carry in the single pile.
 */
export function interactionOf(pile: PileStiffness): (spacing: number) => number {
  const share = pile.baseLoadShare.value
  const r_m = pile.influenceRadius.value
  const zeta = pile.zeta.value
  const r_b = pile.baseRadius.value
  return (s) => (1 - share) * Math.max(0, Math.log(r_m / s) / zeta) + share * Math.min(1, (2 * r_b) / (Math.PI * s))
}
