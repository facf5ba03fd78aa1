import { csvRows, withLines } from '../contract/csv-loads.ts'
import { readJson } from '../contract/read-json.ts'
import { Problem } from '../errors.ts'

/** A schedule as it came over the wire, and its loads as CSV where they came apart from it. */
export type ScheduleText = { readonly schedule: string; readonly loads?: string }

const isObject = (value: unknown): value is Readonly<Record<string, unknown>> =>
  typeof value === 'object' && value !== null && !Array.isArray(value)

/** Reads a schedule and hands it on as one value; faults of rows that came as CSV are told with their line and column. */
export function withSchedule<T>({ schedule, loads }: ScheduleText, use: (input: unknown) => T): T {
  const body = readJson(schedule)
  // Where the schedule has no place for rows, its own faults are told.
  if (loads === undefined || !isObject(body) || !isObject(body.loads)) return use(body)
  if (Object.hasOwn(body.loads, 'rows')) throw new Problem('loads-twice')
  const { rows, lines } = csvRows(loads, body.loads.signs)
  try {
    return use({ ...body, loads: { ...body.loads, rows } })
  } catch (problem) {
    throw problem instanceof Problem ? withLines(problem, lines) : problem
  }
}
