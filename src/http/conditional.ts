import type { FastifyReply, FastifyRequest } from 'fastify'

/** The tags of If-Match or If-None-Match without their quotes; `*` stays. Undefined where there is no such header. */
export function tagsOf(header: string | undefined): string[] | undefined {
  if (header === undefined) return undefined
  return [...header.matchAll(/(?:W\/)?"([^"]*)"|\*/g)].map((found) => found[1] ?? '*')
}

/** Whether the client holds what has this tag. */
export const isHeld = (request: FastifyRequest, tag: string): boolean =>
  tagsOf(request.headers['if-none-match'])?.some((one) => one === '*' || one === tag) ?? false

/** Sends a body with its strong ETag, or 304 where the client holds it already. */
export function sendTagged(
  request: FastifyRequest,
  reply: FastifyReply,
  tag: string,
  body: () => string | Uint8Array,
): FastifyReply {
  reply.header('etag', `"${tag}"`).header('cache-control', 'private, no-cache')
  if (isHeld(request, tag)) return reply.code(304).send()
  return reply.type(`${request.accepted}; charset=utf-8`).send(body())
}
