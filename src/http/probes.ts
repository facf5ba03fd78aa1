import type { FastifyInstance } from 'fastify'

/** `/livez` says that the process runs, `/readyz` that it takes work: while the service stops, its drain answers 503. */
export function probes(app: FastifyInstance): void {
  app.get('/livez', async () => ({ status: 'ok' }))
  app.get('/readyz', async () => ({ status: 'ok' }))
}
