import type { Installation } from '../piles/pile-type.ts'
import { cite, practice } from '../sources/bibliography.ts'
import { formula } from '../trace/formula.ts'
import type { Sheet } from '../trace/sheet.ts'
import type { Term } from '../trace/term.ts'
import type { Custom, DesignBasis, En1997, OverallFactor } from './design-basis.ts'
import { correlationFactors, enTable, groundFactors, resistanceFactors, setOf } from './en-1997-1-2004.ts'

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
export const characteristic = formula({
  symbol: 'R_k',
  name: 'characteristic resistance',
  unit: 'kN',
  text: 'R / k',
  where: { R: 'kN', k: '1' },
  source: cite('en-1997-1-2004', '7.6.2.3'),
})
export const enPile = formula({
  symbol: 'R_d',
  name: 'design resistance',
  unit: 'kN',
  text: 'R_bk / gamma_b + R_sk / gamma_s',
  where: { R_bk: 'kN', gamma_b: '1', R_sk: 'kN', gamma_s: '1' },
  source: cite('en-1997-1-2004', 'equation 7.7'),
})
export const enTotal = formula({
  symbol: 'R_d',
  name: 'design resistance',
  unit: 'kN',
  text: 'R_k / gamma',
  where: { R_k: 'kN', gamma: '1' },
  source: cite('en-1997-1-2004', 'equation 7.4'),
})
export const enUplift = formula({
  symbol: 'R_d',
  name: 'design resistance in uplift',
  unit: 'kN',
  text: 'R_k / gamma + W',
  where: { R_k: 'kN', gamma: '1', W: 'kN' },
  source: cite('en-1997-1-2004', '7.6.3'),
})
export const stiffCorrelation = formula({
  symbol: 'k',
  name: 'correlation factor of a stiff structure',
  unit: '1',
  text: 'max(1, xi / 1.1)',
  where: { xi: '1' },
  source: cite('en-1997-1-2004', '7.6.2.3(7)'),
})

/** What a resistance belongs to, and its parts. Base resistance and weight stand where there are any. */
export type Part = {
  readonly part: 'pile-compression' | 'pile-uplift' | 'block-compression' | 'block-uplift'
  readonly shaft: Term<'kN'>
  readonly base?: Term<'kN'>
  readonly ultimate: Term<'kN'>
  readonly weight?: Term<'kN'>
  readonly installation: Installation
}
export type SafeResistance = { readonly designResistance?: Term<'kN'>; readonly allowableLoad?: Term<'kN'> }

const isUplift = (part: Part) => part.part.endsWith('uplift')
const isBlock = (part: Part) => part.part.startsWith('block')

/** Applies a design basis to one resistance. `pointer` is the place of the basis in the request. */
export function applyBasis(sheet: Sheet, basis: DesignBasis, part: Part, pointer: string): SafeResistance {
  if (basis.format === 'overall-factor') return { allowableLoad: overall(sheet, basis, part, pointer) }
  if (basis.format === 'custom') return { designResistance: custom(sheet, basis, part, pointer) }
  return { designResistance: en1997(sheet, basis, part, pointer) }
}

/** The factors on the ground itself: EN 1997-1 DA3 only. */
export const materialFactors = (basis: DesignBasis): { readonly cu: number; readonly tanPhi: number } | undefined =>
  basis.format === 'en1997-1-2004' && basis.approach === 'DA3' ? groundFactors : undefined

/** The limit state whose combinations a basis is checked with. */
export const limitStateFor = (basis: DesignBasis): 'working' | 'ultimate' =>
  basis.format === 'overall-factor' ? 'working' : 'ultimate'

function overall(sheet: Sheet, basis: OverallFactor, part: Part, pointer: string): Term<'kN'> {
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

function custom(sheet: Sheet, basis: Custom, part: Part, pointer: string): Term<'kN'> {
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

function en1997(sheet: Sheet, basis: En1997, part: Part, pointer: string): Term<'kN'> {
  const set = setOf[basis.approach]
  const row = resistanceFactors[set][part.installation]
  const factor = (symbol: string, field: keyof typeof row) =>
    sheet.assumed(
      { symbol, name: `resistance factor ${set}, ${field}`, unit: '1' },
      row[field],
      `recommended value for ${basis.approach}, ${part.installation}`,
      enTable('Annex A, tables A.6 to A.8'),
    )
  const k = modelOrCorrelation(sheet, basis, pointer)
  if (isUplift(part)) {
    const R_k = sheet.step(characteristic, { R: part.shaft, k })
    const gamma = factor('gamma_st', 'tension')
    return part.weight ? sheet.step(enUplift, { R_k, gamma, W: part.weight }) : sheet.step(enTotal, { R_k, gamma })
  }
  if (isBlock(part) || !part.base)
    return sheet.step(enTotal, {
      R_k: sheet.step(characteristic, { R: part.ultimate, k }),
      gamma: factor('gamma_t', 'total'),
    })
  return sheet.step(enPile, {
    R_bk: sheet.step(characteristic, { R: part.base, k }, 'R_bk'),
    gamma_b: factor('gamma_b', 'base'),
    R_sk: sheet.step(characteristic, { R: part.shaft, k }, 'R_sk'),
    gamma_s: factor('gamma_s', 'shaft'),
  })
}

/** Calculated over characteristic resistance. One calculated profile stands for mean and lowest, so xi3 (the larger) governs. */
function modelOrCorrelation(sheet: Sheet, basis: En1997, pointer: string): Term<'1'> {
  const at = `${pointer}/characteristic`
  const route = basis.characteristic
  if (route.route === 'model-factor')
    return sheet.input({ symbol: 'k', name: 'model factor', unit: '1' }, route.value, `${at}/value`)
  const row = [...correlationFactors].reverse().find(([count]) => count <= route.count) ?? correlationFactors[0]!
  const xi = sheet.assumed(
    { symbol: 'xi', name: `correlation factor xi3 for ${row[0]} profiles`, unit: '1' },
    row[1],
    `${route.count} profiles were given`,
    enTable('Annex A, table A.10'),
  )
  return route.stiffStructure ? sheet.step(stiffCorrelation, { xi }) : xi
}
