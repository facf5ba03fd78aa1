import { type Kysely, type RawBuilder, sql } from 'kysely'
import type { Store } from './open-store.ts'
import type { Page } from './page.ts'
import type { CapRow, Tables } from './tables.ts'

const flat = [
  'caps.record',
  'caps.mark',
  'caps.ordinal',
  'caps.ground',
  'caps.pile_type',
  'caps.pile_count',
  'caps.x',
  'caps.y',
  'caps.governing_check',
  'caps.governing_combination',
  'caps.utilisation',
  'caps.exceeded',
  'caps.settlement',
  'caps.tilt',
  'caps.stiffness_vertical',
  'caps.stiffness_rocking_x',
  'caps.stiffness_rocking_y',
] as const
export type CapLine = Omit<CapRow, 'body'>
/** A cap with its place in the order of the list. */
export type RankedCap = CapLine & { readonly rank: string | number }

export type CapFilter = {
  /** With a kind of check, utilisation and exceeded are those of this check. */
  readonly check?: string
  readonly utilisationAtLeast?: number
  readonly exceeded?: boolean
  readonly ground?: string
  readonly pileType?: string
  /** A part of the mark. */
  readonly mark?: string
}

/** As the schedule has them; by mark; the largest utilisation or settlement first. */
export const capOrders = ['schedule', 'mark', 'utilisation', 'settlement'] as const
export type CapOrder = (typeof capOrders)[number]
/** The ordinal, the mark, or the figure and the ordinal. */
export type CapPosition = number | string | readonly [number, number]

const falls = (order: CapOrder) => order === 'utilisation' || order === 'settlement'
export const capPosition = (order: CapOrder, cap: RankedCap): CapPosition =>
  falls(order) ? [cap.rank as number, cap.ordinal] : cap.rank

/** What stands in the list of some records, without order. */
function filtered(reader: Kysely<Tables>, records: readonly string[], filter: CapFilter) {
  const { check, utilisationAtLeast: least, exceeded, ground, pileType, mark } = filter
  const flag = exceeded ? 1 : 0
  let query = reader
    .selectFrom('caps')
    .$if(check !== undefined, (q) =>
      q.innerJoin('checks', (join) =>
        join
          .onRef('checks.record', '=', 'caps.record')
          .onRef('checks.cap', '=', 'caps.ordinal')
          .on('checks.check_kind', '=', check!),
      ),
    )
    .where('caps.record', 'in', records)
  const own = check === undefined ? 'caps' : 'checks'
  if (least !== undefined) query = query.where(sql.ref(`${own}.utilisation`), '>=', least)
  if (exceeded !== undefined) query = query.where(sql.ref(`${own}.exceeded`), '=', flag)
  if (ground !== undefined) query = query.where('caps.ground', '=', ground)
  if (pileType !== undefined) query = query.where('caps.pile_type', '=', pileType)
  // Neither database has a search for a part of a text that the other one has too; this tells capitals from small letters in both.
  if (mark) query = query.where(sql<boolean>`replace(caps.mark, ${mark}, '') <> caps.mark`)
  return query
}

function rankOf(order: CapOrder, { check }: CapFilter): RawBuilder<string | number> {
  if (order === 'schedule') return sql`caps.ordinal`
  if (order === 'mark') return sql`caps.mark`
  if (order === 'settlement') return sql`coalesce(caps.settlement, -1)`
  return check === undefined ? sql`coalesce(caps.utilisation, -1)` : sql`checks.utilisation`
}

/** The same page of the caps of each record, in one query. */
export async function listCaps(
  { reader }: Store,
  records: readonly string[],
  filter: CapFilter,
  order: CapOrder,
  { limit, after }: Page<CapPosition>,
): Promise<RankedCap[]> {
  const rank = rankOf(order, filter)
  let query = filtered(reader, records, filter).select(flat).select(rank.as('rank'))
  if (after !== undefined)
    query = falls(order)
      ? query.where(sql<boolean>`(${rank}, caps.ordinal) < (${sql.join(after as readonly number[])})`)
      : query.where(rank, '>', after as never)
  const sorted = falls(order) ? sql`${rank} desc, caps.ordinal desc` : sql`${rank}`
  if (records.length === 1) return query.orderBy(sorted).limit(limit).execute()
  const place = sql<number>`row_number() over (partition by caps.record order by ${sorted})`
  const page = reader
    .selectFrom(query.select(place.as('place')).as('page'))
    .selectAll()
    .where('place', '<=', limit)
  return (await page.orderBy('record').orderBy('place').execute()) as unknown as RankedCap[]
}

/** How many caps of each record the filter lets through. */
export async function countCaps({ reader }: Store, records: readonly string[], filter: CapFilter) {
  const rows = await filtered(reader, records, filter)
    .select(['caps.record', ({ fn }) => fn.countAll().as('count')])
    .groupBy('caps.record')
    .execute()
  return new Map(rows.map((row) => [row.record, Number(row.count)]))
}
