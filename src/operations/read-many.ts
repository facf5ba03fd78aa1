import {
  type CapFilter,
  type CapOrder,
  type CapPosition,
  capPosition,
  countCaps,
  listCaps,
  type RankedCap,
} from '../store/cap-pages.ts'
import {
  countRecords,
  findRecordsOf,
  type RecordFilter,
  type RecordOrder,
  type RecordPosition,
  type RecordSums,
  recordPosition,
  sumRecords,
} from '../store/find-records.ts'
import {
  countNeighbours,
  type NeighbourFilter,
  type NeighbourOrder,
  type NeighbourPosition,
  neighbourPosition,
  neighboursOf,
} from '../store/neighbour-pages.ts'
import type { Page } from '../store/page.ts'
import * as many from '../store/read-many.ts'
import { type CapSum, sumByCheck, sumByGround, sumByPileType } from '../store/sum-caps.ts'
import { listName } from './cursors.ts'
import type { Office } from './office.ts'
import { showProject } from './put-project.ts'
import { showCap } from './read-caps.ts'
import { showRecord } from './show-record.ts'
import { showCheck, showNeighbours } from './shown-rows.ts'
import { showSignature } from './sign-assessment.ts'

export { neighbourOrders } from '../store/neighbour-pages.ts'
export type { CapKey, MarkKey, RevisionKey } from '../store/read-many.ts'
export type { CapSum, NeighbourFilter, NeighbourOrder, NeighbourPosition, RecordSums }

/**
 * What belongs to many parents, each kind by one call of the store. Whoever asks has been given the parents, so it asks for no
 * rights: nothing here leads from one project to another.
 */
type Reading = Pick<Office, 'store'>

/** What every list of a page shares. */
export type Paged<Filter, Order, Position> = {
  readonly filter: Filter
  readonly order: Order
  readonly page: Page<Position>
}

const grouped = <Row, Shown>(rows: readonly Row[], keyOf: (row: Row) => string, show: (row: Row) => Shown) => {
  const groups = new Map<string, Shown[]>()
  for (const row of rows) {
    const group = groups.get(keyOf(row))
    if (group) group.push(show(row))
    else groups.set(keyOf(row), [show(row)])
  }
  return (key: string): readonly Shown[] => groups.get(key) ?? []
}
const capKey = (record: string, cap: number) => `${record}/${cap}`
const lookedUp = <Row, Shown>(rows: readonly Row[], keyOf: (row: Row) => string, show: (row: Row) => Shown) => {
  const found = new Map(rows.map((row) => [keyOf(row), show(row)]))
  return (key: string): Shown | null => found.get(key) ?? null
}

export async function projectsOf({ store }: Reading, slugs: readonly string[]) {
  const at = lookedUp(await many.findProjects(store, slugs), (row) => row.slug, showProject)
  return slugs.map((slug) => at(slug)!)
}

export async function latestOf({ store }: Reading, slugs: readonly string[]) {
  const at = lookedUp(await many.latestRecords(store, slugs), (row) => row.project, showRecord)
  return slugs.map(at)
}

export async function revisionsOf({ store }: Reading, keys: readonly many.RevisionKey[]) {
  const key = ({ project, revision }: many.RevisionKey) => `${project}/${revision}`
  const at = lookedUp(await many.findRevisions(store, keys), key, showRecord)
  return keys.map((one) => at(key(one)))
}

type Records = Paged<Omit<RecordFilter, 'project'>, RecordOrder, RecordPosition>
export async function assessmentsOf({ store }: Reading, slugs: readonly string[], { filter, order, page }: Records) {
  const rows = await findRecordsOf(store, slugs, filter, order, page)
  const shown = grouped(
    rows,
    (row) => row.project,
    (row) => ({ ...showRecord(row), position: recordPosition({ ...filter, project: row.project }, order, row) }),
  )
  return slugs.map(shown)
}

const everybody = { projects: ['*'] }
export async function countAssessmentsOf({ store }: Reading, slugs: readonly string[], filter: RecordFilter) {
  const counts = await countRecords(store, everybody, filter, slugs)
  return slugs.map((slug) => counts.get(slug) ?? 0)
}
export async function sumAssessmentsOf({ store }: Reading, slugs: readonly string[], filter: RecordFilter) {
  const sums = await sumRecords(store, everybody, filter, slugs)
  return slugs.map((slug) => sums.get(slug)!)
}

/** A cap, and where it lies. */
const capNode = (row: RankedCap, position: CapPosition) => ({
  ...showCap(row),
  assessment: row.record,
  ordinal: row.ordinal,
  position,
})
export type CapNode = ReturnType<typeof capNode>

type Caps = Paged<CapFilter, CapOrder, CapPosition>
export async function capsOf({ store }: Reading, records: readonly string[], { filter, order, page }: Caps) {
  const rows = await listCaps(store, records, filter, order, page)
  return records.map(
    grouped(
      rows,
      (row) => row.record,
      (row) => capNode(row, capPosition(order, row)),
    ),
  )
}
export async function countCapsOf({ store }: Reading, records: readonly string[], filter: CapFilter) {
  const counts = await countCaps(store, records, filter)
  return records.map((record) => counts.get(record) ?? 0)
}
export async function capsByMark({ store }: Reading, keys: readonly many.MarkKey[]) {
  const key = ({ record, mark }: many.MarkKey) => `${record}/${mark}`
  const at = lookedUp(await many.findCaps(store, keys), key, (row) => capNode(row, row.ordinal))
  return keys.map((one) => at(key(one)))
}

export async function checksOf({ store }: Reading, keys: readonly many.CapKey[]) {
  const shown = grouped(await many.checksOf(store, keys), (row) => capKey(row.record, row.cap), showCheck)
  return keys.map(({ record, cap }) => shown(capKey(record, cap)))
}
export const tracesOf = ({ store }: Reading, keys: readonly many.CapKey[]) => many.tracesOf(store, keys)

export const neighbourList = (id: string, filter: NeighbourFilter, order: NeighbourOrder): string =>
  listName('neighbours', id, { ...filter, order })

type Pairs = Paged<NeighbourFilter, NeighbourOrder, NeighbourPosition>
export async function neighbourPagesOf({ store }: Reading, records: readonly string[], { filter, order, page }: Pairs) {
  const rows = await neighboursOf(store, records, filter, order, page)
  return records.map(
    grouped(
      rows,
      (row) => row.record,
      (row) => ({ ...showNeighbours(row), position: neighbourPosition(order, row) }),
    ),
  )
}
export async function countNeighboursOf({ store }: Reading, records: readonly string[], filter: NeighbourFilter) {
  const counts = await countNeighbours(store, records, filter)
  return records.map((record) => counts.get(record) ?? 0)
}

export async function signaturesOf({ store }: Reading, records: readonly string[]) {
  return records.map(grouped(await many.signaturesOf(store, records), (row) => row.record, showSignature))
}

const byRecord = async (rows: Promise<readonly CapSum[]>, records: readonly string[]) =>
  records.map(
    grouped(
      await rows,
      (row) => row.record,
      ({ record, ...sum }) => sum,
    ),
  )
export const checkSumsOf = ({ store }: Reading, records: readonly string[]) =>
  byRecord(sumByCheck(store, records), records)
export const groundSumsOf = ({ store }: Reading, records: readonly string[]) =>
  byRecord(sumByGround(store, records), records)
export const pileTypeSumsOf = ({ store }: Reading, records: readonly string[]) =>
  byRecord(sumByPileType(store, records), records)
