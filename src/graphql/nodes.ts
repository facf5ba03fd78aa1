import type { ShownProject } from '../operations/put-project.ts'
import type { CapNode, RecordSums } from '../operations/read-many.ts'
import type { ShownJob } from '../operations/show-job.ts'
import type { ShownRecord } from '../operations/show-record.ts'
import type { showNeighbours } from '../operations/shown-rows.ts'
import type { Connection } from './connection.ts'

/** What resolvers hand on for the types whose fields are asked for one by one. */
export type ProjectConnectionNode = Connection<ShownProject>
export type AssessmentConnectionNode = Connection<ShownRecord> & { readonly sums: () => Promise<RecordSums> }
export type CapConnectionNode = Connection<CapNode>
export type NeighbourConnectionNode = Connection<ReturnType<typeof showNeighbours>>
export type JobConnectionNode = Connection<ShownJob>
export type AggregateNode = { readonly record: string }
