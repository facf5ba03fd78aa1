import { canonicalText, sha256 } from '../canonical.ts'
import { parse } from '../contract/parse.ts'
import { scheduleRequest } from '../contract/schedule.ts'
import { assess, engineVersion, sliceTraces } from '../engine/index.ts'
import { pack } from '../store/blobs.ts'
import { contentHash, traceHash } from '../store/chain.ts'
import type { Draft } from '../store/draft.ts'
import { flatRows } from '../store/flat-rows.ts'
import { told } from './calculate.ts'

/** The cap that a number of the result belongs to; -1 for summary and neighbours. */
const capOf = (pointer: string) => Number(/^\/caps\/(\d+)/.exec(pointer)?.[1] ?? -1)

/** Assesses a schedule and makes all of a record but its place in a project. The same schedule gives the same draft, wherever it runs. */
export function draftRecord(input: unknown): Draft {
  const schedule = parse(scheduleRequest, input)
  const { result, notices, trace } = told(() => assess(schedule, { trace: true }))
  const rows = flatRows(schedule, result)
  const parts = {
    notices: canonicalText(notices),
    outcome: canonicalText({ neighbours: result.neighbours, summary: result.summary }),
    caps: result.caps.map(canonicalText),
    request: canonicalText(schedule),
  }
  const traces = [...sliceTraces(trace!, capOf)]
    .sort(([a], [b]) => a - b)
    .map(([cap, slice]) => ({ cap, text: JSON.stringify(slice) }))
  return {
    record: {
      title: schedule.title,
      engine: engineVersion,
      request_hash: sha256([parts.request]),
      content_hash: contentHash(parts),
      trace_hash: traceHash(traces),
      ...rows.summary,
      notices: parts.notices,
      outcome: pack(parts.outcome),
      request: pack(parts.request),
    },
    caps: rows.caps.map((row, i) => ({ ...row, body: pack(parts.caps[i]!) })),
    checks: rows.checks,
    neighbours: rows.neighbours,
    traces: traces.map(({ cap, text }) => ({ cap, trace: pack(text) })),
  }
}
