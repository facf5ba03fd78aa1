import fastify, { type FastifyInstance, LogController } from 'fastify'
import type { Config } from './config.ts'
import { readExamples } from './contract/examples.ts'
import { limits } from './contract/limits.ts'
import { openapi } from './contract/openapi.ts'
import { engineVersion } from './engine/index.ts'
import { Problem } from './errors.ts'
import { graphqlPlugin } from './graphql/plugin.ts'
import { accessLog, traceIdOf } from './http/access-log.ts'
import { answerClientError } from './http/client-errors.ts'
import { type Drain, drain } from './http/drain.ts'
import { metrics } from './http/metrics.ts'
import { pageScripts } from './http/pages.ts'
import { probes } from './http/probes.ts'
import { problems, sendProblem } from './http/problems.ts'
import { reference } from './http/reference.ts'
import { assessments } from './http/v1/assessments.ts'
import { calculators } from './http/v1/calculators.ts'
import { WorkerPool } from './jobs/pool.ts'
import type { AssessTask } from './operations/assess-in-thread.ts'
import { getMethod, listMethods, listSources } from './operations/list-methods.ts'
import { replayTrace } from './operations/replay-trace.ts'

export type Service = { readonly app: FastifyInstance; readonly stop: Drain }

/** Composes the service, in reading order. */
export async function buildService(config: Config): Promise<Service> {
  const app = fastify({
    logger: { level: config.LOG_LEVEL },
    bodyLimit: config.BODY_LIMIT,
    requestTimeout: config.REQUEST_TIMEOUT * 1000,
    // Slow requests are looked for every second (by default every half minute); Node finds none when headers may take longer than the whole.
    http: { connectionsCheckingInterval: 1000, headersTimeout: config.REQUEST_TIMEOUT * 1000 },
    clientErrorHandler: answerClientError,
    genReqId: (request) => traceIdOf(request.headers.traceparent),
    logController: new LogController({ requestIdLogLabel: 'traceId', disableRequestLogging: true }),
    return503OnClosing: false,
    // The strict schemas name these fields like any other unknown one.
    onProtoPoisoning: 'ignore',
    onConstructorPoisoning: 'ignore',
    // An unreadable URL never reaches the error handler.
    frameworkErrors: (error, _request, reply) =>
      sendProblem(reply, new Problem('malformed-url', { reason: error.message })),
  })
  app.removeContentTypeParser('text/plain')
  const entry = new URL('./operations/assess-in-thread.ts', import.meta.url)
  const pool = new WorkerPool<AssessTask>({
    entry,
    name: 'assessInThread',
    workers: config.WORKERS,
    queue: config.WORK_QUEUE,
    seconds: config.WORK_TIMEOUT,
  })
  app.addHook('onClose', () => pool.close())
  problems(app, config.BODY_LIMIT)
  const stop = drain(app)
  accessLog(app)
  metrics(app, engineVersion, pool)
  probes(app)
  calculators(app)
  await app.register(assessments, { assess: (task, gone) => pool.run(task, gone), bodyLimit: config.BODY_LIMIT })
  await pageScripts(app)
  await app.register(reference, { document: openapi(readExamples()) })
  app.post('/v1/replay', async (request) => replayTrace(request.body))
  app.get('/v1/methods', async () => listMethods())
  app.get<{ Params: { id: string } }>('/v1/methods/:id', async (request) => getMethod(request.params.id))
  app.get('/v1/sources', async () => listSources())
  app.get('/v1/limits', async () => ({ ...limits, bodyBytes: config.BODY_LIMIT }))
  await graphqlPlugin(app, { production: config.NODE_ENV === 'production' })
  return { app, stop }
}

/** The service as one Fastify instance, for those who do not stop it by signal. */
export const buildApp = async (config: Config): Promise<FastifyInstance> => (await buildService(config)).app
