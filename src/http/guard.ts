import type { FastifyInstance } from 'fastify'
import type { Authenticate } from '../operations/authenticate.ts'
import { type Actor, needScope } from '../operations/rights.ts'
import { accessOf } from './access.ts'

declare module 'fastify' {
  interface FastifyRequest {
    /** Who asks; nobody on public routes. */
    actor: Actor | null
    /** The project that the request is about, for the log. */
    project: string | null
  }
}

/** Asks for a key and its scopes before a body is read. */
export function guard(app: FastifyInstance, authenticate: Authenticate): void {
  app.decorateRequest('actor', null)
  app.decorateRequest('project', null)
  app.addHook('onRequest', async (request) => {
    const { url } = request.routeOptions
    const needed = url === undefined ? 'public' : accessOf(request.method, url)
    if (needed === 'public') return
    request.actor = await authenticate(request.headers.authorization)
    if (needed === 'any key') return
    for (const scope of needed) needScope(request.actor, scope)
  })
}
