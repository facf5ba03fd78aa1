import type { Actor } from '../store/actor.ts'
import type { Page } from '../store/page.ts'
import { countProjects as count, listProjects as list } from '../store/projects.ts'
import { listName } from './cursors.ts'
import type { Office } from './office.ts'
import { projectTag, showProject } from './put-project.ts'
import { ownProject } from './rights.ts'

export const projectList = listName('projects', '')

/** Projects that the actor has a right to, by slug. */
export const listProjects = async ({ store }: Office, actor: Actor, page: Page<string>) =>
  (await list(store, actor, page)).map(showProject)

export const countProjects = ({ store }: Office, actor: Actor): Promise<number> => count(store, actor)

export async function getProject(office: Office, actor: Actor, slug: string) {
  const row = await ownProject(office, actor, slug)
  return { tag: projectTag(row), project: showProject(row) }
}
