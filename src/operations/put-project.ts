import { canonicalText, hashOf } from '../canonical.ts'
import { parse } from '../contract/parse.ts'
import { type ProjectRequest, projectRequest } from '../contract/stored-requests.ts'
import { Problem } from '../errors.ts'
import { type Actor, hasProject } from '../store/actor.ts'
import { putProject as put } from '../store/projects.ts'
import type { ProjectRow } from '../store/tables.ts'
import type { Office } from './office.ts'

/** What a client knows of the resource: the headers If-Match and If-None-Match as lists of tags. */
export type Preconditions = { readonly ifMatch?: readonly string[]; readonly ifNoneMatch?: readonly string[] }

export const showProject = (row: ProjectRow) => ({
  slug: row.slug,
  title: row.title,
  createdAt: row.created_at,
  updatedAt: row.updated_at,
  revision: row.revision,
})
export type ShownProject = ReturnType<typeof showProject>
export const projectTag = (row: ProjectRow): string => hashOf(showProject(row))

const SLUG = /^[a-z0-9]([a-z0-9-]{0,62}[a-z0-9])?$/

/** Throws `precondition-failed` and `precondition-required`. */
function guard(row: ProjectRow | undefined, { title }: ProjectRequest, { ifMatch, ifNoneMatch }: Preconditions): void {
  const failed = () => new Problem('precondition-failed', { etag: row ? `"${projectTag(row)}"` : 'none' })
  const names = (tags: readonly string[]) => row !== undefined && (tags.includes('*') || tags.includes(projectTag(row)))
  if (ifNoneMatch && names(ifNoneMatch)) throw failed()
  if (ifMatch && !names(ifMatch)) throw failed()
  if (row && !ifMatch && row.title !== title) throw new Problem('precondition-required')
}

/** Makes a project or changes its title. Throws `bad-project-slug`, `no-such-project` where the key has no right to it, and those of `guard`. */
export async function putProject({ store }: Office, actor: Actor, slug: string, input: unknown, given: Preconditions) {
  if (!SLUG.test(slug)) throw new Problem('bad-project-slug', { got: slug })
  if (!hasProject(actor, slug)) throw new Problem('no-such-project', { slug })
  const request = parse(projectRequest, input)
  // Refuses half a surrogate pair before anything is written.
  canonicalText(request)
  const { row, outcome } = await put(store, slug, request.title, (found) => guard(found, request, given))
  return { created: outcome === 'created', tag: projectTag(row), project: showProject(row) }
}
