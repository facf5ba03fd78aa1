import { cite } from '../sources/bibliography.ts'
import { formula } from '../trace/formula.ts'
import type { Sheet } from '../trace/sheet.ts'
import type { Term } from '../trace/term.ts'
import type { En1997 } from './design-basis.ts'
import { correlationFactors, enTable, resistanceFactors, setOf, stiffStructureDivisor } from './en-1997-1-2004.ts'
import { isBlock, isUplift, type ResistancePart } from './resistance-part.ts'

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
  text: 'max(1, xi / g)',
  where: { xi: '1', g: '1' },
  source: cite('en-1997-1-2004', '7.6.2.3(7)'),
})

export type En1997Part = ResistancePart & { readonly installation: keyof (typeof resistanceFactors)['R1'] }

/**
 * What a calculated resistance is divided by to be characteristic: the model factor, or xi. R_k = min(mean / xi3, lowest / xi4);
 * one calculated profile stands for both, so the larger factor governs. Between rows of the table the lower count holds.
 */
function modelOrCorrelation(sheet: Sheet, basis: En1997, pointer: string): Term<'1'> {
  const at = `${pointer}/characteristic`
  const route = basis.characteristic
  if (route.route === 'model-factor')
    return sheet.input({ symbol: 'k', name: 'model factor', unit: '1' }, route.value, `${at}/value`)
  const [count, ...factors] = correlationFactors.findLast(([least]) => least <= route.count) ?? correlationFactors[0]!
  const profiles = count === 1 ? '1 profile' : `${count} profiles`
  const [xi3, xi4] = (['xi3', 'xi4'] as const).map((symbol, i) =>
    sheet.assumed(
      { symbol, name: `correlation factor on the ${i === 0 ? 'mean' : 'lowest'} resistance, ${profiles}`, unit: '1' },
      factors[i]!,
      `${at}/count is ${route.count}`,
      enTable('Annex A, table A.10'),
    ),
  ) as [Term<'1'>, Term<'1'>]
  const xi = sheet.choice({ symbol: 'xi', name: 'correlation factor', unit: '1' }, 'largest', [xi3, xi4])
  if (!route.stiffStructure) return xi
  const g = sheet.assumed(
    { symbol: 'g', name: 'divisor of xi where the structure shares load between piles', unit: '1' },
    stiffStructureDivisor,
    'stiffStructure is given',
    enTable('7.6.2.3(7)'),
  )
  return sheet.step(stiffCorrelation, { xi, g })
}

/** Design resistance, kN: characteristic over the recommended partial factors of the approach. The weight in uplift is not factored. */
export function en1997Resistance(sheet: Sheet, basis: En1997, part: En1997Part, pointer: string): Term<'kN'> {
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
