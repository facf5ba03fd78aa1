import { move } from 'piscina'
import { csvRows, withLines } from '../contract/csv-loads.ts'
import { Problem } from '../errors.ts'
import type { Outcome } from '../jobs/pool.ts'
import { assessSchedule } from './assess-schedule.ts'
import type { Options } from './calculate.ts'
import { printSchedule } from './print-schedule.ts'

/** A schedule as it came over the wire, and its loads as CSV where they came apart from it. */
export type AssessTask = {
  readonly schedule: string
  readonly loads?: string
  readonly options: Options
  /** A page to look at in place of the answer. */
  readonly page?: boolean
}

function readJson(text: string): unknown {
  try {
    return JSON.parse(text)
  } catch (fault) {
    throw new Problem('malformed-json', { reason: (fault as Error).message })
  }
}

const isObject = (value: unknown): value is Readonly<Record<string, unknown>> =>
  typeof value === 'object' && value !== null && !Array.isArray(value)

function assess({ schedule, loads, options, page }: AssessTask): string {
  const answer = (input: unknown) =>
    page ? printSchedule(input, options) : JSON.stringify(assessSchedule(input, options))
  const body = readJson(schedule)
  // Where the schedule has no place for rows, its own faults are told.
  if (loads === undefined || !isObject(body) || !isObject(body.loads)) return answer(body)
  if (Object.hasOwn(body.loads, 'rows')) throw new Problem('loads-twice')
  const { rows, lines } = csvRows(loads, body.loads.signs)
  try {
    return answer({ ...body, loads: { ...body.loads, rows } })
  } catch (problem) {
    throw problem instanceof Problem ? withLines(problem, lines) : problem
  }
}

/** The entry of a worker thread: reading, checking and serialising a large schedule hold up the event loop as much as computing it does. */
export function assessInThread(task: AssessTask): Outcome {
  try {
    return move(new TextEncoder().encode(assess(task))) as Uint8Array
  } catch (problem) {
    if (!(problem instanceof Problem)) throw problem
    return { code: problem.code, facts: problem.facts, errors: problem.errors }
  }
}
