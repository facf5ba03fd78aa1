import { afterAll } from 'vitest'
import { embeddedQueue } from '../../src/jobs/embedded-queue.ts'
import { WorkerPool } from '../../src/jobs/pool.ts'
import type { Office } from '../../src/operations/office.ts'
import { openStore } from '../../src/store/open-store.ts'

/** An office with nothing in it, for tests of the endpoint alone; it ends with the test file. */
export async function emptyOffice(): Promise<Office> {
  const queue = embeddedQueue(
    async () => undefined,
    1,
    () => undefined,
  )
  const office: Office = {
    store: await openStore(),
    pool: new WorkerPool({ workers: 1, queue: 1, seconds: 60 }),
    line: { queue, most: 1, stopping: new AbortController().signal, ended: () => undefined },
  }
  afterAll(async () => {
    await office.pool.close()
    await office.store.close()
  })
  return office
}
