import type { CapRow, CheckRow, NeighbourRow, RecordRow, TraceRow } from './tables.ts'

type Rows<Row extends { record: string }> = readonly Omit<Row, 'record'>[]

/** Everything of a record but its place in a project: what the run of an assessment gives. Plain data, so that a thread can send it. */
export type Draft = {
  readonly record: Pick<
    RecordRow,
    | 'title'
    | 'engine'
    | 'request_hash'
    | 'content_hash'
    | 'trace_hash'
    | 'caps'
    | 'satisfied'
    | 'exceeded'
    | 'worst_cap'
    | 'worst_check'
    | 'worst_combination'
    | 'worst_utilisation'
    | 'summary'
    | 'notices'
    | 'outcome'
    | 'request'
  >
  readonly caps: Rows<CapRow>
  readonly checks: Rows<CheckRow>
  readonly neighbours: Rows<NeighbourRow>
  readonly traces: Rows<TraceRow>
}
