import type { WorkerPool } from '../jobs/pool.ts'
import type { Store } from '../store/open-store.ts'

/** What operations on records work with. */
export type Office = { readonly store: Store; readonly pool: WorkerPool }
