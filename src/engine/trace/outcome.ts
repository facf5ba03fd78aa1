import { bibliography } from '../sources/bibliography.ts'
import type { Source } from '../sources/source.ts'
import type { Sheet } from './sheet.ts'
import type { Step, Trace } from './step.ts'
import { isTerm, type Term } from './term.ts'

/** A tree of terms with plain numbers in their place. */
export type Plain<T> = T extends Term
  ? number
  : T extends readonly (infer E)[]
    ? Plain<E>[]
    : T extends object
      ? { [K in keyof T]: Plain<T[K]> }
      : T

const escapeKey = (key: string) => key.replaceAll('~', '~0').replaceAll('/', '~1')

/** Replaces each term by its value, and ties its JSON Pointer to the step that it came from. */
export function settleTerms<T>(tree: T): { result: Plain<T>; links: Record<string, string> } {
  const links: Record<string, string> = {}
  const walk = (node: unknown, pointer: string): unknown => {
    if (isTerm(node)) {
      // A term of a silent sheet has no step.
      if (node.from !== '') links[pointer] = node.from
      return node.value
    }
    if (Array.isArray(node)) return node.map((child, i) => walk(child, `${pointer}/${i}`))
    if (typeof node !== 'object' || node === null) return node
    const out: Record<string, unknown> = {}
    for (const [key, child] of Object.entries(node)) {
      if (child !== undefined) out[key] = walk(child, `${pointer}/${escapeKey(key)}`)
    }
    return out
  }
  return { result: walk(tree, '') as Plain<T>, links }
}

/** Every source that the steps cite, once, in order of first use. */
export function citedSources(steps: readonly Step[]): Source[] {
  const keys = new Set<string>()
  for (const step of steps) if ('source' in step && step.source) keys.add(step.source.key)
  return [...keys].map((key) => bibliography[key as keyof typeof bibliography])
}

export const traceOf = (sheet: Sheet, links: Record<string, string>): Trace => ({
  steps: sheet.steps,
  results: links,
  sources: citedSources(sheet.steps),
})
