import { refuse } from '../../faults.ts'
import { factor, solveFactored } from '../../numerics/cholesky.ts'
import type { ElasticPile, ElasticProfile } from './elastic-profile.ts'
import { meshOf } from './mesh.ts'
import { addCompression } from './pile-compression.ts'
import { SoilFlexibility } from './soil-flexibility.ts'

/** A pile under a unit settlement of its head. */
export type SolvedPile = {
  readonly soil: SoilFlexibility
  /** Ground and pile, element on element, m/kN. */
  readonly flexibility: Float64Array
  /** Load per settlement of the head, kN/m. */
  readonly stiffness: number
  /** Forces of the shaft elements and, last, of the base, for a settlement of 1 m; kN. */
  readonly forces: Float64Array
  /** Largest departure of an element from the settlement it must share, of a unit. */
  readonly compatibility: number
}

/** Solves (ground + pile) q = 1: every element follows the head less the compression above it. */
export function solvePile(pile: ElasticPile, profile: ElasticProfile, refine = 1): SolvedPile {
  const soil = new SoilFlexibility(pile, profile, meshOf(pile, profile, refine))
  const { size } = soil
  const flexibility = soil.own()
  addCompression(flexibility, soil.mesh, pile)
  const forces = unitForces(flexibility, size)
  let stiffness = 0
  for (const q of forces) stiffness += q
  let compatibility = 0
  for (let i = 0; i < size; i++) {
    let w = 0
    for (let j = 0; j < size; j++) w += flexibility[i * size + j]! * forces[j]!
    compatibility = Math.max(compatibility, Math.abs(w - 1))
  }
  return { soil, flexibility, stiffness, forces, compatibility }
}

/** Forces that move every element by 1. */
export function unitForces(flexibility: Float64Array, size: number): Float64Array {
  const factored = Float64Array.from(flexibility)
  if (!factor(factored, size)) refuse('not-finite', '', { symbol: 'ground flexibility' })
  const forces = new Float64Array(size).fill(1)
  solveFactored(factored, size, forces)
  return forces
}
