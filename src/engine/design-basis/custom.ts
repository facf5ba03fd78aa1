import { practice } from '../sources/bibliography.ts'
import { formula } from '../trace/formula.ts'
import type { Sheet } from '../trace/sheet.ts'
import type { Term } from '../trace/term.ts'
import type { Custom } from './design-basis.ts'
import { isUplift, type ResistancePart } from './resistance-part.ts'

export const customPile = formula({
  symbol: 'R_d',
  name: 'design resistance',
  unit: 'kN',
  text: 'phi_s * R_s + phi_b * R_b',
  where: { phi_s: '1', R_s: 'kN', phi_b: '1', R_b: 'kN' },
  source: practice('resistance factors of the project'),
})
export const customTotal = formula({
  symbol: 'R_d',
  name: 'design resistance',
  unit: 'kN',
  text: 'phi * R',
  where: { phi: '1', R: 'kN' },
  source: practice('resistance factors of the project'),
})

/** Design resistance, kN, by the project's own resistance factors; in uplift the factor stands on shaft and weight together. */
export function customFactors(sheet: Sheet, basis: Custom, part: ResistancePart, pointer: string): Term<'kN'> {
  const factor = (symbol: string, field: 'shaft' | 'base' | 'block' | 'uplift') =>
    sheet.input({ symbol, name: `resistance factor, ${field}`, unit: '1' }, basis[field], `${pointer}/${field}`)
  if (part.part === 'pile-compression' && part.base) {
    return sheet.step(customPile, {
      phi_s: factor('phi_s', 'shaft'),
      R_s: part.shaft,
      phi_b: factor('phi_b', 'base'),
      R_b: part.base,
    })
  }
  return sheet.step(customTotal, { phi: factor('phi', isUplift(part) ? 'uplift' : 'block'), R: part.ultimate })
}
