import { refuse } from '../faults.ts'
import type { GroundProfile, Layer } from './profile-types.ts'

/** One layer with its depths in m; `bottom` is Infinity where the last layer goes on. */
export type Stratum = { readonly index: number; readonly layer: Layer; readonly top: number; readonly bottom: number }

/** Depths of the layers, top down. A thickness may be left out on the last layer only. */
export function strata(profile: GroundProfile, pointer: string): readonly Stratum[] {
  if (profile.layers.length === 0) refuse('no-layer', `${pointer}/layers`)
  let top = 0
  return profile.layers.map((layer, index) => {
    if (layer.thickness === undefined && index < profile.layers.length - 1) {
      refuse('missing-thickness', `${pointer}/layers/${index}`, { layer: layer.name })
    }
    const bottom = layer.thickness === undefined ? Number.POSITIVE_INFINITY : top + layer.thickness
    const stratum = { index, layer, top, bottom }
    top = bottom
    return stratum
  })
}

/** Depths closer than this are one depth: sums of thicknesses carry rounding. */
export const SAME_DEPTH = 1e-9

/** The layer at a depth; on a boundary the one below. Undefined below the known ground. */
export function stratumAt(all: readonly Stratum[], depth: number): Stratum | undefined {
  return all.find((s) => depth < s.bottom - SAME_DEPTH)
}
