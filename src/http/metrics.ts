import type { FastifyInstance } from 'fastify'
import { Counter, collectDefaultMetrics, Gauge, Histogram, Registry } from 'prom-client'

export type Load = { readonly busy: number; readonly queued: number }
/** What the store is asked for; each throws where it cannot be asked. */
export type Asked = {
  /** Bytes that it takes. */
  readonly size: () => Promise<number>
  /** Assessments that wait, run, or ended without a record, by state. */
  readonly jobs: () => Promise<Readonly<Record<string, number>>>
}

/**
 * `/metrics` for Prometheus. Series go by route template, so that ids and typing errors add none. Gives back what counts the
 * ends of jobs.
 */
export function metrics(app: FastifyInstance, engine: string, load: Load, store: Asked): (state: string) => void {
  const register = new Registry()
  collectDefaultMetrics({ register })
  const duration = new Histogram({
    name: 'kentledge_request_duration_seconds',
    help: 'Time to answer a request, by method, route template and status',
    labelNames: ['method', 'route', 'status'],
    buckets: [0.001, 0.005, 0.02, 0.05, 0.1, 0.5, 2, 10, 60],
    registers: [register],
  })
  const gauge = (name: string, help: string, value: () => number) =>
    new Gauge({
      name,
      help,
      registers: [register],
      collect: function () {
        this.set(value())
      },
    })
  gauge('kentledge_workers_busy', 'Worker threads at work', () => load.busy)
  gauge('kentledge_queue_depth', 'Assessments that wait for a worker thread', () => load.queued)
  const size = new Gauge({ name: 'kentledge_store_bytes', help: 'Size of the store', registers: [register] })
  const jobs = new Gauge({
    name: 'kentledge_jobs',
    help: 'Assessments that wait, run, or ended without a record, over all replicas',
    labelNames: ['state'],
    registers: [register],
  })
  const ended = new Counter({
    name: 'kentledge_jobs_ended_total',
    help: 'Assessments that this process brought to an end',
    labelNames: ['state'],
    registers: [register],
  })
  new Gauge({
    name: 'kentledge_build_info',
    help: 'Version of the engine',
    labelNames: ['engine'],
    registers: [register],
  }).set({ engine }, 1)
  app.addHook('onResponse', async (request, reply) => {
    const route = request.routeOptions.url ?? 'unknown'
    duration.observe({ method: request.method, route, status: reply.statusCode }, reply.elapsedTime / 1000)
  })
  app.get('/metrics', async (_, reply) => {
    // The other figures matter most while the store is away.
    size.set(await store.size().catch(() => Number.NaN))
    jobs.reset()
    for (const [state, count] of Object.entries(await store.jobs().catch(() => ({})))) jobs.set({ state }, count)
    return reply.type(register.contentType).send(await register.metrics())
  })
  return (state) => ended.inc({ state })
}
