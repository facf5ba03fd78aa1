import type { CapTerms } from '../piles/pile-plan.ts'
import { statics } from '../sources/bibliography.ts'
import { formula } from '../trace/formula.ts'
import type { Sheet } from '../trace/sheet.ts'
import type { Term } from '../trace/term.ts'
import type { Loads, ModelRow, PressingRow } from './schedule.ts'

export type CapActions = { readonly V: number; readonly Mx: number; readonly My: number }

export const signedForce = formula({
  symbol: 'F',
  name: 'model force in pressing signs',
  unit: 'kN',
  text: 'c * f',
  where: { c: '1', f: 'kN' },
  source: statics('sign convention of the load set'),
})
export const signedMoment = formula({
  symbol: 'M',
  name: 'model moment in pressing signs',
  unit: 'kN.m',
  text: 'c * m',
  where: { c: '1', m: 'kN.m' },
  source: statics('sign convention of the load set'),
})
export const loadWithCap = formula({
  symbol: 'V',
  name: 'vertical load with the weight of the cap',
  unit: 'kN',
  text: 'F + W_c',
  where: { F: 'kN', W_c: 'kN' },
  source: statics('weight'),
})

const isPressing = (row: ModelRow | PressingRow): row is PressingRow => 'V' in row

/** Signs that turn a row into V, Mx, My: from actions z-up -Fz, -Mx, +My; z-down +Fz, +Mx, -My; reactions change sign first. */
function signs(loads: Loads): { readonly V: number; readonly Mx: number; readonly My: number } {
  const flip = loads.loadsAre === 'reactions' ? -1 : 1
  if (loads.signs === 'right-handed-z-up') return { V: -flip, Mx: -flip, My: flip }
  if (loads.signs === 'right-handed-z-down') return { V: flip, Mx: flip, My: -flip }
  return { V: flip, Mx: flip, My: flip }
}

/** The actions on a cap, in pressing signs, the weight of the cap added. */
export function capActions(loads: Loads, row: ModelRow | PressingRow, capWeight: number): CapActions {
  const c = signs(loads)
  const vertical = isPressing(row) ? row.V : row.Fz
  return { V: c.V * vertical + capWeight, Mx: c.Mx * row.Mx, My: c.My * row.My }
}

/** The same as steps, for the combination that is traced. */
export function capTerms(
  sheet: Sheet,
  loads: Loads,
  index: number,
  row: ModelRow | PressingRow,
  capWeight: Term<'kN'>,
): CapTerms {
  const c = signs(loads)
  const at = `/loads/rows/${index}`
  const field = isPressing(row) ? 'V' : 'Fz'
  const sign = (symbol: string, value: number) =>
    sheet.assumed(
      { symbol, name: `sign of ${symbol.slice(2)}`, unit: '1' },
      value,
      `${loads.signs}, ${loads.loadsAre}`,
      statics('sign convention of the load set'),
    )
  const f = sheet.input(
    { symbol: field, name: 'vertical component of the model', unit: 'kN' },
    isPressing(row) ? row.V : row.Fz,
    `${at}/${field}`,
    'row/V',
  )
  const moment = (axis: 'Mx' | 'My') => {
    const m = sheet.input(
      { symbol: axis, name: `${axis} of the model`, unit: 'kN.m' },
      row[axis],
      `${at}/${axis}`,
      `row/${axis}`,
    )
    return { ...sheet.step(signedMoment, { c: sign(`c_${axis}`, c[axis]), m }, axis), symbol: axis }
  }
  const F = sheet.step(signedForce, { c: sign('c_V', c.V), f })
  return { V: sheet.step(loadWithCap, { F, W_c: capWeight }), Mx: moment('Mx'), My: moment('My') }
}
