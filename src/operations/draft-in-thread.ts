import { outcomeOf, type Telling, type Work } from '../jobs/pool.ts'
import { unpack } from '../store/blobs.ts'
import type { Draft } from '../store/draft.ts'
import type { PackedText } from '../store/jobs.ts'
import { draftRecord, type Told } from './draft-record.ts'
import { type ScheduleText, withSchedule } from './read-schedule.ts'

/** A schedule as it came over the wire, or as the queue keeps it. */
export type DraftTask = ScheduleText | PackedText
export type Progress = { readonly done: number; readonly caps: number }

/** Progress is told so often, ms. */
const RATE = 250

const textOf = (part: string | Uint8Array) => (typeof part === 'string' ? part : unpack(part))

function teller({ port }: Telling): Told {
  let next = 0
  return (done, caps) => {
    const now = performance.now()
    if (!port || (now < next && done < caps)) return
    next = now + RATE
    port.postMessage({ done, caps } satisfies Progress)
  }
}

/** The entry of a worker thread for what shall be stored: the event loop gets rows and compressed bytes, and only inserts them. */
export const draftInThread = (task: DraftTask & Telling) =>
  outcomeOf(() => {
    const { schedule, loads } = task
    const text = { schedule: textOf(schedule), ...(loads !== undefined && { loads: textOf(loads) }) }
    return withSchedule(text, (input) => draftRecord(input, teller(task)))
  })

export const drafting: Work<DraftTask, Draft> = { entry: new URL(import.meta.url), name: 'draftInThread' }
