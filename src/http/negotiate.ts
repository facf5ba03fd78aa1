import type { FastifyInstance } from 'fastify'
import { preferred } from '../contract/accepted.ts'
import { Problem } from '../errors.ts'

declare module 'fastify' {
  interface FastifyContextConfig {
    /** Media types that the route answers in, the preferred first; JSON where none are named. */
    produces?: readonly string[]
  }
  interface FastifyRequest {
    /** The media type that the client likes best among those. */
    accepted: string
  }
}

/** Version 1 answers in the type that the client accepts, or with a 406. */
export function negotiate(app: FastifyInstance): void {
  app.decorateRequest('accepted', 'application/json')
  app.addHook('onRequest', async (request, reply) => {
    const { url, config } = request.routeOptions
    if (!url?.startsWith('/v1/')) return
    reply.header('vary', 'Accept')
    const accepted = preferred(request.headers.accept, config.produces ?? ['application/json'])
    if (!accepted) throw new Problem('not-acceptable')
    request.accepted = accepted
  })
}
