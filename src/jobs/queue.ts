import type { Transaction } from 'kysely'

/**
 * Runs one job. Resolves when the job has come to an end, whatever that was; throws when it shall be given out again. `lost`
 * ends the run: another one has the job, or the service stops.
 */
export type RunJob = (id: string, lost: AbortSignal) => Promise<void>

/** Gives out jobs, each to one run at a time. What a job is and how it ends stands in the store; the queue knows ids only. */
export type Queue = {
  /** Puts a job in line, in the transaction that stores it. */
  readonly add: <Tables>(trx: Transaction<Tables>, id: string) => Promise<void>
  /** A transaction that added jobs stands. */
  readonly wake: () => void
  readonly start: (run: RunJob) => Promise<void>
  /** Gives out no more. Resolves when no job runs; those that still do after `ms` are ended, and stay in line for the next start. */
  readonly stop: (ms: number) => Promise<void>
}

/** A job that could not be run to its end is given out again after so long, s. */
export const AGAIN = 1

/** Jobs under way: waits for them, and after a time ends them. */
export function underWay() {
  const running = new Set<Promise<void>>()
  const stopping = new AbortController()
  return {
    stopping: stopping.signal,
    track(run: Promise<void>): Promise<void> {
      const ends = run.catch(() => undefined).finally(() => running.delete(ends))
      running.add(ends)
      return run
    },
    async end(ms: number): Promise<void> {
      const late = setTimeout(() => stopping.abort(), ms)
      await Promise.all(running)
      clearTimeout(late)
      stopping.abort()
    },
  }
}
