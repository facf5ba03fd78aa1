import type { FastifyInstance } from 'fastify'

/**
 * `/livez` says that the process runs, and asks nobody else. `/readyz` says that it takes work: it fails where the store cannot
 * be written, and while the service stops its drain answers 503.
 */
export function probes(app: FastifyInstance, probeStore: () => Promise<void>): void {
  app.get('/livez', async () => ({ status: 'ok' }))
  app.get('/readyz', async () => {
    await probeStore()
    return { status: 'ok' }
  })
}
