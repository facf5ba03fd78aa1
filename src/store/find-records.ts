import { type Kysely, sql } from 'kysely'
import { type Actor as AnyActor, hasProject } from './actor.ts'
import type { Store } from './open-store.ts'
import type { Page } from './page.ts'
import { headColumns, type RecordHead } from './read-records.ts'
import type { Tables } from './tables.ts'

type Actor = Pick<AnyActor, 'projects'>

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
  // As a list: a join would read every record to find these few.
  if (latest)
    query = query.where(sql<boolean>`(records.project, records.revision) in (select slug, revision from projects)`)
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

type Sums = {
  readonly count: number
  readonly exceeded: number
  readonly caps: number
  readonly capsExceeded: number
  readonly largestUtilisation: number | null
}
export type CheckSums = Pick<Sums, 'count' | 'exceeded'> & {
  readonly check: string
  readonly largestUtilisation: number
}
export type RecordSums = Sums & { readonly byWorstCheck: readonly CheckSums[] }

/**
 * Counts and the largest utilisation over the records of the filter, as a whole and by the check that is a record's worst: of each
 * of some projects (by slug), or of all together (by an empty name).
 */
export async function sumRecords(
  { reader }: Store,
  actor: Actor,
  filter: RecordFilter,
  projects?: readonly string[],
): Promise<ReadonlyMap<string, RecordSums>> {
  const of = projects ? sql<string>`records.project` : sql<string>`''`
  let query = filtered(reader, actor, filter).select(({ fn }) => [
    of.as('of'),
    'records.worst_check as check',
    fn.countAll().as('count'),
    fn.sum('records.caps').as('caps'),
    fn.sum('records.exceeded').as('capsExceeded'),
    sql<number>`sum(case when records.exceeded > 0 then 1 else 0 end)`.as('exceeded'),
    fn.max('records.worst_utilisation').as('largest'),
  ])
  if (projects) query = query.where('records.project', 'in', projects).groupBy('records.project')
  const rows = await query.groupBy('records.worst_check').orderBy('records.worst_check').execute()
  const none: RecordSums = {
    count: 0,
    exceeded: 0,
    caps: 0,
    capsExceeded: 0,
    largestUtilisation: null,
    byWorstCheck: [],
  }
  const sums = new Map((projects ?? ['']).map((slug) => [slug, none]))
  for (const row of rows) {
    const [count, exceeded, before] = [Number(row.count), Number(row.exceeded), sums.get(row.of)!]
    const largest =
      row.largest === null ? null : { check: row.check!, count, exceeded, largestUtilisation: row.largest }
    sums.set(row.of, {
      count: before.count + count,
      exceeded: before.exceeded + exceeded,
      caps: before.caps + Number(row.caps),
      capsExceeded: before.capsExceeded + Number(row.capsExceeded),
      largestUtilisation:
        row.largest === null ? before.largestUtilisation : Math.max(before.largestUtilisation ?? 0, row.largest),
      byWorstCheck: largest ? [...before.byWorstCheck, largest] : before.byWorstCheck,
    })
  }
  return sums
}

/** How many records the filter lets through, of each of some projects or of all together. */
export async function countRecords(store: Store, actor: Actor, filter: RecordFilter, projects?: readonly string[]) {
  let query = filtered(store.reader, actor, filter).select(({ fn }) => [
    (projects ? sql<string>`records.project` : sql<string>`''`).as('of'),
    fn.countAll().as('count'),
  ])
  if (projects) query = query.where('records.project', 'in', projects).groupBy('records.project')
  return new Map((await query.execute()).map((row) => [row.of, Number(row.count)]))
}

/** The same page of the records of each project, in one query. The actor has a right to them. */
export async function findRecordsOf(
  store: Store,
  projects: readonly string[],
  filter: Omit<RecordFilter, 'project'>,
  order: RecordOrder,
  page: Page<RecordPosition>,
): Promise<RecordHead[]> {
  const everybody = { projects: ['*'] }
  const [only] = projects
  if (projects.length === 1) return findRecords(store, everybody, { ...filter, project: only! }, order, page)
  const key = order === 'utilisation' ? sql`${rank} desc, records.id desc` : sql`records.revision`
  const sorted = order === 'newest' ? sql`${key} desc` : key
  const place = sql<number>`row_number() over (partition by records.project order by ${sorted})`
  const rows = filtered(store.reader, everybody, filter)
    .select(columns)
    .select(place.as('place'))
    .where('records.project', 'in', projects)
  const list = store.reader.selectFrom(rows.as('page')).selectAll().where('place', '<=', page.limit)
  return (await list.orderBy('project').orderBy('place').execute()).map(({ place, ...row }) => row)
}
