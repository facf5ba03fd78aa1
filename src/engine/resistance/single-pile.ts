import { refuse } from '../faults.ts'
import { SAME_DEPTH, stratumAt } from '../ground/depths.ts'
import { waterUnitWeight } from '../ground/stress.ts'
import { isSteel } from '../piles/section.ts'
import { practice, statics } from '../sources/bibliography.ts'
import { formula } from '../trace/formula.ts'
import type { Sheet } from '../trace/sheet.ts'
import type { Term } from '../trace/term.ts'
import { groundNotices } from './ground-notices.ts'
import type { ResistanceJob } from './job.ts'
import { selectBase } from './selection.ts'
import { type LayerTerms, pileShaft } from './shaft.ts'
import { contextAt, type Site, site } from './site.ts'

export const baseResistance = formula({
  symbol: 'R_b',
  name: 'base resistance',
  unit: 'kN',
  text: 'q_b * A',
  where: { q_b: 'kPa', A: 'm2' },
  source: statics('stress times area'),
})
export const pileResistance = formula({
  symbol: 'R',
  name: 'ultimate resistance',
  unit: 'kN',
  text: 'R_s + R_b',
  where: { R_s: 'kN', R_b: 'kN' },
  source: practice('shaft and base add up'),
})
export const upliftResistance = formula({
  symbol: 'R_t',
  name: 'ultimate resistance in uplift',
  unit: 'kN',
  text: 'R_s + W',
  where: { R_s: 'kN', W: 'kN' },
  source: practice('shaft and effective weight'),
})
export const pileWeight = formula({
  symbol: 'W',
  name: 'effective weight of the pile',
  unit: 'kN',
  text: 'A * (gamma_p * L - gamma_w * max((0 m), min(L, D - z_w)))',
  where: { A: 'm2', gamma_p: 'kN/m3', L: 'm', gamma_w: 'kN/m3', D: 'm', z_w: 'm' },
  source: statics('weight less buoyancy'),
})
export const dryPileWeight = formula({
  symbol: 'W',
  name: 'weight of the pile',
  unit: 'kN',
  text: 'A * gamma_p * L',
  where: { A: 'm2', gamma_p: 'kN/m3', L: 'm' },
  source: statics('weight'),
})
export const innerShaft = formula({
  symbol: 'R_si',
  name: 'shaft resistance on the inner wall',
  unit: 'kN',
  text: 'R_s * (d - 2 * t) / d',
  where: { R_s: 'kN', d: 'm', t: 'm' },
  source: practice('the same unit resistance on the inner wall'),
})
export const addedShaft = formula({
  symbol: 'R_su',
  name: 'shaft resistance, outer and inner wall',
  unit: 'kN',
  text: 'R_s + R_si',
  where: { R_s: 'kN', R_si: 'kN' },
  source: practice('unplugged tube'),
})

export type PileTerms = {
  readonly shaftResistance: Term<'kN'>
  readonly baseResistance: Term<'kN'>
  readonly ultimateResistance: Term<'kN'>
  readonly weight?: Term<'kN'>
  readonly layers: readonly LayerTerms[]
  readonly unitBaseResistance: Term<'kPa'>
  readonly toeDepth: Term<'m'>
}

/** Resistance of one pile. Refuses what the methods cannot answer. */
export function singlePile(sheet: Sheet, job: ResistanceJob): PileTerms {
  return pileOn(site(sheet, job))
}

/** The same from a prepared site, so that single pile and block share ground and section. */
export function pileOn(s: Site): PileTerms {
  const shaft = pileShaft(s, s.sheet.within('shaft'))
  const { layers } = shaft
  const { toeDepth } = s
  groundNotices(s)
  if (s.job.direction === 'uplift') {
    const sheet = s.sheet.within('uplift')
    const weight = effectiveWeight(s)
    const none = { reason: 'the base carries no tension', source: practice('no tension at the base') }
    return {
      shaftResistance: shaft.total,
      layers,
      toeDepth,
      weight,
      baseResistance: sheet.assumed(
        { symbol: 'R_b', name: 'base resistance', unit: 'kN' },
        0,
        none.reason,
        none.source,
      ),
      unitBaseResistance: sheet.assumed(
        { symbol: 'q_b', name: 'unit base resistance', unit: 'kPa' },
        0,
        none.reason,
        none.source,
      ),
      ultimateResistance: sheet.step(upliftResistance, { R_s: shaft.total, W: weight }),
    }
  }
  const base = s.sheet.within('base')
  const q_b = unitBase(s, base, s.section.baseWidth, s.section.baseWidth)
  const { wall } = s.section
  const whole = base.step(baseResistance, { q_b, A: s.section.baseArea })
  if (!wall || s.job.pile.section.shape !== 'tubular' || s.job.pile.section.toe === 'closed') {
    return {
      shaftResistance: shaft.total,
      baseResistance: whole,
      layers,
      unitBaseResistance: q_b,
      toeDepth,
      ultimateResistance: s.sheet.step(pileResistance, { R_s: shaft.total, R_b: whole }),
    }
  }
  const plugged = base.step(pileResistance, { R_s: shaft.total, R_b: whole }, 'R/plugged')
  const inner = base.step(innerShaft, { R_s: shaft.total, d: s.section.width, t: wall.thickness })
  const both = base.step(addedShaft, { R_s: shaft.total, R_si: inner })
  const wallBase = base.step(baseResistance, { q_b, A: wall.area }, 'R_b/wall')
  const unplugged = base.step(pileResistance, { R_s: both, R_b: wallBase }, 'R/unplugged')
  const ultimateResistance = s.sheet.choice(
    { symbol: 'R', name: 'ultimate resistance: plugged or unplugged', unit: 'kN' },
    'smallest',
    [plugged, unplugged],
  )
  const isPlugged = plugged.value <= unplugged.value
  return {
    shaftResistance: isPlugged ? shaft.total : both,
    baseResistance: isPlugged ? whole : wallBase,
    ultimateResistance,
    layers,
    unitBaseResistance: q_b,
    toeDepth,
  }
}

/** Unit base resistance at the toe, of the layer below when the toe is on a boundary. */
export function unitBase(s: Site, here: Sheet, breadth: Term<'m'>, length: Term<'m'>): Term<'kPa'> {
  const found = stratumAt(s.layers, s.toeDepth.value) ?? s.layers.at(-1)!
  if (s.toeDepth.value > found.bottom + SAME_DEPTH)
    return refuse('pile-below-known-ground', `${s.job.at.pile}/length`, { toeDepth: s.toeDepth.value })
  const picked = selectBase(s.job, found.layer, `${s.job.at.ground}/layers/${found.index}`)
  return picked.method.unitBaseResistance(contextAt(s, here, found, s.toeDepth, picked, { breadth, length }))
}

/** Effective weight of one pile: less buoyancy below the water table. */
export function effectiveWeight(s: Site): Term<'kN'> {
  const { pile, ground, at } = s.job
  const sheet = s.sheet.within('pile')
  const label = { symbol: 'gamma_p', name: 'unit weight of the pile', unit: 'kN/m3' } as const
  const steel = isSteel(pile.section)
  const gamma_p =
    pile.unitWeight === undefined
      ? sheet.assumed(
          label,
          steel ? 78.5 : 24,
          `no unit weight was given: ${steel ? 'steel' : 'concrete'}`,
          practice('unit weight of the material'),
        )
      : sheet.input(label, pile.unitWeight, `${at.pile}/unitWeight`)
  const terms = { A: s.section.material, gamma_p, L: s.length }
  if (ground.waterTableDepth === undefined) return sheet.step(dryPileWeight, terms)
  const z_w = s.sheet
    .within('ground')
    .input(
      { symbol: 'z_w', name: 'depth of the water table', unit: 'm' },
      ground.waterTableDepth,
      `${at.ground}/waterTableDepth`,
      'z_w',
    )
  return sheet.step(pileWeight, { ...terms, gamma_w: waterUnitWeight(s.sheet), D: s.toeDepth, z_w })
}
