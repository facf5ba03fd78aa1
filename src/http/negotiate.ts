import type { FastifyInstance } from 'fastify'
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

type Range = { readonly type: string; readonly quality: number }

const rangesOf = (accept: string): Range[] =>
  accept.split(',').map((part) => {
    const [type = '', ...parameters] = part.split(';').map((p) => p.trim().toLowerCase())
    const quality = parameters.find((p) => p.startsWith('q='))?.slice(2)
    return { type, quality: quality === undefined ? 1 : Number(quality) || 0 }
  })

/** The quality of a type: that of the closest range that covers it. */
function qualityOf(type: string, ranges: readonly Range[]): number {
  const wider = [type, `${type.split('/')[0]}/*`, '*/*']
  for (const wanted of wider) {
    const found = ranges.find((range) => range.type === wanted)
    if (found) return found.quality
  }
  return 0
}

/** The offered type that an Accept header likes best; undefined where it takes none. */
export function preferred(accept: string | undefined, offered: readonly string[]): string | undefined {
  if (accept === undefined || accept.trim() === '') return offered[0]
  const ranges = rangesOf(accept)
  const rated = offered.map((type) => ({ type, quality: qualityOf(type, ranges) })).filter((r) => r.quality > 0)
  return rated.reduce<(typeof rated)[number] | undefined>((a, b) => (!a || b.quality > a.quality ? b : a), undefined)
    ?.type
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
