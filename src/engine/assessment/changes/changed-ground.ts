import type { GroundProfile, Layer } from '../../ground/profile-types.ts'
import { type Leaf, leaf, leaves } from './leaves.ts'

type Place = { readonly layer: Layer; readonly index: number }
type Pair = { readonly before?: Place; readonly after?: Place }

/**
 * Layers by their order: those of the same names from the top down and from the bottom up belong together, the ones between
 * by their turn. So a layer that was put in, or has a new name, does not shift all below it.
 */
function layerPairs(before: readonly Layer[], after: readonly Layer[]): Pair[] {
  const shorter = Math.min(before.length, after.length)
  const named = (i: number, j: number) => before[i]!.name === after[j]!.name
  let top = 0
  while (top < shorter && named(top, top)) top++
  let bottom = 0
  while (bottom < shorter - top && named(before.length - 1 - bottom, after.length - 1 - bottom)) bottom++
  const place = (layers: readonly Layer[], index: number) => ({ layer: layers[index]!, index })
  const [middleBefore, middleAfter] = [before.length - bottom, after.length - bottom]
  const pairs: Pair[] = []
  for (let i = 0; i < Math.max(middleBefore, middleAfter); i++) {
    pairs.push({
      ...(i < middleBefore && { before: place(before, i) }),
      ...(i < middleAfter && { after: place(after, i) }),
    })
  }
  for (let i = bottom; i > 0; i--)
    pairs.push({ before: place(before, before.length - i), after: place(after, after.length - i) })
  return pairs
}

/** Where two profiles of one name differ; the name of the layer is that of after, where it is not gone. */
export function* changedGround(before: GroundProfile, after: GroundProfile, pointer: string) {
  const { layers: layersBefore, ...restBefore } = before
  const { layers: layersAfter, ...restAfter } = after
  for (const found of leaves(restBefore, restAfter, { before: pointer, after: pointer }))
    yield found as Leaf & { layer?: string }
  for (const pair of layerPairs(layersBefore, layersAfter)) {
    const at = (place: Place | undefined) => `${pointer}/layers/${place?.index}`
    const both = { before: at(pair.before), after: at(pair.after) }
    const layer = (pair.after ?? pair.before)!.layer.name
    if (pair.before && pair.after)
      for (const found of leaves(pair.before.layer, pair.after.layer, both)) yield { layer, ...found }
    else yield { layer, ...leaf(both, '', pair.before?.layer, pair.after?.layer) }
  }
}
