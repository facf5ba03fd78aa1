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

/** Slices of a trace by groups of the result: each number of the result belongs to the group that `groupOf` its pointer says. */
export function sliceTraces(trace: Trace, groupOf: (pointer: string) => number): Map<number, Trace> {
  const places = new Map(trace.steps.map((step, i) => [step.id, i]))
  const groups = new Map<number, Record<string, string>>()
  for (const [pointer, id] of Object.entries(trace.results)) {
    const group = groupOf(pointer)
    const results = groups.get(group) ?? {}
    results[pointer] = id
    groups.set(group, results)
  }
  const slice = (results: Readonly<Record<string, string>>): Trace => {
    const kept = new Set<number>()
    const ahead = Object.values(results)
    for (let id = ahead.pop(); id !== undefined; id = ahead.pop()) {
      const place = places.get(id)
      if (place === undefined || kept.has(place)) continue
      kept.add(place)
      const step = trace.steps[place]!
      if ('operands' in step) for (const operand of step.operands) ahead.push(operand.from)
    }
    const steps = [...kept].sort((a, b) => a - b).map((place) => trace.steps[place]!)
    return { steps, results, sources: citedSources(steps) }
  }
  return new Map([...groups].map(([group, results]) => [group, slice(results)]))
}
