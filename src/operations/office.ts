import type { WorkerPool } from '../jobs/pool.ts'
import type { Queue } from '../jobs/queue.ts'
import type { Store } from '../store/open-store.ts'

export type JobEnd = 'completed' | 'failed' | 'cancelled'

/** Where assessments wait that nobody waits for. */
export type Line = {
  readonly queue: Queue
  /** So many may wait or run. */
  readonly most: number
  /** The service stops: who watches a job is let go. */
  readonly stopping: AbortSignal
  /** Counts how jobs end. */
  readonly ended: (state: JobEnd) => void
}

/** What operations on records work with. */
export type Office = { readonly store: Store; readonly pool: WorkerPool; readonly line: Line }
