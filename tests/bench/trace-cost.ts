import { singlePileRequest } from '../../src/contract/requests.ts'
import { calculateSinglePile } from '../../src/engine/index.ts'
import { singlePileBody } from './bodies.ts'
import { type Finding, interleaved, median, ratio, time } from './measure.ts'

/** (b) CPU of one pile with its trace against the same pile on a silent sheet; serialising is not in it. */
export function traceCost(): Finding[] {
  const request = singlePileRequest.parse(singlePileBody)
  const run = (trace: boolean) => ({
    calls: 400,
    run: () => calculateSinglePile(request, { trace }).result.ultimateResistance,
  })
  const us = interleaved({ silent: run(false), traced: run(true) }, 25, 10)
  const value = ratio(us.traced, us.silent)
  const steps = calculateSinglePile(request, { trace: true }).trace!.steps.length
  return [
    {
      part: 'b',
      what: `trace on (${steps} steps) : silent, CPU of one pile`,
      value: `${value.toFixed(2)} (${time(median(us.traced))} : ${time(median(us.silent))})`,
      aim: '< 3',
      holds: value < 3,
    },
  ]
}
