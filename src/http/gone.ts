import type { FastifyReply } from 'fastify'

/** Aborts when the client leaves. */
export function gone(reply: FastifyReply): AbortSignal {
  const left = new AbortController()
  reply.raw.on('close', () => left.abort())
  return left.signal
}
