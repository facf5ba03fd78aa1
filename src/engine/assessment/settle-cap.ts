import { planeSettlement } from '../settlement/group-settlement.ts'
import { groupResponse } from '../settlement/prepared-group.ts'
import type { Sheet } from '../trace/sheet.ts'
import type { Term } from '../trace/term.ts'
import { capTerms } from './cap-loads.ts'
import { idPart } from './places.ts'
import type { ResistanceSet } from './resistance-set.ts'
import type { Loads, ModelRow, PressingRow } from './schedule.ts'

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
): SettlementTerms {
  const here = sheet.within(`settlement/${idPart(row.combination)}`)
  const load = capTerms(here, loads, index, row, weight)
  const plane = groupResponse(here, set.prepared, load, `/loads/rows/${index}`)
  const { settlement: s_o, tiltAlongX: theta_x, tiltAlongY: theta_y } = plane
  const { x_m: x, y_m: y } = set.plan
  return {
    combination: row.combination,
    settlement: here.step(planeSettlement, { s_o, theta_x, x, theta_y, y }),
    tilt: plane.tilt,
  }
}
