import type { Transaction } from 'kysely'
import { fromKysely, type Job, PgBoss } from 'pg-boss'
import { AGAIN, type Queue, underWay } from './queue.ts'

const NAME = 'assessments'
/** A run that has given no sign for so long is taken for dead, and so often it is looked for, s. */
const SILENT = 10
const LOOK = 3
/** How often a job is given out again. How often it may be tried is for the run to say, so this is out of reach. */
const OFTEN = 10_000
/** Longer than any run: its deadline is that of the worker pool. s */
const LONGEST = 4 * 3600

type Task = { readonly id: string }

/** The queue of services that share one PostgreSQL database, each running `most` jobs at once. */
export function sharedQueue(url: string, most: number, report: (fault: unknown) => void): Queue {
  const boss = new PgBoss({
    connectionString: url,
    application_name: 'kentledge-queue',
    max: 4,
    // Polling alone would let a job wait for half a second on average.
    useListenNotify: true,
    schedule: false,
    registerInstance: false,
    superviseIntervalSeconds: LOOK,
    monitorIntervalSeconds: LOOK,
  })
  boss.on('error', report)
  const jobs = underWay()
  return {
    add: async <Tables>(trx: Transaction<Tables>, id: string) => {
      await boss.send(NAME, { id } satisfies Task, { db: fromKysely(trx) })
    },
    // The database wakes every service when the transaction stands.
    wake: () => undefined,
    start: async (run) => {
      await boss.start()
      await boss.createQueue(NAME, {
        notify: true,
        retryLimit: OFTEN,
        retryDelay: AGAIN,
        heartbeatSeconds: SILENT,
        expireInSeconds: LONGEST,
        deleteAfterSeconds: 3600,
      })
      const polling = { pollingIntervalSeconds: AGAIN, notifyPollingIntervalSeconds: AGAIN }
      await boss.work(NAME, { localConcurrency: most, ...polling }, async ([job]: Job<Task>[]) => {
        const lost = AbortSignal.any([job!.signal, jobs.stopping])
        await jobs.track(run(job!.data.id, lost))
      })
    },
    stop: async (ms) => {
      // A job that is fetched meanwhile finds the service stopping, and goes back.
      const off = boss.offWork(NAME)
      await jobs.end(ms)
      await off
      await boss.stop({ graceful: true, timeout: 1000 })
    },
  }
}
