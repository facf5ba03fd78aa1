import { move } from 'piscina'
import { csvRows } from '../contract/csv-loads.ts'
import { Problem } from '../errors.ts'
import type { Outcome } from '../jobs/pool.ts'
import { assessSchedule } from './assess-schedule.ts'
import type { Options } from './calculate.ts'

/** A schedule as it came over the wire, and its loads as CSV where they came apart from it. */
export type AssessTask = { readonly schedule: string; readonly loads?: string; readonly options: Options }

function read({ schedule, loads }: AssessTask): unknown {
  let body: { loads?: { signs?: unknown } }
  try {
    body = JSON.parse(schedule) as typeof body
  } catch (fault) {
    throw new Problem('malformed-json', { reason: (fault as Error).message })
  }
  return loads === undefined ? body : { ...body, loads: { ...body.loads, rows: csvRows(loads, body.loads?.signs) } }
}

/** The entry of a worker thread: reading, checking and serialising a large schedule hold up the event loop as much as computing it does. */
export function assessInThread(task: AssessTask): Outcome {
  try {
    const bytes = new TextEncoder().encode(JSON.stringify(assessSchedule(read(task), task.options)))
    return move(bytes) as Uint8Array
  } catch (problem) {
    if (!(problem instanceof Problem)) throw problem
    return { code: problem.code, facts: problem.facts, errors: problem.errors }
  }
}
