import { type RawBuilder, sql } from 'kysely'
import type { Store } from './open-store.ts'

/** Caps or checks of a record that share a name: how many, how many of them exceeded, and where the utilisation is largest. */
export type CapSum = {
  readonly record: string
  readonly name: string
  readonly count: number
  readonly exceeded: number
  readonly largestUtilisation: number | null
  readonly cap: string
  readonly combination: string | null
}

/** What is summed: by which column, with which figure, and where its place in the schedule stands. */
type Summed = {
  readonly table: RawBuilder<unknown>
  readonly name: RawBuilder<unknown>
  readonly figure: RawBuilder<unknown>
  readonly combination: RawBuilder<unknown>
  readonly place: RawBuilder<unknown>
}
const checks: Summed = {
  table: sql`checks`,
  name: sql`check_kind`,
  figure: sql`utilisation`,
  combination: sql`combination`,
  place: sql`cap`,
}
// Only caps may be without a utilisation. Of checks the index holds the figure as it is.
const capsBy = (name: RawBuilder<unknown>): Summed => ({
  table: sql`caps`,
  name,
  figure: sql`coalesce(utilisation, -1)`,
  combination: sql`governing_combination`,
  place: sql`ordinal`,
})

/**
 * The groups of some records, each record's in the order of their names. They are counted first, and the row of the largest is
 * looked up: with a rank over every row it takes ten times as long.
 */
async function sums(
  { reader }: Store,
  records: readonly string[],
  { table, name, figure, combination, place }: Summed,
): Promise<CapSum[]> {
  const list = sql.join(records)
  const { rows } = await sql<CapSum>`
    select sums.record, sums.name, sums.count, sums.exceeded, lines.utilisation as "largestUtilisation", lines.cap, lines.combination
    from (select record, ${name} as name, count(*) as count, sum(exceeded) as exceeded, max(${figure}) as largest
      from ${table} where record in (${list}) group by record, ${name}) as sums
    join (select record, ${name} as name, ${figure} as figure, utilisation, mark as cap, ${combination} as combination,
      ${place} as place from ${table} where record in (${list})) as lines
      on lines.record = sums.record and lines.name = sums.name and lines.figure = sums.largest
    order by sums.record, sums.name, lines.place`.execute(reader)
  // Of several that are as large, the first of the schedule.
  return rows
    .filter((row, i) => row.record !== rows[i - 1]?.record || row.name !== rows[i - 1]?.name)
    .map((row) => ({ ...row, count: Number(row.count), exceeded: Number(row.exceeded) }))
}

export const sumByCheck = (store: Store, records: readonly string[]) => sums(store, records, checks)
export const sumByGround = (store: Store, records: readonly string[]) => sums(store, records, capsBy(sql`ground`))
export const sumByPileType = (store: Store, records: readonly string[]) => sums(store, records, capsBy(sql`pile_type`))
