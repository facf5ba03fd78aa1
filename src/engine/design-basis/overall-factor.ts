import { practice } from '../sources/bibliography.ts'
import { formula } from '../trace/formula.ts'
import type { Sheet } from '../trace/sheet.ts'
import type { Term } from '../trace/term.ts'
import type { OverallFactor } from './design-basis.ts'
import { isBlock, isUplift, type ResistancePart } from './resistance-part.ts'

export const overallAllowable = formula({
  symbol: 'R_a',
  name: 'allowable load by the overall factor',
  unit: 'kN',
  text: 'R / F',
  where: { R: 'kN', F: '1' },
  source: practice('overall factor'),
})
export const splitAllowable = formula({
  symbol: 'R_a',
  name: 'allowable load by factors on shaft and base',
  unit: 'kN',
  text: 'R_s / F_s + R_b / F_b',
  where: { R_s: 'kN', F_s: '1', R_b: 'kN', F_b: '1' },
  source: practice('split factors'),
})

/**
 * Allowable load, kN: ultimate resistance over the overall factor; for a pile in compression with split factors the smaller of
 * this and shaft and base each over its own. Block and uplift take their own factor, or the overall one where none was given.
 */
export function overallFactor(sheet: Sheet, basis: OverallFactor, part: ResistancePart, pointer: string): Term<'kN'> {
  const label = { symbol: 'F', name: 'overall factor', unit: '1' } as const
  const own = isUplift(part) ? 'upliftFactor' : isBlock(part) ? 'blockFactor' : 'factor'
  const value = basis[own]
  const F =
    value === undefined
      ? sheet.assumed(
          label,
          basis.factor,
          `no ${own} was given: the overall factor serves`,
          practice('one overall factor'),
        )
      : sheet.input(label, value, `${pointer}/${own}`)
  const whole = sheet.step(overallAllowable, { R: part.ultimate, F }, 'R_a/overall')
  const { split } = basis
  if (!split || !part.base || part.part !== 'pile-compression') return whole
  const F_s = sheet.input(
    { symbol: 'F_s', name: 'factor on the shaft', unit: '1' },
    split.shaft,
    `${pointer}/split/shaft`,
  )
  const F_b = sheet.input({ symbol: 'F_b', name: 'factor on the base', unit: '1' }, split.base, `${pointer}/split/base`)
  const parts = sheet.step(splitAllowable, { R_s: part.shaft, F_s, R_b: part.base, F_b }, 'R_a/split')
  return sheet.choice({ symbol: 'R_a', name: 'allowable load', unit: 'kN' }, 'smallest', [whole, parts])
}
