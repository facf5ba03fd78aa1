import type { Store } from './open-store.ts'
import type { Page } from './page.ts'
import type { RecordRow } from './tables.ts'

/** Columns of a record without its compressed parts. */
export const headColumns = [
  'id',
  'project',
  'revision',
  'title',
  'created_at',
  'actor',
  'actor_key',
  'engine',
  'request_hash',
  'content_hash',
  'trace_hash',
  'previous_hash',
  'record_hash',
  'caps',
  'satisfied',
  'exceeded',
  'worst_cap',
  'worst_check',
  'worst_combination',
  'worst_utilisation',
  'summary',
] as const
export type RecordHead = Pick<RecordRow, (typeof headColumns)[number]>

export const findRecord = (store: Store, id: string): Promise<RecordHead | undefined> =>
  store.reader.selectFrom('records').select(headColumns).where('id', '=', id).executeTakeFirst()

/** The record of a revision of a project. */
export const findRevision = (store: Store, project: string, revision: number): Promise<RecordHead | undefined> =>
  store.reader
    .selectFrom('records')
    .select(headColumns)
    .where('project', '=', project)
    .where('revision', '=', revision)
    .executeTakeFirst()

/** The record with its request, outcome and notices. */
export const findWholeRecord = (store: Store, id: string): Promise<RecordRow | undefined> =>
  store.reader.selectFrom('records').selectAll().where('id', '=', id).executeTakeFirst()

/** Ids of the revisions right before and after one, where there are any. */
export async function adjacentRecords(store: Store, project: string, revision: number) {
  const rows = await store.reader
    .selectFrom('records')
    .select(['id', 'revision'])
    .where('project', '=', project)
    .where('revision', 'in', [revision - 1, revision + 1])
    .execute()
  const at = (wanted: number) => rows.find((row) => row.revision === wanted)?.id
  return { before: at(revision - 1), after: at(revision + 1) }
}

/** Records of a project, oldest first, so that a walk misses none that is added meanwhile. */
export function listRecords(store: Store, project: string, page: Page<number>): Promise<RecordHead[]> {
  let query = store.reader.selectFrom('records').select(headColumns).where('project', '=', project)
  if (page.after !== undefined) query = query.where('revision', '>', page.after)
  return query.orderBy('revision').limit(page.limit).execute()
}
