import { citedSources } from './outcome.ts'
import type { Trace } from './step.ts'

/**
 * Only the steps that one part of the result depends on, in their order. A pointer to an object takes all numbers below it.
 * An unknown pointer gives no steps.
 */
export function sliceTrace(trace: Trace, pointer: string): Trace {
  const results = Object.fromEntries(
    Object.entries(trace.results).filter(([p]) => p === pointer || p.startsWith(`${pointer}/`)),
  )
  const wanted = new Set(Object.values(results))
  // Operands come from earlier steps, so one walk from the end finds all that is needed.
  const steps = [...trace.steps].reverse().filter((step) => {
    if (!wanted.has(step.id)) return false
    if ('operands' in step) for (const operand of step.operands) wanted.add(operand.from)
    return true
  })
  steps.reverse()
  return { steps, results, sources: citedSources(steps) }
}
