import type { ElasticPile } from './elastic-profile.ts'
import type { Mesh } from './mesh.ts'

/**
 * Adds the pile's own compression to a flexibility: how far the mean of element i moves below the head for a unit force on element j,
 * min(z_i, z_j)/EA from the head to the middles; for its own force to a third of it (uniform shear); the base from the toe.
 */
export function addCompression(out: Float64Array, { edges }: Mesh, pile: ElasticPile): void {
  const size = edges.length
  const middle = (i: number) => (i === size - 1 ? pile.toe : (edges[i]! + edges[i + 1]!) / 2) - pile.head
  for (let i = 0; i < size; i++) {
    for (let j = 0; j < size; j++) {
      const own = i === j && i < size - 1 ? (edges[i + 1]! - edges[i]!) / 6 : 0
      out[i * size + j]! += (Math.min(middle(i), middle(j)) - own) / pile.axialStiffness
    }
  }
}
