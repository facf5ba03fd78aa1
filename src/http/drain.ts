import type { FastifyInstance } from 'fastify'
import { Problem } from '../errors.ts'

export type Drain = {
  readonly stopping: boolean
  /** From now on new requests are refused; resolves when those under way have been answered. */
  readonly begin: () => Promise<void>
}

/** Lets a service stop without losing a request: those begun finish, new ones get a 503 on a connection that closes. */
export function drain(app: FastifyInstance): Drain {
  let stopping = false
  let underWay = 0
  let empty: (() => void) | undefined
  app.addHook('onRequest', async (request, reply) => {
    underWay++
    // `close` comes once, whether the answer was sent or the client left.
    reply.raw.once('close', () => {
      underWay--
      if (underWay === 0) empty?.()
    })
    if (!stopping || request.url === '/livez') return
    reply.header('connection', 'close')
    throw new Problem('overloaded', { seconds: 1 })
  })
  return {
    get stopping() {
      return stopping
    },
    begin: () => {
      stopping = true
      return new Promise((resolve) => {
        empty = resolve
        if (underWay === 0) resolve()
      })
    },
  }
}
