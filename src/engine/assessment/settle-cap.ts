import { planeSettlement } from '../settlement/group-settlement.ts'
import { type GroupResponse, groupResponse, tiltOf } from '../settlement/prepared-group.ts'
import { statics } from '../sources/bibliography.ts'
import { formula } from '../trace/formula.ts'
import type { Sheet } from '../trace/sheet.ts'
import type { Term } from '../trace/term.ts'
import type { Felt } from './cap-field.ts'
import { capTerms } from './cap-loads.ts'
import { idPart } from './places.ts'
import type { ResistanceSet } from './resistance-set.ts'
import type { Loads, ModelRow, PressingRow } from './schedule.ts'

export const settlementTogether = formula({
  symbol: 's_o',
  name: "settlement at the cap's origin, with the other caps",
  unit: 'mm',
  text: 's_a + s_b',
  where: { s_a: 'mm', s_b: 'mm' },
  source: statics('superposition'),
})
export const slopeTogether = formula({
  symbol: 'theta',
  name: 'slope with the other caps',
  unit: '1',
  text: 'a + b',
  where: { a: '1', b: '1' },
  source: statics('superposition'),
})

export type SettlementTerms = {
  readonly combination: string
  readonly settlement: Term<'mm'>
  readonly tilt: Term<'1'>
}

/**
 * Settlement at the centroid of the piles and slope of the cap under one combination, as steps from the row of the model:
 * the flexibility of the cap, prepared once, times the actions.
 */
export function settleCap(
  sheet: Sheet,
  set: ResistanceSet,
  loads: Loads,
  index: number,
  row: ModelRow | PressingRow,
  weight: Term<'kN'>,
  felt?: Felt,
): SettlementTerms {
  const here = sheet.within(`settlement/${idPart(row.combination)}`)
  const load = capTerms(here, loads, index, row, weight)
  const alone = groupResponse(here, set.prepared, load, `/loads/rows/${index}`)
  const plane = felt ? withOthers(here, alone, felt, set) : alone
  const { settlement: s_o, tiltAlongX: theta_x, tiltAlongY: theta_y } = plane
  const { x_m: x, y_m: y } = set.plan
  return {
    combination: row.combination,
    settlement: here.step(planeSettlement, { s_o, theta_x, x, theta_y, y }),
    tilt: plane.tilt,
  }
}

/** Adds what the other caps do to this one. */
function withOthers(sheet: Sheet, alone: GroupResponse, felt: Felt, set: ResistanceSet): GroupResponse {
  const here = sheet.within('others')
  const added = <const U extends 'mm' | '1'>(symbol: string, name: string, unit: U, value: number) =>
    here.solution({
      symbol,
      name,
      unit,
      value,
      method: 'field of the piles of all other caps, averaged over the piles of this one as its rigid cap follows them',
      operands: [set.prepared.stiffness, ...set.prepared.basis],
      unknowns: [{ symbol, value, unit }],
      residuals: [],
      tolerance: 0,
      table: {
        columns: [
          { symbol: 'cap', unit: '1' },
          { symbol: 'l', unit: 'm' },
          { symbol: 'V', unit: 'kN' },
          { symbol: 's', unit: 'mm' },
        ],
        rows: felt.largest,
      },
      source: set.prepared.pile.source,
    })
  const theta_x = here.step(
    slopeTogether,
    { a: alone.tiltAlongX, b: added('t_x', 'slope along x from the other caps', '1', felt.alongX) },
    'theta_x',
  )
  const theta_y = here.step(
    slopeTogether,
    { a: alone.tiltAlongY, b: added('t_y', 'slope along y from the other caps', '1', felt.alongY) },
    'theta_y',
  )
  return {
    settlement: here.step(settlementTogether, {
      s_a: alone.settlement,
      s_b: added('s_n', 'settlement from the other caps', 'mm', felt.settlement * 1000),
    }),
    tilt: here.step(tiltOf, { theta_x, theta_y }),
    tiltAlongX: theta_x,
    tiltAlongY: theta_y,
  }
}
