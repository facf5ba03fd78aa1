import { readFile } from 'node:fs/promises'
import type { FastifyInstance } from 'fastify'

const files = [
  { url: '/graphql/explorer', file: 'explorer.html', type: 'text/html; charset=utf-8' },
  { url: '/graphql/explorer/explorer.js', file: 'explorer.js', type: 'text/javascript; charset=utf-8' },
  { url: '/graphql/explorer/explorer.css', file: 'explorer.css', type: 'text/css; charset=utf-8' },
] as const

/** Nothing but what this service serves; no inline script or style, no frame. */
const policy = [
  "default-src 'none'",
  "script-src 'self'",
  "style-src 'self'",
  "connect-src 'self'",
  "base-uri 'none'",
  "form-action 'none'",
  "frame-ancestors 'none'",
].join('; ')

/** A page to try queries on, of three files and without the network. */
export async function explorerRoute(app: FastifyInstance): Promise<void> {
  for (const { url, file, type } of files) {
    const body = await readFile(new URL(file, import.meta.url))
    app.get(url, async (_request, reply) =>
      reply
        .header('content-security-policy', policy)
        .header('x-content-type-options', 'nosniff')
        .header('referrer-policy', 'no-referrer')
        .type(type)
        .send(body),
    )
  }
}
