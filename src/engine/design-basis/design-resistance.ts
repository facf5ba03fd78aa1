import type { Installation } from '../piles/pile-type.ts'
import type { Sheet } from '../trace/sheet.ts'
import type { Term } from '../trace/term.ts'
import { customFactors } from './custom.ts'
import type { DesignBasis } from './design-basis.ts'
import { groundFactors } from './en-1997-1-2004.ts'
import { en1997Resistance } from './en-1997-resistance.ts'
import { overallFactor } from './overall-factor.ts'
import type { ResistancePart } from './resistance-part.ts'

export type Part = ResistancePart & { readonly installation: Installation }
export type SafeResistance = { readonly designResistance?: Term<'kN'>; readonly allowableLoad?: Term<'kN'> }

/** Applies a design basis to one resistance. `pointer` is the place of the basis in the request. */
export function applyBasis(sheet: Sheet, basis: DesignBasis, part: Part, pointer: string): SafeResistance {
  if (basis.format === 'overall-factor') return { allowableLoad: overallFactor(sheet, basis, part, pointer) }
  if (basis.format === 'custom') return { designResistance: customFactors(sheet, basis, part, pointer) }
  return { designResistance: en1997Resistance(sheet, basis, part, pointer) }
}

/** The factors on the ground itself: EN 1997-1 DA3 only. */
export const materialFactors = (basis: DesignBasis): { readonly cu: number; readonly tanPhi: number } | undefined =>
  basis.format === 'en1997-1-2004' && basis.approach === 'DA3' ? groundFactors : undefined

/** The limit state whose combinations a basis is checked with. */
export const limitStateFor = (basis: DesignBasis): 'working' | 'ultimate' =>
  basis.format === 'overall-factor' ? 'working' : 'ultimate'
