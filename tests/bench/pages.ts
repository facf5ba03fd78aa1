import { parse } from '../../src/contract/parse.ts'
import { singlePileRequest } from '../../src/contract/requests.ts'
import { scheduleRequest } from '../../src/contract/schedule.ts'
import { assess, calculateSinglePile, engineVersion } from '../../src/engine/index.ts'
import { calculationSheet } from '../../src/print/calculation-sheet.ts'
import { capSheet } from '../../src/print/cap-sheet.ts'
import { projectPlan } from '../../src/print/project-plan.ts'
import type { AssessmentRecord } from '../../src/print/record.ts'
import { scheduleBody, singlePileBody } from './bodies.ts'
import { type Finding, interleaved, median, time } from './measure.ts'

const CAPS = 1000
const issue = { contentHash: 'sha256:0', engine: engineVersion, signatures: [] }

function recordOf(caps: number, combinations: number, mark?: string): AssessmentRecord {
  const schedule = parse(scheduleRequest, scheduleBody(caps, combinations))
  return {
    ...issue,
    schedule,
    reply: assess(schedule, mark === undefined ? { trace: false } : { trace: true, cap: mark }),
  }
}

/** (g) CPU and size of pages from records that lie ready: one pile, one cap, the plan of many. */
export function pages(): Finding[] {
  const request = parse(singlePileRequest, singlePileBody)
  const answer = calculateSinglePile(request, { trace: true })
  const meta = { engine: engineVersion, requestHash: 'sha256:0' }
  const mark = parse(scheduleRequest, scheduleBody(4, 8)).caps[0]!.mark
  const cap = recordOf(4, 8, mark)
  const plan = recordOf(CAPS, 4)
  const bytes = { pile: 0, cap: 0, plan: 0 }
  const once = (name: keyof typeof bytes, print: () => string) => ({
    calls: 1,
    run: () => {
      bytes[name] = Buffer.byteLength(print())
      return bytes[name]
    },
  })
  const us = interleaved(
    {
      pile: once('pile', () => calculationSheet({ kind: 'single-pile', request, answer, meta })),
      cap: once('cap', () => capSheet(cap, mark)!),
      plan: once('plan', () => projectPlan(plan)),
    },
    15,
    3,
  )
  const finding = (what: string, name: keyof typeof bytes, most?: { ms: number; bytes: number }): Finding => {
    const ms = median(us[name]) / 1e3
    return {
      part: 'i',
      what,
      value: `${time(median(us[name]))}, ${Math.round(bytes[name] / 1e3)} kB`,
      ...(most && {
        aim: `< ${most.ms} ms${most.bytes < 1e6 ? `, ${most.bytes / 1e3} kB` : ''}`,
        holds: ms < most.ms && bytes[name] < most.bytes,
      }),
    }
  }
  const count = cap.reply.trace!.steps.length
  return [
    finding(`sheet of one pile (${answer.trace!.steps.length} steps)`, 'pile', { ms: 20, bytes: 400_000 }),
    finding(`sheet of one cap (of ${count} steps)`, 'cap', { ms: 20, bytes: 400_000 }),
    finding(`plan of ${CAPS} caps`, 'plan', { ms: 150, bytes: 1e7 }),
  ]
}
