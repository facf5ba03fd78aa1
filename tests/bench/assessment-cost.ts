import { answerText } from '../../src/contract/answer-text.ts'
import { parse } from '../../src/contract/parse.ts'
import { scheduleRequest } from '../../src/contract/schedule.ts'
import { assess } from '../../src/engine/index.ts'
import { scheduleBody } from './bodies.ts'
import { type Finding, interleaved, median, ratio, time } from './measure.ts'

const FEW = 300
const COMBINATIONS = 40

/** (c) CPU of assessments by stages: reading, assessing with and without trace, serialising; and how it grows with the caps. */
export function assessmentCost(): Finding[] {
  const few = scheduleBody(FEW, COMBINATIONS)
  const text = JSON.stringify(few)
  const schedule = parse(scheduleRequest, few)
  const many = parse(scheduleRequest, scheduleBody(10 * FEW, COMBINATIONS))
  const silent = assess(schedule, { trace: false })
  const traced = assess(schedule, { trace: true })
  const once = (run: () => number) => ({ calls: 1, run })
  const us = interleaved(
    {
      read: once(() => parse(scheduleRequest, JSON.parse(text)).caps.length),
      assess: once(() => assess(schedule, { trace: false }).result.summary.exceeded),
      trace: once(() => assess(schedule, { trace: true }).result.summary.exceeded),
      serialise: once(() => answerText(silent).length),
      serialiseTrace: once(() => answerText(traced).length),
      many: once(() => assess(many, { trace: false }).result.summary.exceeded),
    },
    9,
    2,
  )
  const rows = FEW * COMBINATIONS
  const cost = (what: string, all: readonly number[]): Finding => {
    const each = median(all)
    return { part: 'c', what, value: `${time(each / FEW)} a cap, ${time(each / rows)} a row (${time(each)})` }
  }
  const growth = ratio(us.many, us.assess)
  return [
    cost('assess, no trace', us.assess),
    cost(`assess, full trace (${traced.trace!.steps.length} steps)`, us.trace),
    cost('read and validate', us.read),
    cost('serialise, no trace', us.serialise),
    cost('serialise, full trace', us.serialiseTrace),
    {
      part: 'c',
      what: `${10 * FEW} caps : ${FEW} caps, assess`,
      value: `${growth.toFixed(2)} (${time(median(us.many))})`,
      aim: '<= 11',
      holds: growth <= 11,
    },
  ]
}
