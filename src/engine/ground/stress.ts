import { practice, statics } from '../sources/bibliography.ts'
import { formula } from '../trace/formula.ts'
import type { Sheet } from '../trace/sheet.ts'
import type { Term } from '../trace/term.ts'
import { SAME_DEPTH, type Stratum } from './depths.ts'
import type { GroundProfile } from './profile-types.ts'

export const buoyantUnitWeight = formula({
  symbol: 'gamma_e',
  name: 'effective unit weight below water',
  unit: 'kN/m3',
  text: 'gamma - gamma_w',
  where: { gamma: 'kN/m3', gamma_w: 'kN/m3' },
  source: statics('Archimedes'),
})
export const effectiveStress = formula({
  symbol: 'sigma_v',
  name: 'vertical effective stress',
  unit: 'kPa',
  text: 'sigma_0 + gamma_e * (z - z_0)',
  where: { sigma_0: 'kPa', gamma_e: 'kN/m3', z: 'm', z_0: 'm' },
  source: statics('overburden'),
})

type Segment = {
  readonly top: number
  readonly start: Term<'m'>
  readonly stress: Term<'kPa'>
  readonly weight: Term<'kN/m3'>
}

/** Vertical effective stress under a profile; one step per depth asked for, on segments of constant unit weight. */
export type Stresses = (depth: Term<'m'>, sheet: Sheet, id?: string) => Term<'kPa'>

export const waterUnitWeight = (sheet: Sheet): Term<'kN/m3'> =>
  sheet.assumed(
    { symbol: 'gamma_w', name: 'unit weight of water', unit: 'kN/m3' },
    9.81,
    'fresh water',
    practice('unit weight of water'),
    'ground/gamma_w',
  )

/** Prepares the segments of a profile under `ground/` of the root sheet. */
export function stresses(root: Sheet, profile: GroundProfile, all: readonly Stratum[], pointer: string): Stresses {
  const sheet = root.within('ground')
  const water = profile.waterTableDepth ?? Number.POSITIVE_INFINITY
  const segments: Segment[] = []
  let start: Term<'m'> = sheet.assumed(
    { symbol: 'z_0', name: 'ground surface', unit: 'm' },
    0,
    'depth is counted from the surface',
    statics('datum'),
    'z_0',
  )
  let stress: Term<'kPa'> = sheet.assumed(
    { symbol: 'sigma_0', name: 'stress at the surface', unit: 'kPa' },
    0,
    'no surcharge was given',
    practice('no surcharge'),
    'sigma_0',
  )
  for (const { index, layer, top, bottom } of all) {
    const at = `${pointer}/layers/${index}`
    const dry = sheet.input(
      { symbol: 'gamma', name: `unit weight of ${layer.name}`, unit: 'kN/m3' },
      layer.unitWeight,
      `${at}/unitWeight`,
      `${index}/gamma`,
    )
    const split = water > top + SAME_DEPTH && water < bottom - SAME_DEPTH
    const pieces = split ? [water, bottom] : [bottom]
    let pieceTop = top
    for (const pieceBottom of pieces) {
      const wet = pieceTop >= water - SAME_DEPTH
      const weight = wet
        ? sheet.step(buoyantUnitWeight, { gamma: dry, gamma_w: waterUnitWeight(root) }, `${index}/gamma_e`)
        : dry
      segments.push({ top: pieceTop, start, stress, weight })
      if (Number.isFinite(pieceBottom)) {
        const name = `${index}/${pieceBottom === bottom ? 'bottom' : 'water'}`
        const end =
          pieceBottom === bottom
            ? layerBottom(sheet, index, layer.thickness!, all[index]!, `${at}/thickness`)
            : sheet.input(
                { symbol: 'z_w', name: 'depth of the water table', unit: 'm' },
                water,
                `${pointer}/waterTableDepth`,
                'z_w',
              )
        stress = sheet.step(
          effectiveStress,
          { sigma_0: stress, gamma_e: weight, z: end, z_0: start },
          `${name}/sigma_v`,
        )
        start = end
      }
      pieceTop = pieceBottom
    }
  }
  return (depth, to, id = 'sigma_v') => {
    let segment = segments[0]!
    for (const s of segments) if (s.top <= depth.value + SAME_DEPTH) segment = s
    return to.step(
      effectiveStress,
      { sigma_0: segment.stress, gamma_e: segment.weight, z: depth, z_0: segment.start },
      id,
    )
  }
}

export const layerBoundary = formula({
  symbol: 'z_b',
  name: 'bottom of the layer',
  unit: 'm',
  text: 'z_t + h',
  where: { z_t: 'm', h: 'm' },
  source: statics('depths'),
})

/** Bottom of a layer as a step; the top of the first layer is the surface. */
function layerBottom(sheet: Sheet, index: number, thickness: number, stratum: Stratum, pointer: string): Term<'m'> {
  const top = layerTop(sheet, index, stratum)
  const h = sheet.input({ symbol: 'h', name: 'layer thickness', unit: 'm' }, thickness, pointer, `${index}/h`)
  return sheet.step(layerBoundary, { z_t: top, h }, `${index}/z_b`)
}

/** Top of a layer: the surface, or the bottom of the layer above (already a step of the sheet). */
export function layerTop(sheet: Sheet, index: number, stratum: Stratum): Term<'m'> {
  if (index === 0)
    return sheet.assumed(
      { symbol: 'z_0', name: 'ground surface', unit: 'm' },
      0,
      'depth is counted from the surface',
      statics('datum'),
      'z_0',
    )
  return sheet.input(
    { symbol: 'z_b', name: 'bottom of the layer above', unit: 'm' },
    stratum.top,
    '',
    `${index - 1}/z_b`,
  )
}
