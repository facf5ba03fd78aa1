import { enclosingPrism, smallestSpacing } from '../piles/enclosing-prism.ts'
import { positions } from '../piles/layout.ts'
import { practice, statics } from '../sources/bibliography.ts'
import { formula } from '../trace/formula.ts'
import type { Sheet } from '../trace/sheet.ts'
import type { Term } from '../trace/term.ts'
import type { GroupJob } from './job.ts'
import { sumOverLayers, type Unit } from './shaft.ts'
import { baseResistance, effectiveWeight, pileResistance, unitBase, upliftResistance } from './single-pile.ts'
import { contextAt, type Site, site } from './site.ts'

export const blockPerimeter = formula({
  symbol: 'U_g',
  name: 'perimeter of the block',
  unit: 'm',
  text: '2 * (B + L_g)',
  where: { B: 'm', L_g: 'm' },
  source: statics('rectangle'),
})
export const blockArea = formula({
  symbol: 'A_g',
  name: 'base area of the block',
  unit: 'm2',
  text: 'B * L_g',
  where: { B: 'm', L_g: 'm' },
  source: statics('rectangle'),
})
export const cohesiveSide = formula({
  symbol: 'f_g',
  name: 'unit side resistance, soil on soil',
  unit: 'kPa',
  text: 'c_u',
  where: { c_u: 'kPa' },
  source: practice('the sides of a block carry the full undrained strength'),
})
export const granularSide = formula({
  symbol: 'f_g',
  name: 'unit side resistance, soil on soil',
  unit: 'kPa',
  text: '(1 - sin(phi)) * tan(phi) * sigma_v',
  where: { phi: 'deg', sigma_v: 'kPa' },
  source: practice('earth pressure at rest and full friction on the sides of a block'),
})
export const blockWeight = formula({
  symbol: 'W_g',
  name: 'effective weight of soil and piles in the block',
  unit: 'kN',
  text: '(A_g - n * A) * (sigma_b - sigma_t) + n * W',
  where: { A_g: 'm2', n: '1', A: 'm2', sigma_b: 'kPa', sigma_t: 'kPa', W: 'kN' },
  source: statics('weight of the prism from head to toe'),
})

/** Piles closer than this many widths disturb one another when they are installed [practice]. */
const CLOSE = 2.5

export type BlockTerms = {
  readonly breadth: Term<'m'>
  readonly length: Term<'m'>
  readonly depth: Term<'m'>
  readonly perimeter: Term<'m'>
  readonly baseArea: Term<'m2'>
  readonly sideResistance: Term<'kN'>
  readonly baseResistance: Term<'kN'>
  readonly ultimateResistance: Term<'kN'>
  readonly weight?: Term<'kN'>
}

/** Resistance of the prism of soil and piles that a layout encloses. */
export const block = (sheet: Sheet, job: GroupJob): BlockTerms => blockOn(site(sheet, job), job)

export function blockOn(s: Site, job: GroupJob): BlockTerms {
  const sheet = s.sheet.within('block')
  const points = positions(job.layout)
  const spacing = smallestSpacing(points, s.section.width.value, job.at.layout)
  if (spacing < CLOSE * s.section.width.value - 1e-9) {
    job.notice({
      code: 'close-spacing',
      level: 'warning',
      pointer: job.at.layout,
      text: `Piles stand ${(spacing / s.section.width.value).toFixed(2)} widths apart, closer than ${CLOSE}.`,
    })
  }
  const { breadth, length } = enclosingPrism(sheet, points, s.section.width)
  const perimeter = sheet.step(blockPerimeter, { B: breadth, L_g: length })
  const baseArea = sheet.step(blockArea, { B: breadth, L_g: length })
  const side = sumOverLayers(s, sheet.within('side'), perimeter, sideUnit(s), () => undefined).total
  const shape = { breadth, length, depth: s.toeDepth, perimeter, baseArea, sideResistance: side }
  if (job.direction === 'uplift') {
    const n = sheet
      .within('piles')
      .input({ symbol: 'n', name: 'number of piles', unit: '1' }, points.length, job.at.layout)
    const sigma_t = s.stressAt(s.headDepth, sheet, 'sigma_t')
    const sigma_b = s.stressAt(s.toeDepth, sheet, 'sigma_b')
    const weight = sheet.step(blockWeight, {
      A_g: baseArea,
      n,
      A: s.section.material,
      sigma_b,
      sigma_t,
      W: effectiveWeightOnce(s),
    })
    const baseResistance = sheet.assumed(
      { symbol: 'R_b', name: 'base resistance of the block', unit: 'kN' },
      0,
      'the base carries no tension',
      practice('no tension at the base'),
    )
    return {
      ...shape,
      baseResistance,
      weight,
      ultimateResistance: sheet.step(upliftResistance, { R_s: side, W: weight }),
    }
  }
  const base = sheet.within('base')
  const q_b = unitBase(s, base, breadth, length)
  const resistance = base.step(baseResistance, { q_b, A: baseArea })
  return {
    ...shape,
    baseResistance: resistance,
    ultimateResistance: sheet.step(pileResistance, { R_s: side, R_b: resistance }),
  }
}

/** The weight of one pile under a name of its own: the single pile of a group records the same formula under `pile/`. */
const effectiveWeightOnce = (s: Site): Term<'kN'> => effectiveWeight({ ...s, sheet: s.sheet.within('block/weight') })

function sideUnit(s: Site): Unit {
  return (here, stratum, z) => {
    const at = contextAt(
      s,
      here,
      stratum,
      z,
      { method: { id: 'block side' }, settings: {}, pointer: '', role: 'side' },
      {},
    )
    if (stratum.layer.soil === 'cohesive')
      return here.step(cohesiveSide, { c_u: at.parameter('undrainedShearStrength', 'c_u', 'kPa') })
    return here.step(granularSide, { phi: at.parameter('frictionAngle', 'phi', 'deg'), sigma_v: at.effectiveStress() })
  }
}
