import { canonicalText, sha256 } from '../canonical.ts'
import { parse } from '../contract/parse.ts'
import { scheduleRequest } from '../contract/schedule.ts'
import { assess, engineVersion, splitTrace } from '../engine/index.ts'
import { pack } from '../store/blobs.ts'
import { contentHash, traceHash } from '../store/chain.ts'
import type { Draft } from '../store/draft.ts'
import { flatRows } from '../store/flat-rows.ts'
import { told } from './calculate.ts'

/** The cap that a number of the result belongs to; summary and neighbours come after the last. */
const capOf = (pointer: string, caps: number) => Number(/^\/caps\/(\d+)/.exec(pointer)?.[1] ?? caps)

/** Caps done of the caps of a schedule. */
export type Told = (done: number, caps: number) => void

/** Assesses a schedule and makes all of a record but its place in a project. The same schedule gives the same draft, wherever it runs. */
export function draftRecord(input: unknown, tell: Told = () => undefined): Draft {
  const schedule = parse(scheduleRequest, input)
  const caps = schedule.caps.length
  tell(0, caps)
  const { result, notices, trace } = told(() => assess(schedule, { trace: true, told: (done) => tell(done, caps) }))
  const rows = flatRows(schedule, result)
  const parts = {
    notices: canonicalText(notices),
    outcome: canonicalText({ neighbours: result.neighbours, summary: result.summary }),
    caps: result.caps.map(canonicalText),
    request: canonicalText(schedule),
  }
  const split = splitTrace(trace!, (pointer) => capOf(pointer, result.caps.length))
  const traces = split.map((part, cap) => ({ cap, text: JSON.stringify(part) }))
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
