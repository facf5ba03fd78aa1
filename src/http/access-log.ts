import { randomBytes } from 'node:crypto'
import type { FastifyInstance } from 'fastify'

const TRACEPARENT = /^[0-9a-f]{2}-([0-9a-f]{32})-[0-9a-f]{16}-[0-9a-f]{2}$/

/** The trace id of a W3C traceparent header, or a fresh one. */
export function traceIdOf(header: string | string[] | undefined): string {
  const found = typeof header === 'string' ? TRACEPARENT.exec(header)?.[1] : undefined
  return found && !/^0+$/.test(found) ? found : randomBytes(16).toString('hex')
}

/** One line for each request: trace id, route template, status, duration, id of the key, project. The request id is the trace id of the caller. */
export function accessLog(app: FastifyInstance): void {
  app.addHook('onResponse', async (request, reply) => {
    const route = request.routeOptions.url ?? 'unknown'
    request.log.info(
      {
        method: request.method,
        route,
        status: reply.statusCode,
        actor: request.actor?.key ?? undefined,
        project: request.project ?? (request.params as { slug?: string }).slug,
        durationMs: Math.round(reply.elapsedTime * 1000) / 1000,
      },
      'request',
    )
  })
}
