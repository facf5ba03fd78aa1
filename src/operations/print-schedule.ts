import { parse } from '../contract/parse.ts'
import { scheduleRequest } from '../contract/schedule.ts'
import { capSheet } from '../print/cap-sheet.ts'
import { projectPlan } from '../print/project-plan.ts'
import { assessSchedule } from './assess-schedule.ts'
import type { Options } from './calculate.ts'

/** An assessment that is not stored, as a page: the plan of all caps, or with `cap` the sheet of one. */
export function printSchedule(input: unknown, options: Options): string {
  const { meta, ...reply } = assessSchedule(input, { ...options, trace: options.cap !== undefined })
  const record = {
    contentHash: meta.requestHash,
    engine: meta.engine,
    signatures: [],
    schedule: parse(scheduleRequest, input),
    reply,
  }
  const sheet = options.cap === undefined ? undefined : capSheet(record, options.cap)
  return sheet ?? projectPlan(record)
}
