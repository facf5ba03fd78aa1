import { type Actor, hasProject } from './actor.ts'
import { NOTHING } from './chain.ts'
import type { Store } from './open-store.ts'
import type { Page } from './page.ts'
import type { ProjectRow } from './tables.ts'

export const findProject = (store: Store, slug: string): Promise<ProjectRow | undefined> =>
  store.reader.selectFrom('projects').selectAll().where('slug', '=', slug).executeTakeFirst()

/** What became of a PUT: the row now, and how. */
export type Put = { readonly row: ProjectRow; readonly outcome: 'created' | 'same' | 'changed' }

/** Makes a project, or changes its title. `guard` sees the row as it is, under its lock, and throws where it must not change. */
export function putProject(
  store: Store,
  slug: string,
  title: string,
  guard: (row: ProjectRow | undefined) => void = () => undefined,
): Promise<Put> {
  return store.db.transaction().execute(async (trx): Promise<Put> => {
    const now = store.clock().toISOString()
    const found = await store.capabilities.lockProject(trx, slug)
    if (!found) {
      const row = { slug, title, created_at: now, updated_at: now, revision: 0, head: NOTHING }
      guard(undefined)
      const made = await trx
        .insertInto('projects')
        .values(row)
        .onConflict((c) => c.doNothing())
        .returning('slug')
        .executeTakeFirst()
      if (made) return { row, outcome: 'created' }
    }
    // Another replica made it between the two statements.
    const here = found ?? (await store.capabilities.lockProject(trx, slug))!
    guard(here)
    if (here.title === title) return { row: here, outcome: 'same' }
    const row = { ...here, title, updated_at: now }
    await trx.updateTable('projects').set({ title, updated_at: now }).where('slug', '=', slug).execute()
    return { row, outcome: 'changed' }
  })
}

/** Projects that the actor has a right to, by slug. */
export async function listProjects(store: Store, actor: Actor, page: Page<string>): Promise<ProjectRow[]> {
  let query = store.reader.selectFrom('projects').selectAll().orderBy('slug').limit(page.limit)
  if (!actor.projects.includes('*')) query = query.where('slug', 'in', [...actor.projects, ''])
  if (page.after !== undefined) query = query.where('slug', '>', page.after)
  return (await query.execute()).filter((row) => hasProject(actor, row.slug))
}

/** How many projects the actor has a right to. */
export async function countProjects(store: Store, actor: Actor): Promise<number> {
  let query = store.reader.selectFrom('projects').select(({ fn }) => fn.countAll().as('count'))
  if (!actor.projects.includes('*')) query = query.where('slug', 'in', [...actor.projects, ''])
  return Number((await query.executeTakeFirstOrThrow()).count)
}
