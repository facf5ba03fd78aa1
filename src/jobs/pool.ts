import { setPriority } from 'node:os'
import { isMainThread, MessageChannel, type MessagePort } from 'node:worker_threads'
import { Piscina } from 'piscina'
import { Problem } from '../errors.ts'

/** A problem that a thread met, as plain data: an Error would lose its fields on the way. */
export type Refusal = { readonly refused: Pick<Problem, 'code' | 'facts' | 'errors'> }

/** What a thread runs: an export of a module. Its answer is the outcome of a task, or a refusal. */
export type Work<Task, Answer> = {
  readonly entry: URL
  readonly name: string
  /** Holds the types together; never set. */
  readonly types?: (task: Task) => Answer
}

/** A task whose thread tells how far it is. */
export type Telling = { readonly port?: MessagePort }

export type PoolOptions = {
  readonly workers: number
  readonly queue: number
  readonly seconds: number
}

/** So much a thread stands back behind the event loop where both want a processor. */
const NICE = 5
// On Linux a thread has a priority of its own; elsewhere this would be that of the process.
if (!isMainThread && process.platform === 'linux') setPriority(NICE)

/** In a thread: what `compute` gives, or the problem that it throws, told so that it survives the way. */
export function outcomeOf<Answer>(compute: () => Answer): Answer | Refusal {
  try {
    return compute()
  } catch (problem) {
    if (!(problem instanceof Problem)) throw problem
    return { refused: { code: problem.code, facts: problem.facts, errors: problem.errors } }
  }
}

const isRefusal = <Answer>(outcome: Answer | Refusal): outcome is Refusal =>
  typeof outcome === 'object' && outcome !== null && 'refused' in outcome
const isOutOfMemory = (fault: unknown) => (fault as { code?: unknown }).code === 'ERR_WORKER_OUT_OF_MEMORY'

/** Threads for work that must not hold up the event loop. The queue is bounded: more work is refused at once. */
export class WorkerPool {
  readonly #pool: Piscina
  readonly #options: PoolOptions
  #underWay = 0

  constructor(options: PoolOptions) {
    this.#options = options
    this.#pool = new Piscina({
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
   * Runs a task in a thread; `told` hears what that posts to its `port`. A client that leaves (`signal`) or a task that overruns ends its thread, and nobody else's work.
   * Throws the thread's own problem; `overloaded` when the queue is full; `timed-out` past the deadline; `worker-died` when
   * the thread is lost; `internal-error` when the entry fails.
   */
  async run<Task extends object, Answer>(
    work: Work<Task, Answer>,
    task: Task,
    signal: AbortSignal,
    told?: (message: unknown) => void,
  ): Promise<Answer> {
    if (this.#underWay >= this.#options.workers + this.#options.queue) throw new Problem('overloaded', { seconds: 1 })
    this.#underWay++
    const deadline = AbortSignal.timeout(this.#options.seconds * 1000)
    let outcome: Answer | Refusal
    const channel = told && new MessageChannel()
    channel?.port1.on('message', told!)
    try {
      outcome = await this.#pool.run(channel ? { ...task, port: channel.port2 } : task, {
        // The declared type of the list is that of another function.
        transferList: (channel ? [channel.port2] : []) as never,
        filename: work.entry.href,
        name: work.name,
        signal: AbortSignal.any([signal, deadline]),
      })
    } catch (cause) {
      if (deadline.aborted) throw new Problem('timed-out', { seconds: this.#options.seconds })
      // What the entry itself throws is a defect: to try again would meet it again.
      const lost =
        signal.aborted || /^(worker exited|Terminating worker)/i.test((cause as Error).message) || isOutOfMemory(cause)
      throw Object.assign(new Problem(lost ? 'worker-died' : 'internal-error'), { cause })
    } finally {
      channel?.port1.close()
      this.#underWay--
    }
    if (!isRefusal(outcome)) return outcome
    const { code, facts, errors } = outcome.refused
    throw new Problem(code, facts, errors)
  }

  async close(): Promise<void> {
    await this.#pool.close()
  }
}
