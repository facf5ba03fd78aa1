import { type ElasticPile, type ElasticProfile, SAME } from './elastic-profile.ts'

/** Shaft elements of a pile: m edges + 1, none across a layer boundary. */
export type Mesh = { readonly edges: Float64Array }

/** Elements of a pile in one layer, for the length of the pile in diameters; converged to 0.3 % (see the tests of the mesh). */
const wanted = (slenderness: number): number => Math.min(28, Math.max(12, Math.round(10 + slenderness / 6)))
/** A stretch between boundaries has at least so many elements, fewer where the boundaries are many. */
const least = (stretches: number): number => (stretches <= 6 ? 4 : stretches <= 12 ? 3 : stretches <= 40 ? 2 : 1)

/** Cuts the shaft at every layer boundary and each stretch by cosines, finer towards its ends. `refine` multiplies the elements. */
export function meshOf(pile: ElasticPile, profile: ElasticProfile, refine = 1): Mesh {
  const { head, toe } = pile
  const inner = profile.layers.map((l) => l.bottom).filter((z) => z > head + SAME && z < toe - SAME)
  const cuts = [head, ...inner, toe]
  const length = toe - head
  const total = wanted(length / (2 * pile.radius))
  const edges = [head]
  for (let s = 0; s + 1 < cuts.length; s++) {
    const [top, bottom] = [cuts[s]!, cuts[s + 1]!]
    const n = refine * Math.max(least(cuts.length - 1), Math.ceil((total * (bottom - top)) / length))
    for (let i = 1; i < n; i++) edges.push(top + ((bottom - top) * (1 - Math.cos((Math.PI * i) / n))) / 2)
    edges.push(bottom)
  }
  return { edges: Float64Array.from(edges) }
}
