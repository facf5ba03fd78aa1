import { citedSources } from './outcome.ts'
import type { Step, Trace } from './step.ts'

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

/**
 * A part of a trace: the steps that no part before it holds, and which of those parts hold the others that its results need.
 * Steps that many parts need are held once, by the first of them.
 */
export type TracePart = {
  readonly steps: readonly Step[]
  readonly results: Readonly<Record<string, string>>
  readonly uses: readonly number[]
}

/** Splits a trace by its results: each number of the result belongs to the part, from 0 on, that `partOf` its pointer says. */
export function splitTrace(trace: Trace, partOf: (pointer: string) => number): TracePart[] {
  const places = new Map(trace.steps.map((step, i) => [step.id, i]))
  const parts: Record<string, string>[] = []
  for (const [pointer, id] of Object.entries(trace.results)) {
    const part = partOf(pointer)
    parts[part] ??= {}
    parts[part][pointer] = id
  }
  /** The part that holds a step. */
  const holder = new Map<number, number>()
  return Array.from(parts, (results = {}, part) => {
    const own: number[] = []
    const uses = new Set<number>()
    const ahead = Object.values(results)
    for (let id = ahead.pop(); id !== undefined; id = ahead.pop()) {
      const place = places.get(id)
      if (place === undefined) continue
      const held = holder.get(place)
      if (held === part) continue
      // What a step of an earlier part needs lies there, or is named there.
      if (held !== undefined) {
        uses.add(held)
        continue
      }
      holder.set(place, part)
      own.push(place)
      const step = trace.steps[place]!
      if ('operands' in step) for (const operand of step.operands) ahead.push(operand.from)
    }
    const steps = own.sort((a, b) => a - b).map((place) => trace.steps[place]!)
    return { steps, results, uses: [...uses].sort((a, b) => a - b) }
  })
}

/** The whole trace behind the last of some parts: itself after all that it uses, directly or through others, in their order. */
export function joinTrace(parts: readonly TracePart[]): Trace {
  const results = parts.at(-1)!.results
  const steps = parts.flatMap((part) => part.steps)
  return sliceTrace({ steps, results, sources: [] }, '')
}
