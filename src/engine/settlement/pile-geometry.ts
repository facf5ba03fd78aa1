import type { PileType } from '../piles/pile-type.ts'
import { isSteel, sectionTerms } from '../piles/section.ts'
import { practice, statics } from '../sources/bibliography.ts'
import { formula } from '../trace/formula.ts'
import type { Sheet } from '../trace/sheet.ts'

export const toeDepthOf = formula({
  symbol: 'D',
  name: 'depth of the toe',
  unit: 'm',
  text: 'z_h + L',
  where: { z_h: 'm', L: 'm' },
  source: statics('depths'),
})
export const equivalentRadius = formula({
  symbol: 'r_0',
  name: 'radius of the circle of equal area',
  unit: 'm',
  text: 'sqrt(A / pi)',
  where: { A: 'm2' },
  source: practice('equivalent circle'),
})

/** What a settlement needs of a pile: section, length, depths, radii of the equal circles of shaft and base, and its modulus. */
export function elasticPileTerms(sheet: Sheet, pile: PileType, pointer: string) {
  const own = sheet.within('pile')
  const section = sectionTerms(sheet, pile, pointer)
  const L = own.input({ symbol: 'L', name: 'pile length', unit: 'm' }, pile.length, `${pointer}/length`)
  const head = { symbol: 'z_h', name: 'depth of the pile head', unit: 'm' } as const
  const z_h =
    pile.headDepth === undefined
      ? own.assumed(head, 0, 'no head depth was given: the head is at the surface', practice('head at the surface'))
      : own.input(head, pile.headDepth, `${pointer}/headDepth`)
  const D = own.step(toeDepthOf, { z_h, L })
  const modulus = { symbol: 'E_p', name: "Young's modulus of the pile", unit: 'kPa' } as const
  const steel = isSteel(pile.section)
  const E_p =
    pile.youngsModulus === undefined
      ? own.assumed(
          modulus,
          steel ? 210e6 : 30e6,
          `no youngsModulus was given: ${steel ? 'steel' : 'concrete'}`,
          practice("Young's modulus of the material"),
        )
      : own.input(modulus, pile.youngsModulus, `${pointer}/youngsModulus`)
  const here = sheet.within('stiffness')
  const r_0 = here.step(equivalentRadius, { A: section.outline })
  const r_b = pile.baseDiameter === undefined ? r_0 : here.step(equivalentRadius, { A: section.baseArea }, 'r_b')
  return { section, L, z_h, D, E_p, r_0, r_b }
}
