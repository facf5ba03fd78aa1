import { readFileSync } from 'node:fs'
import { expect, test } from 'vitest'
import { parse } from '../../../src/contract/parse.ts'
import { scheduleRequest } from '../../../src/contract/schedule.ts'
import type { Schedule } from '../../../src/engine/assessment/schedule.ts'
import { assess } from '../../../src/engine/index.ts'
import { type Layout, positions } from '../../../src/engine/piles/layout.ts'
import { type PilePlan, pileLoad, pilePlan } from '../../../src/engine/piles/pile-plan.ts'
import { rigidCap } from '../../../src/engine/piles/rigid-cap.ts'
import { pilePlaces } from '../../../src/engine/settlement/pile-places.ts'
import { Sheet } from '../../../src/engine/trace/sheet.ts'

const example = readFileSync(new URL('../../../schema/examples/assessment.json', import.meta.url), 'utf8')
const schedule: Schedule = parse(scheduleRequest, JSON.parse(example))

test('each demand and each settlement leads back to the row of its cap and combination, and to no other row', () => {
  const { result, trace } = assess(schedule, { trace: true })
  const steps = new Map(trace!.steps.map((s) => [s.id, s]))
  /** The rows of the request that a step rests on. */
  const rowsBehind = (id: string): number[] => {
    const seen = new Set<string>()
    const found = new Set<number>()
    const walk = (at: string) => {
      if (seen.has(at)) return
      seen.add(at)
      const step = steps.get(at)!
      if (step.kind === 'input') {
        const row = step.from?.match(/^\/loads\/rows\/(\d+)\//)?.[1]
        if (row !== undefined) found.add(Number(row))
      } else for (const operand of step.operands) walk(operand.from)
    }
    walk(id)
    return [...found]
  }
  const rowOf = (cap: string, combination: string) =>
    schedule.loads.rows.findIndex((r) => r.cap === cap && r.combination === combination)
  let followed = 0
  for (const [i, cap] of result.caps.entries()) {
    const expectRow = (pointer: string, combination: string) => {
      expect(rowsBehind(trace!.results[pointer]!), pointer).toEqual([rowOf(cap.mark, combination)])
      followed++
    }
    for (const [k, c] of cap.checks.entries()) {
      expectRow(`/caps/${i}/checks/${k}/demand`, c.combination)
      expectRow(`/caps/${i}/checks/${k}/utilisation`, c.combination)
    }
    for (const [k, s] of cap.settlement.entries()) {
      expectRow(`/caps/${i}/settlement/${k}/settlement`, s.combination)
      expectRow(`/caps/${i}/settlement/${k}/tilt`, s.combination)
    }
  }
  expect(followed).toBeGreaterThan(60)
})

const layouts: Record<string, { layout: Layout; Mx: number; My: number }> = {
  'one pile': { layout: { kind: 'points', points: [{ x: 0, y: 0 }] }, Mx: 0, My: 0 },
  'a grid': { layout: { kind: 'grid', columns: 4, rows: 3, spacing: 2 }, Mx: 260, My: -410 },
  'a ring': { layout: { kind: 'ring', count: 5, radius: 2 }, Mx: -90, My: 70 },
  'three piles, not centred': {
    layout: {
      kind: 'points',
      points: [
        { x: 0, y: 0 },
        { x: 2, y: 0.3 },
        { x: 0.6, y: 1.9 },
      ],
    },
    Mx: 35,
    My: 50,
  },
  'a line along x': { layout: { kind: 'grid', columns: 3, rows: 1, spacing: 2 }, Mx: 0, My: 120 },
}

test.each(Object.entries(layouts))('traced pile loads: %s', (_, { layout, Mx, My }) => {
  const bare = rigidCap(positions(layout))
  const plane = bare.plane({ V: 1800, Mx, My }, '')
  const sheet = Sheet.recording()
  const given = <const U extends 'kN' | 'kN.m' | '1'>(symbol: string, unit: U, value: number) =>
    sheet.input({ symbol, name: symbol, unit }, value, `/${symbol}`)
  const n = positions(layout).length
  const plan: PilePlan = pilePlan(sheet, pilePlaces(sheet, layout, '/layout'), given('n', '1', n))
  const load = { V: given('V', 'kN', 1800), Mx: given('Mx', 'kN.m', Mx), My: given('My', 'kN.m', My) }
  const loads = Array.from({ length: n }, (_, i) => pileLoad(sheet.within(`pile/${i}`), plan, load, i).value)
  for (const [i, P] of loads.entries()) expect(P).toBeCloseTo(bare.load(plane, i), 8)
  // Statics: the loads give V, My, Mx back about the cap's origin.
  const total = (weight: (i: number) => number) => loads.reduce((sum, P, i) => sum + P * weight(i), 0)
  expect(total(() => 1)).toBeCloseTo(1800, 8)
  expect(total((i) => positions(layout)[i]!.x)).toBeCloseTo(My, 8)
  expect(total((i) => positions(layout)[i]!.y)).toBeCloseTo(Mx, 8)
})
