import { move } from 'piscina'
import { answerText } from '../contract/answer-text.ts'
import { outcomeOf, type Work } from '../jobs/pool.ts'
import { assessSchedule } from './assess-schedule.ts'
import type { Options } from './calculate.ts'
import { printSchedule } from './print-schedule.ts'
import { type ScheduleText, withSchedule } from './read-schedule.ts'

export type AssessTask = ScheduleText & {
  readonly options: Options
  /** A page to look at in place of the answer. */
  readonly page?: boolean
}

/** The entry of a worker thread: reading, checking and serialising a large schedule hold up the event loop as much as computing it does. */
export const assessInThread = (task: AssessTask) =>
  outcomeOf(() => {
    const answer = withSchedule(task, (input) =>
      task.page ? printSchedule(input, task.options) : answerText(assessSchedule(input, task.options)),
    )
    return move(new TextEncoder().encode(answer)) as Uint8Array
  })

export const assessing: Work<AssessTask, Uint8Array> = { entry: new URL(import.meta.url), name: 'assessInThread' }
