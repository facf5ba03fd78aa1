import { evaluate } from 'mathjs'
import { expect, test } from 'vitest'
import { calculateSettlement } from '../../../src/engine/index.ts'
import { units } from '../../../src/engine/quantities/units.ts'
import type { SettlementRequest } from '../../../src/engine/requests.ts'

const ground: SettlementRequest['ground'] = {
  layers: [
    { name: 'clay', unitWeight: 18, soil: 'cohesive', thickness: 6, youngsModulus: { top: 6000, bottom: 12_000 } },
    { name: 'sand', unitWeight: 19, soil: 'granular', thickness: 5, youngsModulus: 30_000, poissonsRatio: 0.25 },
  ],
}
const load = { V: 3000, Mx: 100, My: -250 }
const pile: SettlementRequest['pile'] = {
  section: { shape: 'circular', diameter: 0.6 },
  length: 14,
  installation: 'bored',
  baseDiameter: 1,
}
const points = [
  { x: 0, y: 0 },
  { x: 3, y: 0 },
  { x: 0, y: 4 },
  { x: 6, y: 4 },
]
const requests: SettlementRequest[] = [
  { pile, ground, load: { V: 500 } },
  { pile, ground, load, layout: { kind: 'grid', columns: 3, rows: 2, spacing: 2.4 } },
  { pile, ground, load, layout: { kind: 'points', points }, cap: 'flexible' },
  { pile, ground, load, layout: { kind: 'ring', count: 5, radius: 3 }, cap: 'rigid' },
]
const find = (tree: unknown, pointer: string) =>
  pointer
    .split('/')
    .slice(1)
    .reduce((node, key) => (node as Record<string, unknown> | undefined)?.[key], tree)
const SCALE = (unit: keyof typeof units) => units[unit].factor

test.each(requests.map((r, i) => [i, r] as const))(
  'request %i: closed, complete, replayable, the same with the trace off',
  (_, r) => {
    const answer = calculateSettlement(r, { trace: true })
    const { steps, results } = answer.trace!
    const seen = new Map<string, number>()
    let replayed = 0
    for (const step of steps) {
      if (step.kind === 'input') {
        if (step.from !== undefined) expect(find(r, step.from), step.id).toBeDefined()
      } else {
        for (const o of step.operands) expect(seen.get(o.from), `${step.id}: ${o.symbol}`).toBe(o.value)
      }
      if (step.kind === 'formula') {
        // Another evaluator than the engine's own compiler, in m, kN and rad.
        const scope = Object.fromEntries(step.operands.map((o) => [o.symbol, o.value * SCALE(o.unit)]))
        const value = Number(evaluate(step.formula, scope)) / SCALE(step.unit)
        expect(Math.abs(value - step.value), step.id).toBeLessThanOrEqual(1e-9 * Math.abs(value))
        replayed++
      }
      if (step.kind === 'solution')
        for (const residual of step.residuals)
          expect(residual.value, `${step.id}: ${residual.name}`).toBeLessThan(step.tolerance)
      seen.set(step.id, step.value)
    }
    expect(replayed).toBeGreaterThan(20)
    let numbers = 0
    const walk = (node: unknown, pointer: string): void => {
      if (typeof node === 'number') {
        expect(seen.get(results[pointer] ?? ''), pointer).toBe(node)
        numbers++
      } else if (node && typeof node === 'object') for (const [k, v] of Object.entries(node)) walk(v, `${pointer}/${k}`)
    }
    walk(answer.result, '')
    expect(numbers).toBeGreaterThanOrEqual(5)
    expect(calculateSettlement(r, { trace: false }).result).toEqual(answer.result)
    expect(JSON.stringify(calculateSettlement(r, { trace: true }))).toBe(JSON.stringify(answer))
  },
)
