import { maxHeaderSize } from 'node:http'
import fastify, { type FastifyInstance, LogController } from 'fastify'
import type { Config } from './config.ts'
import { readExamples } from './contract/examples.ts'
import { LONGEST_WAIT, limits } from './contract/limits.ts'
import { openapi } from './contract/openapi.ts'
import { readJson } from './contract/read-json.ts'
import { engineVersion } from './engine/index.ts'
import { Problem } from './errors.ts'
import { limits as documentLimits } from './graphql/limits.ts'
import { graphqlPlugin } from './graphql/plugin.ts'
import { sockets } from './graphql/sockets.ts'
import { accessLog, traceIdOf } from './http/access-log.ts'
import { answerClientError } from './http/client-errors.ts'
import { type Drain, drain } from './http/drain.ts'
import { guard } from './http/guard.ts'
import { pageScripts } from './http/html.ts'
import { metrics } from './http/metrics.ts'
import { negotiate } from './http/negotiate.ts'
import { probes } from './http/probes.ts'
import { problems, sendProblem } from './http/problems.ts'
import { reference } from './http/reference.ts'
import { assessments } from './http/v1/assessments.ts'
import { calculators } from './http/v1/calculators.ts'
import { caps } from './http/v1/caps.ts'
import { changes } from './http/v1/changes.ts'
import { jobs } from './http/v1/jobs.ts'
import { projects } from './http/v1/projects.ts'
import { recordPages } from './http/v1/record-pages.ts'
import { storedAssessments } from './http/v1/stored-assessments.ts'
import { embeddedQueue } from './jobs/embedded-queue.ts'
import { WorkerPool } from './jobs/pool.ts'
import { sharedQueue } from './jobs/shared-queue.ts'
import { assessing } from './operations/assess-in-thread.ts'
import { authenticate } from './operations/authenticate.ts'
import { getMethod, listMethods, listSources } from './operations/list-methods.ts'
import type { Office } from './operations/office.ts'
import { replayTrace } from './operations/replay-trace.ts'
import { runJob } from './operations/run-job.ts'
import { releaseAll } from './store/idempotency.ts'
import { countJobs, nextJob, requeueAll } from './store/jobs.ts'
import { openStore, type Store } from './store/open-store.ts'
import { probe } from './store/probe.ts'

export type Service = {
  readonly app: FastifyInstance
  readonly stop: Drain
  /** Begins no more jobs; those that run after `ms` are ended and wait for the next start. */
  readonly stopJobs: (ms: number) => Promise<void>
}

/** Composes the service, in reading order. */
export async function buildService(config: Config, store: Store): Promise<Service> {
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
    // A mark of 200 letters, each of up to twelve signs once it is percent-encoded.
    routerOptions: { maxParamLength: 2400 },
    // An unreadable URL never reaches the error handler.
    frameworkErrors: (error, _request, reply) =>
      sendProblem(reply, new Problem('malformed-url', { reason: error.message })),
  })
  app.removeContentTypeParser(['text/plain', 'application/json'])
  app.addContentTypeParser('application/json', { parseAs: 'string' }, async (_request: unknown, body: string) =>
    readJson(body),
  )
  const pool = new WorkerPool({
    workers: config.WORKERS,
    queue: config.WORK_QUEUE,
    seconds: config.WORK_TIMEOUT,
  })
  if (store.capabilities.alone) await Promise.all([releaseAll(store), requeueAll(store)])
  // One thread stays for those who wait for their answer.
  const atOnce = Math.max(1, config.WORKERS - 1)
  const report = (err: unknown) => app.log.error({ err }, 'the queue of jobs')
  const queue = store.url
    ? sharedQueue(store.url, atOnce, report)
    : embeddedQueue((but) => nextJob(store, but), atOnce, report)
  const stopping = new AbortController()
  const stopJobs = async (ms: number) => {
    stopping.abort()
    await queue.stop(ms)
  }
  app.addHook('onClose', async () => {
    await stopJobs(0)
    await pool.close()
    await store.close()
  })
  await sockets(app)
  const stop = drain(app)
  accessLog(app)
  guard(app, authenticate({ store }, config.AUTH))
  negotiate(app)
  problems(app, config.BODY_LIMIT)
  const ended = metrics(app, engineVersion, pool, {
    size: () => store.capabilities.size(store.reader),
    jobs: () => countJobs(store),
  })
  const office: Office = { store, pool, line: { queue, most: config.JOB_QUEUE, stopping: stopping.signal, ended } }
  probes(app, () => probe(store))
  calculators(app)
  const bodyLimit = config.BODY_LIMIT
  await app.register(assessments, { assess: (task, gone) => pool.run(assessing, task, gone), bodyLimit, office })
  projects(app, office)
  storedAssessments(app, office)
  jobs(app, office)
  caps(app, office)
  recordPages(app, office)
  await pageScripts(app)
  changes(app, office)
  await app.register(reference, { document: openapi(readExamples()) })
  app.post('/v1/replay', async (request) => replayTrace(request.body))
  app.get('/v1/methods', async () => listMethods())
  app.get<{ Params: { id: string } }>('/v1/methods/:id', async (request) => getMethod(request.params.id))
  app.get('/v1/sources', async () => listSources())
  app.get('/v1/limits', async () => ({
    ...limits,
    bodyBytes: config.BODY_LIMIT,
    headerBytes: maxHeaderSize,
    requestSeconds: config.REQUEST_TIMEOUT,
    assessmentSeconds: config.WORK_TIMEOUT,
    assessmentsWaiting: config.WORK_QUEUE,
    jobs: config.JOB_QUEUE,
    waitSeconds: LONGEST_WAIT,
    graphql: documentLimits,
  }))
  await graphqlPlugin(app, {
    production: config.NODE_ENV === 'production',
    actorOf: (request) => request.actor!,
    office,
  })
  await queue.start(runJob(office, app.log))
  return { app, stop, stopJobs }
}

/** The service as one Fastify instance, for those who do not stop it by signal. Without a store of theirs it keeps its records in memory. */
export const buildApp = async (config: Config, store?: Store): Promise<FastifyInstance> =>
  (await buildService(config, store ?? (await openStore()))).app
