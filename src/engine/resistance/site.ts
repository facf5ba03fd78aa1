import { materialFactors } from '../design-basis/design-resistance.ts'
import { refuse } from '../faults.ts'
import { SAME_DEPTH, type Stratum, strata } from '../ground/depths.ts'
import { layerParameter, type MaterialFactors } from '../ground/parameters.ts'
import { type Stresses, stresses } from '../ground/stress.ts'
import type { MethodContext, ShaftContext } from '../methods/method.ts'
import { type SectionTerms, sectionTerms } from '../piles/section.ts'
import type { UnitCode } from '../quantities/units.ts'
import { practice, statics } from '../sources/bibliography.ts'
import { formula } from '../trace/formula.ts'
import type { Sheet } from '../trace/sheet.ts'
import type { Term } from '../trace/term.ts'
import type { ResistanceJob } from './job.ts'
import type { Selected } from './selection.ts'

export const toeDepthFormula = formula({
  symbol: 'D',
  name: 'depth of the toe',
  unit: 'm',
  text: 'z_h + L',
  where: { z_h: 'm', L: 'm' },
  source: statics('depths'),
})

/** A pile type in its ground: what single pile and block both start from. */
export type Site = {
  readonly sheet: Sheet
  readonly job: ResistanceJob
  readonly layers: readonly Stratum[]
  readonly stressAt: Stresses
  readonly section: SectionTerms
  readonly headDepth: Term<'m'>
  readonly length: Term<'m'>
  readonly toeDepth: Term<'m'>
  readonly factors: MaterialFactors | undefined
}

/** Reads section, depths and stresses. Refuses a pile that reaches below the known ground. */
export function site(sheet: Sheet, job: ResistanceJob): Site {
  const { pile, ground, at } = job
  const layers = strata(ground, at.ground)
  const own = sheet.within('pile')
  const section = sectionTerms(sheet, pile, at.pile)
  const length = own.input({ symbol: 'L', name: 'pile length', unit: 'm' }, pile.length, `${at.pile}/length`)
  const label = { symbol: 'z_h', name: 'depth of the pile head', unit: 'm' } as const
  const headDepth =
    pile.headDepth === undefined
      ? own.assumed(label, 0, 'no head depth was given: the head is at the surface', practice('head at the surface'))
      : own.input(label, pile.headDepth, `${at.pile}/headDepth`)
  const toeDepth = own.step(toeDepthFormula, { z_h: headDepth, L: length })
  const known = layers.at(-1)!.bottom
  if (toeDepth.value > known + SAME_DEPTH) {
    refuse('pile-below-known-ground', `${at.pile}/length`, { toeDepth: toeDepth.value, knownDepth: known, unit: 'm' })
  }
  return {
    sheet,
    job,
    layers,
    section,
    length,
    headDepth,
    toeDepth,
    stressAt: stresses(sheet, ground, layers, at.ground),
    factors: job.designBasis && materialFactors(job.designBasis),
  }
}

type PlaceContext = MethodContext & Pick<ShaftContext, 'depth' | 'effectiveStress' | 'effectiveStressAt'>

/** What a method sees at one place: layer parameters, its own settings, stresses. The stress is a step only where it is asked for. */
export function contextAt<E extends object>(
  s: Site,
  here: Sheet,
  stratum: Stratum,
  depth: Term<'m'>,
  chosen: Selected,
  extra: E,
): PlaceContext & E {
  const { job } = s
  const pointer = `${job.at.ground}/layers/${stratum.index}`
  let stress: Term<'kPa'> | undefined
  return {
    ...extra,
    sheet: here,
    layer: stratum.layer,
    pointer,
    section: job.pile.section,
    installation: job.pile.installation,
    direction: job.direction,
    notice: job.notice,
    depth,
    // Not a getter: V8 would give each of these objects a hidden class of its own, which keeps the whole trace from an early collection.
    effectiveStress: () => {
      stress ??= s.stressAt(depth, here)
      return stress
    },
    effectiveStressAt: (z, id) => s.stressAt(z, here, id),
    parameter: <U extends UnitCode>(name: string, symbol: string, unit: U) =>
      layerParameter(
        s.sheet,
        here,
        stratum,
        pointer,
        depth,
        { name, symbol, unit, method: chosen.method.id },
        s.factors,
      ),
    setting: <U extends UnitCode>(name: string, symbol: string, unit: U) => {
      const value = chosen.settings[name]
      if (typeof value !== 'number') return undefined
      const label = { symbol, name: `${name} of ${chosen.method.id}`, unit }
      return s.sheet.within('methods').input(label, value, `${chosen.pointer}/${name}`, `${chosen.role}/${name}`)
    },
  }
}
