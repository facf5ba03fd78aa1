import { stratumAt } from '../ground/depths.ts'
import type { Varying } from '../ground/profile-types.ts'
import type { Site } from './site.ts'

/** Common practice: a clay this soft (kPa) settles under small loads and may drag on the shaft. */
const SOFT_CLAY = 25
/** Common practice: the ground within this many base widths below the toe still counts. */
const REACH_BELOW_TOE = 5

const low = (v: Varying | undefined): number | undefined => (typeof v === 'object' ? Math.min(v.top, v.bottom) : v)

/** Cautions that the ground itself calls for. */
export function groundNotices(s: Site): void {
  const { notice, at } = s.job
  const toe = stratumAt(s.layers, s.toeDepth.value) ?? s.layers.at(-1)!
  const strength = toe.layer.soil === 'cohesive' ? low(toe.layer.undrainedShearStrength) : undefined
  for (const { layer, index, top, bottom } of s.layers) {
    const cu = layer.soil === 'cohesive' ? low(layer.undrainedShearStrength) : undefined
    const pointer = `${at.ground}/layers/${index}`
    const below = index > toe.index && top - s.toeDepth.value < REACH_BELOW_TOE * s.section.baseWidth.value
    const weaker =
      layer.soil === 'cohesive' &&
      (toe.layer.soil !== 'cohesive' || (cu !== undefined && strength !== undefined && cu < strength))
    if (below && weaker) {
      notice({
        code: 'weaker-below-toe',
        level: 'warning',
        pointer,
        text: `${layer.name}, a weaker layer, begins ${(top - s.toeDepth.value).toFixed(1)} m below the toe. The base resistance does not allow for it.`,
      })
    }
    const along = top < s.toeDepth.value && bottom > s.headDepth.value && s.job.direction === 'compression'
    if (along && cu !== undefined && cu < SOFT_CLAY && index < toe.index) {
      notice({
        code: 'negative-friction-likely',
        level: 'warning',
        pointer,
        text: `${layer.name} is soft (c_u ${cu} kPa): negative shaft friction is likely where the ground settles, and was not asked for.`,
      })
    }
  }
}
