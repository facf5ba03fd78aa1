import { readFileSync } from 'node:fs'
import { expect } from 'vitest'

/** A tree of figures: the shape of what a source prints and of what a check found. */
export type Figures = number | readonly Figures[] | { readonly [name: string]: Figures }

export type WorkedExample = {
  readonly id: string
  readonly topic: string
  readonly source: { title: string; author: string; year: number | null; locator: string }
  /** Read in a copy of the source, or written down from memory of it. */
  readonly basis: 'published' | 'memory'
  readonly tolerance: { readonly rel: number }
  readonly inputs: unknown
  readonly expected: Figures
  /** How the example is put to the service. */
  readonly note?: string
  /** Figures that nothing of ours answers, and why. */
  readonly notCompared?: Readonly<Record<string, string>>
  /** Figures that we answer otherwise, and why; a figure that is met must not stand here. */
  readonly notMet?: Readonly<Record<string, string>>
}
export type LeftOut = { readonly id: string; readonly topic: string; readonly leftOut: string }

export const readExamples = () =>
  JSON.parse(readFileSync(new URL('worked-examples.json', import.meta.url), 'utf8')) as (WorkedExample | LeftOut)[]

function figures(tree: Figures, path = ''): [path: string, figure: number][] {
  if (typeof tree === 'number') return [[path, tree]]
  return Object.entries(tree).flatMap(([name, branch]) => figures(branch, path === '' ? name : `${path}.${name}`))
}

const named = (path: string, reasons: Readonly<Record<string, string>> = {}) =>
  Object.keys(reasons).some((key) => path === key || path.startsWith(`${key}.`))

/** Holds what a check found against every printed figure, at the tolerance of the example. None may be missing, none may be extra. */
export function compareFigures(example: WorkedExample, found: Figures): void {
  const printed = figures(example.expected)
  const got = new Map(figures(found))
  const asked = printed.map(([path]) => path).filter((path) => !named(path, example.notCompared))
  expect([...got.keys()].sort()).toEqual(asked.sort())
  for (const [path, figure] of printed) {
    const value = got.get(path)
    if (value === undefined) continue
    const off = Math.abs(value - figure) / Math.abs(figure)
    const message = `${path}: ${value} against ${figure}, ${(100 * off).toFixed(3)} %`
    if (named(path, example.notMet)) expect(off, message).toBeGreaterThan(example.tolerance.rel)
    else expect(off, message).toBeLessThanOrEqual(example.tolerance.rel)
  }
}

/** Paths under `notCompared` and `notMet` that name no figure of the example. */
export const idleRemarks = (example: WorkedExample): string[] => {
  const printed = figures(example.expected)
  return [...Object.keys(example.notCompared ?? {}), ...Object.keys(example.notMet ?? {})].filter(
    (key) => !printed.some(([path]) => named(path, { [key]: '' })),
  )
}
