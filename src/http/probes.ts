import type { FastifyInstance } from 'fastify'
import { Problem } from '../errors.ts'

/** `/livez` says that the process runs, `/readyz` that it takes work: 503 as soon as it begins to stop. */
export function probes(app: FastifyInstance): void {
  let stopping = false
  app.addHook('preClose', async () => {
    stopping = true
  })
  app.get('/livez', async () => ({ status: 'ok' }))
  app.get('/readyz', async () => {
    if (stopping) throw new Problem('overloaded', { seconds: 1 })
    return { status: 'ok' }
  })
}
