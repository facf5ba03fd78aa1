/** A layer of an elastic profile: depths in m (bottom may be Infinity), Young's modulus in kPa at top and bottom, linear between. */
export type ElasticLayer = {
  readonly top: number
  readonly bottom: number
  readonly E: { readonly top: number; readonly bottom: number }
  readonly nu: number
}
/** Layers from the surface down. The last one goes on for ever unless it ends on rigid rock. */
export type ElasticProfile = { readonly layers: readonly ElasticLayer[]; readonly rigidBase: boolean }

/** A pile as the continuum sees it: depths and radii in m, EA in kN. */
export type ElasticPile = {
  readonly head: number
  readonly toe: number
  readonly radius: number
  readonly baseRadius: number
  readonly axialStiffness: number
}

/** Depths closer than this are one depth, m. */
export const SAME = 1e-6

export function modulusAt(layer: ElasticLayer, depth: number): number {
  const { top, bottom, E } = layer
  return Number.isFinite(bottom) ? E.top + ((E.bottom - E.top) * (depth - top)) / (bottom - top) : E.top
}

/** The layer at a depth; on a boundary the one above, or with `below` the one below. */
export function layerAt(profile: ElasticProfile, depth: number, side: 'above' | 'below' = 'above'): ElasticLayer {
  const { layers } = profile
  const reach = side === 'above' ? depth - SAME : depth + SAME
  return layers.find((l) => reach < l.bottom) ?? layers.at(-1)!
}
