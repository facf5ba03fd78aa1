import { move } from 'piscina'
import { outcomeOf, type Work } from '../jobs/pool.ts'
import { capSheet } from '../print/cap-sheet.ts'
import type { CheckKind } from '../print/check-words.ts'
import { pileSchedule } from '../print/pile-schedule.ts'
import { pileScheduleCsv } from '../print/pile-schedule-csv.ts'
import { projectPlan } from '../print/project-plan.ts'
import { type PackedRecord, unpackRecord } from './unpack-record.ts'

/** A page of a stored record. */
export type PrintTask = { readonly record: PackedRecord } & (
  | { readonly page: 'sheet'; readonly mark: string }
  | { readonly page: 'piles' | 'piles-csv' }
  | {
      readonly page: 'plan'
      /** The path that the plan was asked at. */
      readonly at: string
      readonly check?: CheckKind | undefined
      readonly previous?: PackedRecord | undefined
      /** Id of the revision before, to be offered beside this one. */
      readonly before?: string | undefined
    }
)

function print(task: PrintTask): string {
  const record = unpackRecord(task.record)
  switch (task.page) {
    case 'sheet':
      return capSheet(record, task.mark)!
    case 'piles':
      return pileSchedule(record)
    case 'piles-csv':
      return pileScheduleCsv(record)
    case 'plan': {
      const { at, check, before } = task
      return projectPlan(record, { at, check, before, previous: task.previous && unpackRecord(task.previous) })
    }
  }
}

/** The entry of a worker thread: unpacking and printing a large record would hold up the event loop. */
export const printInThread = (task: PrintTask) =>
  outcomeOf(() => move(new TextEncoder().encode(print(task))) as Uint8Array)

export const printing: Work<PrintTask, Uint8Array> = { entry: new URL(import.meta.url), name: 'printInThread' }
