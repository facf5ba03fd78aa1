export const scopes = ['calculate', 'read', 'write', 'sign', 'admin'] as const
export type Scope = (typeof scopes)[number]

/** Who asks: a named person or pipeline, by which key, and what the key allows. */
export type Actor = {
  readonly name: string
  /** Id of the key; null where the service runs without keys. */
  readonly key: string | null
  readonly scopes: readonly Scope[]
  /** Slugs, or `*` for all. */
  readonly projects: readonly string[]
}

/** Everybody, where the service runs without keys. */
export const anonymous: Actor = { name: 'anonymous', key: null, scopes: ['admin'], projects: ['*'] }

/** `admin` holds every scope. */
export const hasScope = (actor: Actor, scope: Scope): boolean =>
  actor.scopes.includes(scope) || actor.scopes.includes('admin')
export const hasProject = (actor: Pick<Actor, 'projects'>, slug: string): boolean =>
  actor.projects.includes('*') || actor.projects.includes(slug)
