import { readFileSync } from 'node:fs'
import fc from 'fast-check'
import { expect, test } from 'vitest'
import { calculateGroup, replay } from '../../../src/engine/index.ts'
import type { GroupRequest } from '../../../src/engine/requests.ts'

type Case = { request: GroupRequest }
const { cases } = JSON.parse(readFileSync(new URL('../../published/capacity.json', import.meta.url), 'utf8')) as {
  cases: Case[]
}
const traces = cases.map((c) => ({ request: c.request, trace: calculateGroup(c.request, { trace: true }).trace! }))

// biome-ignore lint/suspicious/noExplicitAny: a mutant is a step bent out of its type
type Bent = any

/** Bends one step; false where the step has nothing of that kind to bend, or bending would change nothing. */
const bends: Record<string, (step: Bent, by: number) => boolean> = {
  value: (step, by) => {
    step.value = step.value * (1 + by) + by
    return step.kind !== 'input' && step.kind !== 'solution'
  },
  operand: (step, by) => {
    const o = step.operands?.[Math.floor(by * 1e6) % (step.operands?.length || 1)]
    if (!o) return false
    o.value = o.value * (1 + by) + by
    return true
  },
  unit: (step) => {
    if (step.kind === 'input' || step.kind === 'solution') return false
    step.unit = step.unit === 'm' ? 'kPa' : 'm'
    return true
  },
  formula: (step) => {
    if (step.kind !== 'formula' || step.value === 0) return false
    step.formula = `1.01 * (${step.formula})`
    return true
  },
  input: (step, by) => {
    if (step.kind !== 'input' || !step.from || step.default) return false
    step.value = step.value * (1 + by) + by
    return step.symbol !== 'n'
  },
}

test('2000 mutants: each is named, and no other step is', { timeout: 240_000 }, () => {
  let bent = 0
  fc.assert(
    fc.property(
      fc.nat(traces.length - 1),
      fc.nat(),
      fc.constantFrom(...Object.keys(bends)),
      fc.double({ min: 1e-4, max: 0.5, noNaN: true }),
      (which, where, kind, by) => {
        const { trace, request } = traces[which]!
        const steps = structuredClone(trace.steps) as Bent[]
        const step = steps[where % steps.length]
        // A request value that stands as { top, bottom } or is counted is not compared as a number.
        if (!bends[kind]!(step, by)) return
        bent++
        const named = replay({ steps }, request).steps.filter((s) => !s.holds)
        expect(
          named.map((s) => s.id),
          `${kind} of ${step.id}`,
        ).toEqual([step.id])
      },
    ),
    { numRuns: 2000 },
  )
  console.info(`${bent} mutants`)
  expect(bent).toBeGreaterThan(500)
})

test('a hostile formula is refused, not run', () => {
  const line = {
    id: 'a',
    symbol: 'a',
    name: 'a',
    value: 1,
    unit: '1',
    quantity: 'ratio',
    kind: 'formula',
    operands: [],
    source: { key: 'k', locator: '' },
  }
  for (const formula of [
    'import("fs")',
    'f(x) = x',
    'a = 1',
    'evaluate("1")',
    '[1,2]',
    '"text"',
    '1; 2',
    'constructor',
    'x.constructor',
    '1'.repeat(600),
    '1 m',
  ]) {
    const { holds } = replay({ steps: [{ ...line, formula }] as Bent })
    expect(holds, formula).toBe(false)
  }
})
