import { type Kysely, sql } from 'kysely'
import { type Actor, hasProject } from './actor.ts'
import type { Store } from './open-store.ts'
import type { Page } from './page.ts'
import { headColumns, type RecordHead } from './read-records.ts'
import type { Tables } from './tables.ts'

export type RecordFilter = {
  readonly project?: string
  /** Made at this time or later, and before that one: ISO 8601, UTC. */
  readonly from?: string
  readonly to?: string
  /** Whether any cap is exceeded. */
  readonly exceeded?: boolean
  /** True: only the newest revision of each project. */
  readonly latest?: boolean
}

export const recordOrders = ['oldest', 'newest', 'utilisation'] as const
export type RecordOrder = (typeof recordOrders)[number]
/** In one project the revision; elsewhere time and id; by utilisation, largest first, that and the id. */
export type RecordPosition = number | readonly [string | number, string]

const rank = sql<number>`coalesce(records.worst_utilisation, -1)`

export function recordPosition({ project }: RecordFilter, order: RecordOrder, record: RecordHead): RecordPosition {
  if (order === 'utilisation') return [record.worst_utilisation ?? -1, record.id]
  return project === undefined ? [record.created_at, record.id] : record.revision
}

/** What an actor may see of the filter's records. */
function filtered(reader: Kysely<Tables>, actor: Actor, { project, from, to, exceeded, latest }: RecordFilter) {
  let query = reader.selectFrom('records')
  if (project !== undefined) query = query.where('records.project', '=', hasProject(actor, project) ? project : '')
  else if (!actor.projects.includes('*')) query = query.where('records.project', 'in', [...actor.projects, ''])
  if (from !== undefined) query = query.where('records.created_at', '>=', from)
  if (to !== undefined) query = query.where('records.created_at', '<', to)
  if (exceeded !== undefined) query = query.where('records.exceeded', exceeded ? '>' : '=', 0)
  if (latest)
    query = query.innerJoin('projects', (join) =>
      join.onRef('projects.slug', '=', 'records.project').onRef('projects.revision', '=', 'records.revision'),
    ) as unknown as typeof query
  return query
}

const columns = headColumns.map((column) => `records.${column}` as const)

/** Records that the actor has a right to. */
export function findRecords(
  { reader }: Store,
  actor: Actor,
  filter: RecordFilter,
  order: RecordOrder,
  { limit, after }: Page<RecordPosition>,
): Promise<RecordHead[]> {
  let query = filtered(reader, actor, filter).select(columns).limit(limit)
  const key =
    order === 'utilisation' ? [rank, sql.ref('records.id')] : [sql.ref('records.created_at'), sql.ref('records.id')]
  if (order !== 'utilisation' && filter.project !== undefined) key.splice(0, 2, sql.ref('records.revision'))
  const way = order === 'oldest' ? sql`asc` : sql`desc`
  if (after !== undefined) {
    const further = order === 'oldest' ? sql`>` : sql`<`
    const values = typeof after === 'number' ? [after] : after
    query = query.where(sql<boolean>`(${sql.join(key)}) ${further} (${sql.join(values)})`)
  }
  for (const part of key) query = query.orderBy(sql`${part} ${way}`)
  return query.execute()
}

/** How many records there are, with how many caps; how many have caps that are exceeded, and how many. */
export async function sumRecords({ reader }: Store, actor: Actor, filter: RecordFilter) {
  const sums = await filtered(reader, actor, filter)
    .select(({ fn }) => [
      fn.countAll().as('count'),
      fn.sum('records.caps').as('caps'),
      fn.sum('records.exceeded').as('capsExceeded'),
      sql<number>`sum(case when records.exceeded > 0 then 1 else 0 end)`.as('exceeded'),
      fn.max('records.worst_utilisation').as('largest'),
    ])
    .executeTakeFirstOrThrow()
  return {
    assessments: Number(sums.count),
    exceeded: Number(sums.exceeded ?? 0),
    caps: Number(sums.caps ?? 0),
    capsExceeded: Number(sums.capsExceeded ?? 0),
    largestUtilisation: sums.largest,
  }
}

export async function countRecords({ reader }: Store, actor: Actor, filter: RecordFilter): Promise<number> {
  const { count } = await filtered(reader, actor, filter)
    .select(({ fn }) => fn.countAll().as('count'))
    .executeTakeFirstOrThrow()
  return Number(count)
}

/** Records by the check that is their worst: how many, how many of them exceeded, and the largest utilisation. */
export async function sumRecordsByCheck({ reader }: Store, actor: Actor, filter: RecordFilter) {
  const rows = await filtered(reader, actor, filter)
    .select(({ fn }) => [
      'records.worst_check as check',
      fn.countAll().as('count'),
      sql<number>`sum(case when records.exceeded > 0 then 1 else 0 end)`.as('exceeded'),
      fn.max('records.worst_utilisation').as('largest'),
    ])
    .where('records.worst_check', 'is not', null)
    .groupBy('records.worst_check')
    .orderBy('records.worst_check')
    .execute()
  return rows.map(({ check, count, exceeded, largest }) => ({
    check: check!,
    count: Number(count),
    exceeded: Number(exceeded),
    largestUtilisation: largest!,
  }))
}
