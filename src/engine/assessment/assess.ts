import { eachOf, refuse } from '../faults.ts'
import { type Notice, usualCautions } from '../notice.ts'
import { settleTerms, traceOf } from '../trace/outcome.ts'
import { Sheet } from '../trace/sheet.ts'
import { assessCap, type Row, serviceRows } from './assess-cap.ts'
import { capField } from './cap-field.ts'
import { compareNeighbours } from './compare-neighbours.ts'
import { checkedCombinations, missingCombinations, unusedComponents } from './load-notices.ts'
import { type ResistanceSet, resistanceSet } from './resistance-set.ts'
import type { Cap, Schedule } from './schedule.ts'
import { refuseFaults } from './schedule-faults.ts'
import { summary } from './summary.ts'

export type AssessOptions = {
  readonly trace: boolean
  /** Mark of one cap: the trace then holds every combination of that cap, and nothing of the others. */
  readonly cap?: string
  /** Told how many caps have their resistance and stiffness: almost all of the time goes there. */
  readonly told?: (done: number) => void
}

/** The main job: every check of every cap of a schedule. Refuses a schedule with faults, all of them at once. */
export function assess(schedule: Schedule, options: AssessOptions) {
  refuseFaults(schedule)
  const alone = options.trace ? options.cap : undefined
  if (alone !== undefined && !schedule.caps.some((cap) => cap.mark === alone)) {
    refuse('unknown-reference', '', {
      kind: 'cap',
      name: alone,
      known: schedule.caps.slice(0, 20).map((cap) => cap.mark),
    })
  }
  const book = options.trace ? Sheet.recording() : Sheet.silent
  const sheetOf = (cap: Cap) => (alone === undefined || cap.mark === alone ? book : Sheet.silent)
  const keyOf = (cap: Cap) => JSON.stringify([cap.pileType, cap.ground, cap.layout, cap.mark === alone])
  const rowsOf = new Map<string, Row[]>(schedule.caps.map((cap) => [cap.mark, []]))
  for (const [index, row] of schedule.loads.rows.entries()) {
    rowsOf.get(row.cap)!.push({ index, row, limitState: schedule.loads.combinations[row.combination]!.limitState })
  }
  // Of caps that share a set the first stands for all.
  const alike = Map.groupBy(schedule.caps.keys(), (index) => keyOf(schedule.caps[index]!))
  let done = 0
  const sets = new Map<string, ResistanceSet>(
    eachOf([...alike], ([key, indices], i) => {
      const index = indices[0]!
      const set = resistanceSet(sheetOf(schedule.caps[index]!), schedule, schedule.caps[index]!, index, i + 1)
      done += indices.length
      options.told?.(done)
      return [key, set]
    }),
  )
  const setOf = schedule.caps.map((cap) => sets.get(keyOf(cap))!)
  const field = schedule.capInteraction
    ? capField(schedule, setOf, [...rowsOf.values()].flatMap(serviceRows))
    : undefined
  const assessed = eachOf(schedule.caps, (cap, index) => {
    const set = setOf[index]!
    const rows = rowsOf.get(cap.mark)!
    return { cap, set, ...assessCap(sheetOf(cap), schedule, cap, index, set, rows, cap.mark === alone, field) }
  })
  const checked = checkedCombinations(schedule)
  const common = alone === undefined ? book : Sheet.silent
  const neighbours = compareNeighbours(common, schedule, assessed)
  const tree = {
    summary: summary(common, assessed, neighbours),
    caps: assessed.map(({ cap, set, checks, settlement }, index) => ({
      mark: cap.mark,
      pileCount: set.pileCount,
      single: set.single,
      block: set.block,
      checks,
      settlement,
      stiffness: set.stiffness,
      notices: [...missingCombinations(checked, cap.mark, index, rowsOf.get(cap.mark)!), ...set.notices()],
    })),
    neighbours,
  }
  const { result, links } = settleTerms(tree)
  const notices: Notice[] = [usualCautions, ...unusedComponents(schedule)]
  if (field && sets.size > 1)
    notices.push({
      code: 'approximation',
      level: 'info',
      pointer: '/capInteraction',
      text: 'Between caps on different piles or ground the interaction of two piles is the mean of what either gives alone.',
    })
  return { result, notices, ...(options.trace && { trace: traceOf(book, links) }) }
}
