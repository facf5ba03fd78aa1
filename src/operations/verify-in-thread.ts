import { outcomeOf, type Work } from '../jobs/pool.ts'
import { type Flaw, verifyRecord } from '../store/verify-record.ts'
import type { WholeRecord } from '../store/whole-record.ts'

/** The entry of a worker thread: unpacking and hashing a large record would hold up the event loop. */
export const verifyInThread = (record: WholeRecord) => outcomeOf(() => verifyRecord(record))

export const verifying: Work<WholeRecord, Flaw[]> = { entry: new URL(import.meta.url), name: 'verifyInThread' }
