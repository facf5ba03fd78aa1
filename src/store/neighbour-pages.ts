import { type Kysely, sql } from 'kysely'
import type { Store } from './open-store.ts'
import type { Page } from './page.ts'
import type { NeighbourRow, Tables } from './tables.ts'

export type NeighbourFilter = {
  readonly exceeded?: boolean
  /** Mark of one of the two. */
  readonly cap?: string
}
/** As computed; the steepest pair first. */
export const neighbourOrders = ['schedule', 'distortion'] as const
export type NeighbourOrder = (typeof neighbourOrders)[number]
export type NeighbourPosition = number | readonly [number, number]

export const neighbourPosition = (order: NeighbourOrder, row: NeighbourRow): NeighbourPosition =>
  order === 'schedule' ? row.ordinal : [row.angular_distortion, row.ordinal]

function filtered(reader: Kysely<Tables>, records: readonly string[], { exceeded, cap }: NeighbourFilter) {
  let query = reader.selectFrom('neighbours').where('record', 'in', records)
  if (exceeded !== undefined) query = query.where('exceeded', '=', exceeded ? 1 : 0)
  if (cap !== undefined) query = query.where(({ eb, or }) => or([eb('a', '=', cap), eb('b', '=', cap)]))
  return query
}

/** The same page of the pairs of each record, in one query. */
export async function neighboursOf(
  { reader }: Store,
  records: readonly string[],
  filter: NeighbourFilter,
  order: NeighbourOrder,
  { limit, after }: Page<NeighbourPosition>,
): Promise<NeighbourRow[]> {
  const key = sql`angular_distortion desc, ordinal desc`
  const sorted = order === 'schedule' ? sql`ordinal` : key
  const place = sql<number>`row_number() over (partition by record order by ${sorted})`
  let rows = filtered(reader, records, filter).selectAll().select(place.as('place'))
  if (typeof after === 'number') rows = rows.where('ordinal', '>', after)
  else if (after) rows = rows.where(sql<boolean>`(angular_distortion, ordinal) < (${sql.join(after)})`)
  const page = reader.selectFrom(rows.as('page')).selectAll().where('place', '<=', limit)
  return (await page.orderBy('record').orderBy('place').execute()).map(({ place, ...row }) => row)
}

export async function countNeighbours({ reader }: Store, records: readonly string[], filter: NeighbourFilter) {
  const rows = await filtered(reader, records, filter)
    .select(['record', ({ fn }) => fn.countAll().as('count')])
    .groupBy('record')
    .execute()
  return new Map(rows.map((row) => [row.record, Number(row.count)]))
}
