import { eachOf } from '../faults.ts'
import { SAME_DEPTH, type Stratum } from '../ground/depths.ts'
import { practice, statics } from '../sources/bibliography.ts'
import { formula } from '../trace/formula.ts'
import type { Sheet } from '../trace/sheet.ts'
import type { Term } from '../trace/term.ts'
import { selectShaft } from './selection.ts'
import { contextAt, type Site } from './site.ts'

export const partCount = formula({
  symbol: 'n',
  name: 'number of sublayers',
  unit: '1',
  text: 'ceil((z_b - z_t) / h_max - 1e-9)',
  where: { z_b: 'm', z_t: 'm', h_max: 'm' },
  source: practice('as few equal sublayers as keep to the longest'),
})
export const partLength = formula({
  symbol: 'h',
  name: 'length of a sublayer',
  unit: 'm',
  text: '(z_b - z_t) / n',
  where: { z_b: 'm', z_t: 'm', n: '1' },
  source: statics('equal parts'),
})
export const firstMiddle = formula({
  symbol: 'z',
  name: 'middle of the sublayer',
  unit: 'm',
  text: 'z_t + h / 2',
  where: { z_t: 'm', h: 'm' },
  source: statics('depths'),
})
export const nextMiddle = formula({
  symbol: 'z',
  name: 'middle of the sublayer',
  unit: 'm',
  text: 'z_a + h',
  where: { z_a: 'm', h: 'm' },
  source: statics('depths'),
})
export const stretchResistance = formula({
  symbol: 'R',
  name: 'shaft resistance of the sublayer',
  unit: 'kN',
  text: 'U * h * f',
  where: { U: 'm', h: 'm', f: 'kPa' },
  source: statics('stress times area'),
})
export const meanUnitResistance = formula({
  symbol: 'f_m',
  name: 'mean unit shaft resistance',
  unit: 'kPa',
  text: 'R / (U * (z_b - z_t))',
  where: { R: 'kN', U: 'm', z_b: 'm', z_t: 'm' },
  source: statics('mean'),
})
export const upliftShare = formula({
  symbol: 'f_t',
  name: 'unit shaft resistance in uplift',
  unit: 'kPa',
  text: 'r * f',
  where: { r: '1', f: 'kPa' },
  source: practice('share of the shaft resistance that acts in uplift'),
})

export type LayerTerms = {
  readonly name: string
  readonly top: Term<'m'>
  readonly bottom: Term<'m'>
  readonly unitShaftResistance: Term<'kPa'>
  readonly shaftResistance: Term<'kN'>
}

export type Unit = (here: Sheet, stratum: Stratum, middle: Term<'m'>) => Term<'kPa'>
type Idle = { readonly depth: number; readonly method: string }

/** Sums unit resistance over the sublayers from head to toe. `unit` gives it at the middle; `idleIn` the zone of a layer that carries nothing. */
export function sumOverLayers(
  s: Site,
  sheet: Sheet,
  perimeter: Term<'m'>,
  unit: Unit,
  idleIn: (stratum: Stratum) => Idle | undefined,
): { layers: LayerTerms[]; total: Term<'kN'> } {
  const endsOf = ({ top, bottom }: Stratum) =>
    [Math.max(top, s.headDepth.value), Math.min(bottom, s.toeDepth.value)] as const
  const reached = s.layers.filter((stratum) => {
    const [from, to] = endsOf(stratum)
    return to - from > SAME_DEPTH
  })
  const layers = eachOf(reached, (stratum): LayerTerms => {
    const [from, to] = endsOf(stratum)
    const here = sheet.within(`${stratum.index}`)
    const ends = { top: boundary(s, from, stratum, 'top'), bottom: boundary(s, to, stratum, 'bottom') }
    const parts: Term<'kN'>[] = []
    for (const [top, bottom] of stretches(s, here, ends, idleIn(stratum))) {
      const n = here.step(partCount, { z_b: bottom, z_t: top, h_max: longestSublayer(s) }, `from-${parts.length + 1}/n`)
      const h = here.step(partLength, { z_b: bottom, z_t: top, n }, `from-${parts.length + 1}/h`)
      let z: Term<'m'> | undefined
      for (let i = 0; i < n.value; i++) {
        const at = here.within(`${parts.length + 1}`)
        z = z ? at.step(nextMiddle, { z_a: z, h }) : at.step(firstMiddle, { z_t: top, h })
        parts.push(at.step(stretchResistance, { U: perimeter, h, f: unit(at, stratum, z) }))
      }
    }
    const shaftResistance = here.sum(
      { symbol: 'R_s', name: `shaft resistance in ${stratum.layer.name}`, unit: 'kN' },
      parts,
    )
    return {
      name: stratum.layer.name,
      ...ends,
      shaftResistance,
      unitShaftResistance: here.step(meanUnitResistance, {
        R: shaftResistance,
        U: perimeter,
        z_b: ends.bottom,
        z_t: ends.top,
      }),
    }
  })
  return {
    layers,
    total: sheet.sum(
      { symbol: 'R_s', name: 'shaft resistance', unit: 'kN' },
      layers.map((l) => l.shaftResistance),
    ),
  }
}

const longestSublayer = (s: Site): Term<'m'> => {
  const label = { symbol: 'h_max', name: 'longest sublayer', unit: 'm' } as const
  const sheet = s.sheet.within('methods')
  const given = s.job.methods.sublayer
  return given === undefined
    ? sheet.assumed(label, 1, 'no sublayer was given: 1 m', practice('sublayers of the shaft sum'), 'sublayer')
    : sheet.input(label, given, `${s.job.at.methods}/sublayer`, 'sublayer')
}

/** The stretches of a layer that carry: cut at the water table and below the idle zone. */
function stretches(
  s: Site,
  here: Sheet,
  ends: { top: Term<'m'>; bottom: Term<'m'> },
  idle: Idle | undefined,
): [Term<'m'>, Term<'m'>][] {
  let { top } = ends
  const { bottom } = ends
  if (idle && idle.depth > top.value + SAME_DEPTH) {
    if (idle.depth >= bottom.value - SAME_DEPTH) return []
    top = here.assumed(
      { symbol: 'z_i', name: 'end of the zone that carries nothing', unit: 'm' },
      idle.depth,
      `${idle.method} counts nothing above this depth`,
      practice('idle zone of the method'),
    )
  }
  const water = s.job.ground.waterTableDepth
  if (water === undefined || water <= top.value + SAME_DEPTH || water >= bottom.value - SAME_DEPTH)
    return [[top, bottom]]
  const table = s.sheet
    .within('ground')
    .input(
      { symbol: 'z_w', name: 'depth of the water table', unit: 'm' },
      water,
      `${s.job.at.ground}/waterTableDepth`,
      'z_w',
    )
  return [
    [top, table],
    [table, bottom],
  ]
}

function boundary(s: Site, depth: number, stratum: Stratum, side: 'top' | 'bottom'): Term<'m'> {
  if (depth === s.headDepth.value) return s.headDepth
  if (depth === s.toeDepth.value) return s.toeDepth
  const ground = s.sheet.within('ground')
  const index = side === 'top' ? stratum.index - 1 : stratum.index
  return ground.input(
    { symbol: 'z_b', name: 'layer boundary', unit: 'm' },
    depth,
    s.job.at.ground,
    index < 0 ? 'z_0' : `${index}/z_b`,
  )
}

/** Shaft of one pile by the methods of the request. */
export function pileShaft(s: Site, sheet: Sheet): { layers: LayerTerms[]; total: Term<'kN'> } {
  const chosen = eachOf(s.layers, (stratum) => {
    const reached = stratum.top < s.toeDepth.value - 1e-9 && stratum.bottom > s.headDepth.value + 1e-9
    return reached ? selectShaft(s.job, stratum.layer, `${s.job.at.ground}/layers/${stratum.index}`) : undefined
  })
  const unit: Unit = (at, stratum, z) => {
    const picked = chosen[stratum.index]!
    const f = picked.method.unitShaftResistance(
      contextAt(s, at, stratum, z, picked, { diameter: s.section.width, toeDepth: s.toeDepth }),
    )
    if (s.job.direction === 'compression' || picked.method.id === 'navfac-1986') return f
    return at.step(upliftShare, { r: upliftRatio(s, stratum), f })
  }
  return sumOverLayers(s, sheet, s.section.perimeter, unit, (stratum) => {
    const method = chosen[stratum.index]?.method
    return method?.idleDepth === undefined ? undefined : { depth: method.idleDepth, method: method.id }
  })
}

function upliftRatio(s: Site, stratum: Stratum): Term<'1'> {
  const soil = stratum.layer.soil === 'granular' ? 'granular' : 'cohesive'
  const given = s.job.methods.upliftRatio?.[soil]
  const label = { symbol: 'r', name: `share of the ${soil} shaft resistance in uplift`, unit: '1' } as const
  const sheet = s.sheet.within('methods')
  if (given !== undefined)
    return sheet.input(label, given, `${s.job.at.methods}/upliftRatio/${soil}`, `upliftRatio/${soil}`)
  return sheet.assumed(
    label,
    soil === 'cohesive' ? 1 : 0.8,
    `no upliftRatio for ${soil} layers was given`,
    practice('uplift ratio'),
    `upliftRatio/${soil}`,
  )
}
