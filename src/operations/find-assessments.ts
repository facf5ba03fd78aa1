import { Problem } from '../errors.ts'
import type { Actor } from '../store/actor.ts'
import {
  countRecords,
  findRecords,
  type RecordFilter,
  type RecordOrder,
  type RecordPosition,
  recordPosition,
  sumRecords,
} from '../store/find-records.ts'
import type { Page } from '../store/page.ts'
import { listName } from './cursors.ts'
import type { Office } from './office.ts'
import { showRecord } from './show-record.ts'

export { recordOrders } from '../store/find-records.ts'
export type { RecordFilter, RecordOrder, RecordPosition }

export const assessmentList = (filter: RecordFilter, order: RecordOrder): string =>
  listName('assessments', '', { ...filter, order })

/** A time of a filter as the store has it. Throws `bad-query`. */
export function timeOf(field: string, got: string): string {
  const read = /^\d{4}-\d{2}-\d{2}(T\d{2}:\d{2}(:\d{2}(\.\d{1,9})?)?(Z|[+-]\d{2}:\d{2}))?$/.test(got)
  const time = read ? new Date(got) : undefined
  if (!time || Number.isNaN(time.getTime()))
    throw new Problem('bad-query', { field, expected: 'a day, or a time with its zone (ISO 8601)', got })
  return time.toISOString()
}

/** Assessments of every project that the actor has a right to, each with its place in the list. */
export async function findAssessments(
  { store }: Pick<Office, 'store'>,
  actor: Actor,
  filter: RecordFilter,
  order: RecordOrder,
  page: Page<RecordPosition>,
) {
  const rows = await findRecords(store, actor, filter, order, page)
  return rows.map((row) => ({ ...showRecord(row), position: recordPosition(filter, order, row) }))
}

export const countAssessments = async ({ store }: Pick<Office, 'store'>, actor: Actor, filter: RecordFilter) =>
  (await countRecords(store, actor, filter)).get('')!

/** Counts and the largest utilisation over them, as a whole and by the check that is the worst. */
export const sumAssessments = async ({ store }: Pick<Office, 'store'>, actor: Actor, filter: RecordFilter) =>
  (await sumRecords(store, actor, filter)).get('')!
