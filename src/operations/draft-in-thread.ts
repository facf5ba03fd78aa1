import { outcomeOf, type Work } from '../jobs/pool.ts'
import type { Draft } from '../store/draft.ts'
import { draftRecord } from './draft-record.ts'
import { type ScheduleText, withSchedule } from './read-schedule.ts'

/** The entry of a worker thread for what shall be stored: the event loop gets rows and compressed bytes, and only inserts them. */
export const draftInThread = (task: ScheduleText) => outcomeOf(() => withSchedule(task, draftRecord))

export const drafting: Work<ScheduleText, Draft> = { entry: new URL(import.meta.url), name: 'draftInThread' }
