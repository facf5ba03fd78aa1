import { Piscina } from 'piscina'
import { Problem } from '../errors.ts'

/** What a thread sends back: the bytes of an answer, or the problem that it met (an Error would lose its fields on the way). */
export type Outcome = Uint8Array | Pick<Problem, 'code' | 'facts' | 'errors'>

export type PoolOptions = {
  readonly entry: URL
  /** Name of the entry's export. */
  readonly name: string
  readonly workers: number
  readonly queue: number
  readonly seconds: number
}

const isOutOfMemory = (fault: unknown) => (fault as { code?: unknown }).code === 'ERR_WORKER_OUT_OF_MEMORY'

/** Threads for work that must not hold up the event loop. The queue is bounded: more work is refused at once. */
export class WorkerPool<Task> {
  readonly #pool: Piscina<Task, Outcome>
  readonly #options: PoolOptions
  #underWay = 0

  constructor(options: PoolOptions) {
    this.#options = options
    this.#pool = new Piscina({
      filename: options.entry.href,
      minThreads: 0,
      maxThreads: options.workers,
      idleTimeout: 600_000,
      recordTiming: false,
    })
  }

  /** Tasks that wait for a thread. */
  get queued(): number {
    return Math.max(0, this.#underWay - this.#options.workers)
  }

  /** Threads at work. */
  get busy(): number {
    return Math.min(this.#underWay, this.#options.workers)
  }

  /**
   * Runs a task in a thread. A client that leaves (`signal`) or a task that overruns ends its thread, and nobody else's work.
   * Throws the thread's own problem; `overloaded` when the queue is full; `timed-out` past the deadline; `worker-died` when
   * the thread is lost; `internal-error` when the entry fails.
   */
  async run(task: Task, signal: AbortSignal): Promise<Uint8Array> {
    if (this.#underWay >= this.#options.workers + this.#options.queue) throw new Problem('overloaded', { seconds: 1 })
    this.#underWay++
    const deadline = AbortSignal.timeout(this.#options.seconds * 1000)
    let outcome: Outcome
    try {
      outcome = await this.#pool.run(task, { name: this.#options.name, signal: AbortSignal.any([signal, deadline]) })
    } catch (cause) {
      if (deadline.aborted) throw new Problem('timed-out', { seconds: this.#options.seconds })
      // What the entry itself throws is a defect: to try again would meet it again.
      const lost =
        signal.aborted || /^(worker exited|Terminating worker)/i.test((cause as Error).message) || isOutOfMemory(cause)
      throw Object.assign(new Problem(lost ? 'worker-died' : 'internal-error'), { cause })
    } finally {
      this.#underWay--
    }
    if (outcome instanceof Uint8Array) return outcome
    throw new Problem(outcome.code, outcome.facts, outcome.errors)
  }

  async close(): Promise<void> {
    await this.#pool.close()
  }
}
