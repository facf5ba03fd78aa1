import type { Scope } from '../operations/rights.ts'

/** What a key needs for a route: all of some scopes, any valid key, or no key at all. */
export type Access = readonly Scope[] | 'any key' | 'public'

/** Every route of the service, which a test holds to the routes there are. HEAD is as GET. */
export const access: Readonly<Record<string, Access>> = {
  'POST /v1/single-pile': ['calculate'],
  'POST /v1/block': ['calculate'],
  'POST /v1/group': ['calculate'],
  'POST /v1/settlement': ['calculate'],
  'POST /v1/assessments': ['calculate'],
  'POST /v1/replay': ['calculate'],
  'GET /v1/projects': ['read'],
  'GET /v1/projects/:slug': ['read'],
  'PUT /v1/projects/:slug': ['write'],
  'GET /v1/projects/:slug/assessments': ['read'],
  'POST /v1/projects/:slug/assessments': ['write'],
  'GET /v1/projects/:slug/integrity': ['read'],
  'GET /v1/assessments/:id': ['read'],
  'DELETE /v1/assessments/:id': ['write'],
  'GET /v1/assessments/:id/events': ['read'],
  'GET /v1/assessments/:id/content': ['read'],
  'GET /v1/assessments/:id/caps': ['read'],
  'GET /v1/assessments/:id/caps/:mark': ['read'],
  'GET /v1/projects/:slug/plan': ['read'],
  'GET /v1/assessments/:id/sheet': ['read'],
  'GET /v1/assessments/:id/caps/:mark/sheet': ['read'],
  'GET /v1/assessments/:id/piles': ['read'],
  'GET /v1/assessments/:id/piles.csv': ['read'],
  'GET /v1/assessments/:id/changes': ['read'],
  'GET /v1/assessments/:id/signatures': ['read'],
  'POST /v1/assessments/:id/signatures': ['read', 'sign'],
  'POST /v1/assessments/:id/reverify': ['read', 'calculate'],
  // The fields of a query need scopes of their own.
  'GET /graphql': 'any key',
  'POST /graphql': 'any key',
  'GET /v1/methods': 'public',
  'GET /v1/methods/:id': 'public',
  'GET /v1/sources': 'public',
  'GET /v1/limits': 'public',
  'GET /livez': 'public',
  'GET /readyz': 'public',
  'GET /metrics': 'public',
  'GET /problems/:code': 'public',
  'GET /openapi.json': 'public',
  'GET /print/plan.js': 'public',
}

/** Pages that hold nothing of anybody: the reference and the explorer, with their files. */
const pages = ['/reference', '/graphql/explorer']

/** What a route needs; one that nobody listed is for administrators. */
export function accessOf(method: string, url: string): Access {
  if (pages.some((page) => url === page || url.startsWith(`${page}/`))) return 'public'
  return access[`${method === 'HEAD' ? 'GET' : method} ${url}`] ?? ['admin']
}
