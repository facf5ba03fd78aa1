import { Problem } from '../errors.ts'
import type { Actor } from '../store/actor.ts'
import {
  type CapFilter,
  type CapLine,
  type CapOrder,
  type CapPosition,
  capPosition,
  listCaps as list,
} from '../store/cap-pages.ts'
import type { Page } from '../store/page.ts'
import { findCap, findTrace } from '../store/read-caps.ts'
import { listName } from './cursors.ts'
import type { Office } from './office.ts'
import { ownRecord } from './rights.ts'

/** A cap as one row: what dashboards and spreadsheets read. */
export const showCap = (c: CapLine) => ({
  mark: c.mark,
  ground: c.ground,
  pileType: c.pile_type,
  pileCount: c.pile_count,
  x: c.x,
  y: c.y,
  governingCheck: c.governing_check,
  governingCombination: c.governing_combination,
  utilisation: c.utilisation,
  exceeded: c.exceeded === 1,
  settlement: c.settlement,
  tilt: c.tilt,
  verticalStiffness: c.stiffness_vertical,
  rockingStiffnessAlongX: c.stiffness_rocking_x,
  rockingStiffnessAlongY: c.stiffness_rocking_y,
})
export type ShownCap = ReturnType<typeof showCap>

export { capOrders } from '../store/cap-pages.ts'
export type { CapFilter, CapOrder, CapPosition }

export const capList = (id: string, filter: CapFilter, order: CapOrder): string =>
  listName('caps', id, { ...filter, order })

/** Caps of a record, each with its place in the list. */
export async function listCaps(
  office: Office,
  actor: Actor,
  id: string,
  filter: CapFilter,
  order: CapOrder,
  page: Page<CapPosition>,
) {
  const record = await ownRecord(office, actor, id)
  const rows = await list(office.store, [id], filter, order, page)
  return { record, rows: rows.map((row) => ({ position: capPosition(order, row), cap: showCap(row) })) }
}

/** One cap: its part of the result as JSON, and its trace. Throws `no-such-cap`. */
export async function getCap(office: Office, actor: Actor, id: string, mark: string, trace: boolean) {
  const record = await ownRecord(office, actor, id)
  const cap = await findCap(office.store, id, mark)
  if (!cap) throw new Problem('no-such-cap', { mark })
  const steps = trace ? await findTrace(office.store, id, cap.ordinal) : undefined
  return { record, result: cap.body, trace: steps }
}
