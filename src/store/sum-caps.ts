import { sql } from 'kysely'
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

/** The groups of some records, each record's in the order of their names. */
async function sums(
  { reader }: Store,
  records: readonly string[],
  table: 'caps' | 'checks',
  name: 'ground' | 'pile_type' | 'check_kind',
): Promise<CapSum[]> {
  const [ordinal, combination] = table === 'caps' ? ['ordinal', 'governing_combination'] : ['cap', 'combination']
  const group = sql`partition by record, ${sql.ref(name)}`
  const ranked = reader
    .selectFrom(table)
    .where('record', 'in', records)
    .select([
      'record',
      'mark as cap',
      sql<string>`${sql.ref(name)}`.as('name'),
      sql<number | null>`utilisation`.as('largest'),
      sql<string | null>`${sql.ref(combination!)}`.as('combination'),
      sql<number>`count(*) over (${group})`.as('count'),
      sql<number>`sum(exceeded) over (${group})`.as('exceeded'),
      sql<number>`row_number() over (${group} order by coalesce(utilisation, -1) desc, ${sql.ref(ordinal!)})`.as(
        'place',
      ),
    ])
  const rows = await reader
    .selectFrom(ranked.as('ranked'))
    .selectAll()
    .where('place', '=', 1)
    .orderBy('record')
    .orderBy('name')
    .execute()
  return rows.map(({ record, cap, name, largest, combination, count, exceeded }) => ({
    record,
    name,
    count: Number(count),
    exceeded: Number(exceeded),
    largestUtilisation: largest,
    cap,
    combination,
  }))
}

export const sumByCheck = (store: Store, records: readonly string[]) => sums(store, records, 'checks', 'check_kind')
export const sumByGround = (store: Store, records: readonly string[]) => sums(store, records, 'caps', 'ground')
export const sumByPileType = (store: Store, records: readonly string[]) => sums(store, records, 'caps', 'pile_type')
