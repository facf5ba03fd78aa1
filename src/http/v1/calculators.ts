import type { FastifyInstance, FastifyRequest } from 'fastify'
import { answerText } from '../../contract/answer-text.ts'
import { Problem } from '../../errors.ts'
import type { Options } from '../../operations/calculate.ts'
import { calculateBlock } from '../../operations/calculate-block.ts'
import { calculateGroup } from '../../operations/calculate-group.ts'
import { calculateSettlement } from '../../operations/calculate-settlement.ts'
import { calculateSinglePile } from '../../operations/calculate-single-pile.ts'
import { printCalculation } from '../../operations/print-calculation.ts'
import { JSON_OR_PAGE, pageHeaders } from '../html.ts'

/** `?trace=none` leaves the trace out; `?of=<pointer>` gives only the steps behind one part of the result. */
export function optionsOf(request: FastifyRequest): Options {
  const { trace = 'full', of, cap, ...others } = request.query as Record<string, string | string[] | undefined>
  const bad = (field: string, expected: string, got: unknown) => new Problem('bad-query', { field, expected, got })
  // A misspelt parameter that vanished would give another answer than was asked for.
  for (const [field, got] of Object.entries(others)) throw bad(field, 'trace, of or cap', got)
  if (of !== undefined && (typeof of !== 'string' || !/^(\/|$)/.test(of))) throw bad('of', 'one JSON Pointer', of)
  if (cap !== undefined && typeof cap !== 'string') throw bad('cap', 'one mark', cap)
  if (trace !== 'full' && trace !== 'none') throw bad('trace', 'full or none', trace)
  return { trace: trace === 'full', of, cap }
}

const operations = {
  'single-pile': calculateSinglePile,
  block: calculateBlock,
  group: calculateGroup,
  settlement: calculateSettlement,
} as const

/** The calculators: pure, nothing is stored. */
export function calculators(app: FastifyInstance): void {
  for (const kind of Object.keys(operations) as (keyof typeof operations)[]) {
    app.post(`/v1/${kind}`, { config: { produces: JSON_OR_PAGE } }, async (request, reply) => {
      const options = optionsOf(request)
      if (request.accepted === 'text/html')
        return pageHeaders(reply).send(printCalculation(kind, request.body, options))
      const answer = answerText(operations[kind](request.body, options))
      return reply.type('application/json; charset=utf-8').send(answer)
    })
  }
}
