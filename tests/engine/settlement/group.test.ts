import fc from 'fast-check'
import { expect, test } from 'vitest'
import { EngineFault } from '../../../src/engine/faults.ts'
import { calculateSettlement } from '../../../src/engine/index.ts'
import type { Layout, Point } from '../../../src/engine/piles/layout.ts'
import { pileLoads } from '../../../src/engine/piles/pile-plan.ts'
import type { SettlementRequest } from '../../../src/engine/requests.ts'
import { pilePlaces } from '../../../src/engine/settlement/pile-places.ts'
import { groupResponse, prepareGroup } from '../../../src/engine/settlement/prepared-group.ts'
import { Sheet } from '../../../src/engine/trace/sheet.ts'

const base: Omit<SettlementRequest, 'load'> = {
  method: 'randolph-wroth-1978',
  pile: { section: { shape: 'circular', diameter: 0.6 }, length: 15, installation: 'bored', youngsModulus: 30e6 },
  ground: {
    layers: [
      { name: 'clay', unitWeight: 18, soil: 'cohesive', thickness: 6, youngsModulus: { top: 6000, bottom: 12_000 } },
      { name: 'sand', unitWeight: 19, soil: 'granular', youngsModulus: 20_000 },
    ],
  },
}
type Group = {
  settlement: number
  settlementRatio: number
  tilt: { alongX: number; alongY: number }
  largest?: number
  differential?: number
  piles: { x: number; y: number; load: number; settlement: number }[]
  stiffness: { vertical: number; rockingAlongX: number; rockingAlongY: number }
}
const settle = (points: readonly Point[], load: SettlementRequest['load'], cap: 'rigid' | 'flexible' = 'rigid') =>
  calculateSettlement({ ...base, layout: { kind: 'points', points }, load, cap }, { trace: true }) as unknown as {
    result: { single: { settlement: number; stiffness: number }; group: Group }
    trace: { steps: { id: string; kind: string; value: number; residuals?: { value: number }[] }[] }
  }
const terms = (sheet: Sheet, load: { V: number; Mx: number; My: number }) => ({
  V: sheet.input({ symbol: 'V', name: 'V', unit: 'kN' }, load.V, '/load/V'),
  Mx: sheet.input({ symbol: 'Mx', name: 'Mx', unit: 'kN.m' }, load.Mx, '/load/Mx'),
  My: sheet.input({ symbol: 'My', name: 'My', unit: 'kN.m' }, load.My, '/load/My'),
})

/** At least 2 m apart: one pile in each cell of a jittered 3 m mesh, spread in a plane. */
const layout: fc.Arbitrary<Point[]> = fc
  .array(fc.tuple(fc.double({ min: 0, max: 1, noNaN: true }), fc.double({ min: 0, max: 1, noNaN: true })), {
    minLength: 4,
    maxLength: 12,
  })
  .map((jitter) => jitter.map(([dx, dy], i) => ({ x: 3 * (i % 3) + dx, y: 3 * Math.floor(i / 3) + dy })))
const force = fc.record({
  V: fc.double({ min: 200, max: 9000, noNaN: true }),
  Mx: fc.double({ min: -900, max: 900, noNaN: true }),
  My: fc.double({ min: -900, max: 900, noNaN: true }),
})

/** Three piles are statically determinate: a formula without the product of inertia gives 375, 262.5, 262.5 instead. */
test('pile loads of three piles under a load at (0.5, 0.25) are those of statics: 450, 225, 225 kN', () => {
  const points = [
    { x: 0, y: 0 },
    { x: 2, y: 0 },
    { x: 0, y: 1 },
  ]
  const sheet = Sheet.recording()
  const places = pilePlaces(sheet, { kind: 'points', points }, '/layout')
  const n = sheet.input({ symbol: 'n', name: 'n', unit: '1' }, 3, '/layout')
  const loads = pileLoads(sheet, places, n, terms(sheet, { V: 900, My: 900 * 0.5, Mx: 900 * 0.25 }), '/load')
  for (const [i, expected] of [450, 225, 225].entries())
    expect(Math.abs(loads[i]!.value / expected - 1)).toBeLessThan(1e-12)
  for (const cap of ['rigid', 'flexible'] as const) {
    const doubled = points.map((p) => ({ x: 2 * p.x, y: 2 * p.y }))
    const { piles } = settle(doubled, { V: 900, My: 900, Mx: 450 }, cap).result.group
    expect(piles.map((p) => Math.round(p.load * 1e8) / 1e8)).toEqual([450, 225, 225])
  }
})

test('pile loads meet V, Mx, My at the origin, and mirroring the layout mirrors the answer', () => {
  fc.assert(
    fc.property(layout, force, fc.constantFrom('rigid' as const, 'flexible' as const), (points, load, cap) => {
      const { group } = settle(points, load, cap).result
      const total = (weight: (p: Point) => number) => group.piles.reduce((s, p) => s + p.load * weight(p), 0)
      const scale = load.V * 12
      expect(Math.abs(total(() => 1) - load.V) / scale).toBeLessThan(1e-12)
      expect(Math.abs(total((p) => p.x) - load.My) / scale).toBeLessThan(1e-12)
      expect(Math.abs(total((p) => p.y) - load.Mx) / scale).toBeLessThan(1e-12)
      const mirrored = settle(
        points.map((p) => ({ x: p.x, y: -p.y })),
        { ...load, Mx: -load.Mx },
        cap,
      ).result.group
      expect(mirrored.settlement / group.settlement).toBeCloseTo(1, 9)
      expect(mirrored.tilt.alongX).toBeCloseTo(group.tilt.alongX, 12)
      expect(mirrored.tilt.alongY).toBeCloseTo(-group.tilt.alongY, 12)
      for (const [i, p] of group.piles.entries()) expect(mirrored.piles[i]!.load).toBeCloseTo(p.load, 6)
    }),
    { numRuns: 150 },
  )
})

test.each(['rigid', 'flexible'] as const)(
  'the settlements under a %s cap are the pile loads times the interaction factors, multiplied plainly',
  (cap) => {
    const points = [
      { x: -2, y: -1 },
      { x: 1, y: -1.5 },
      { x: 2, y: 2 },
      { x: -1, y: 3 },
    ]
    const { result, trace } = settle(points, { V: 3000, Mx: 200, My: 400 }, cap)
    const value = (id: string) => trace.steps.find((s) => s.id === id)!.value
    const [share, r_m, zeta, r_b] = [
      value('stiffness/beta_b'),
      value('stiffness/r_m'),
      value('stiffness/zeta'),
      value('stiffness/r_0'),
    ]
    const { piles } = result.group
    for (const [i, p] of piles.entries()) {
      let s = 0
      for (const [j, q] of piles.entries()) {
        const d = Math.hypot(p.x - q.x, p.y - q.y)
        const alpha =
          i === j ? 1 : (1 - share) * Math.max(0, Math.log(r_m / d) / zeta) + (share * 2 * r_b) / (Math.PI * d)
        s += (alpha * q.load * 1000) / result.single.stiffness
      }
      expect(Math.abs(s / p.settlement - 1)).toBeLessThan(1e-10)
    }
    // My presses piles at +x: they settle more.
    expect(result.group.tilt.alongX).toBeGreaterThan(0)
  },
)

test('piles far apart settle as single piles; close ones settle more; a flexible cap dishes', () => {
  const square = (s: number): Point[] => [
    { x: 0, y: 0 },
    { x: s, y: 0 },
    { x: 0, y: s },
    { x: s, y: s },
    { x: s / 2, y: s / 2 },
  ]
  const ratio = (s: number) => {
    const load = { V: 5000, Mx: (5000 * s) / 2, My: (5000 * s) / 2 }
    return settle(square(s), load).result.group.settlementRatio
  }
  expect(Math.abs(ratio(1e6) - 1)).toBeLessThan(1e-5)
  expect(ratio(10)).toBeGreaterThan(ratio(40))
  expect(ratio(3)).toBeGreaterThan(ratio(10))
  expect(ratio(3)).toBeLessThan(5)
  const dish = settle(square(3), { V: 5000, Mx: 7500, My: 7500 }, 'flexible').result.group
  const settlements = dish.piles.map((p) => p.settlement)
  expect(dish.piles.every((p) => Math.abs(p.load - 1000) < 1e-9)).toBe(true)
  expect(dish.largest).toBe(settlements[4])
  expect(dish.differential).toBeCloseTo(settlements[4]! - settlements[0]!, 12)
  expect(dish.settlement).toBeCloseTo(settlements.reduce((a, b) => a + b) / 5, 12)
})

test('stiffness times response: V over settlement, moment over slope', () => {
  const points = [0, 1, 2, 3, 4, 5].map((i) => ({ x: ((i % 3) - 1) * 2, y: (Math.floor(i / 3) - 0.5) * 3 }))
  const { stiffness } = settle(points, { V: 1000 }).result.group
  expect(1e6 / settle(points, { V: 1000 }).result.group.settlement / stiffness.vertical).toBeCloseTo(1, 10)
  const tilted = settle(points, { V: 0, My: 100, Mx: 50 }).result.group
  expect(100 / tilted.tilt.alongX / stiffness.rockingAlongX).toBeCloseTo(1, 10)
  expect(50 / tilted.tilt.alongY / stiffness.rockingAlongY).toBeCloseTo(1, 10)
  expect(tilted.settlementRatio).toBeUndefined()
})

test('a line of piles takes V and a moment along itself in any direction, and refuses one about itself', () => {
  for (const angle of [0, 0.3, Math.PI / 2, 2.1]) {
    const u = { x: Math.cos(angle), y: Math.sin(angle) }
    const points = [-3, 0, 3].map((t) => ({ x: t * u.x, y: t * u.y }))
    for (const cap of ['rigid', 'flexible'] as const) {
      const { group } = settle(points, { V: 900, My: 90 * u.x, Mx: 90 * u.y }, cap).result
      expect(group.piles[2]!.load - group.piles[0]!.load).toBeCloseTo(2 * (90 / 6), 8)
      expect(group.tilt.alongX * -u.y + group.tilt.alongY * u.x).toBeCloseTo(0, 15)
      expect(() => settle(points, { V: 900, My: -u.y * 5, Mx: u.x * 5 }, cap)).toThrow(
        /line-cannot-take-moment at \/load/,
      )
    }
  }
  const one = settle([{ x: 0, y: 0 }], { V: 900 }).result
  expect(one.group.settlement).toBeCloseTo(one.single.settlement, 10)
  expect(() => settle([{ x: 0.2, y: 0 }], { V: 900 })).toThrow(EngineFault)
})

test('a prepared group answers a combination with four steps, and agrees with the calculator about any origin', () => {
  const at = { pile: '/pile', ground: '/ground', layout: '/layout', load: '/load' }
  fc.assert(
    fc.property(layout, force, (points, load) => {
      const asked: Layout = { kind: 'points', points }
      const { group } = settle(points, load).result
      const sheet = Sheet.recording()
      const prepared = prepareGroup(sheet, base.pile, base.ground, asked, at, 'randolph-wroth-1978', () => {})
      const own = terms(sheet, load)
      const before = sheet.steps.length
      const response = groupResponse(sheet.within('S1'), prepared, own)
      expect(sheet.steps.length - before).toBe(4)
      const c = prepared.elastic.centroid
      const centre =
        response.settlement.value + 1000 * (response.tiltAlongX.value * c.x + response.tiltAlongY.value * c.y)
      expect(centre / group.settlement).toBeCloseTo(1, 9)
      expect(response.tilt.value).toBeCloseTo(Math.hypot(group.tilt.alongX, group.tilt.alongY), 12)
      const silent = prepareGroup(Sheet.silent, base.pile, base.ground, asked, at, 'randolph-wroth-1978', () => {})
      expect(groupResponse(Sheet.silent, silent, own).settlement.value).toBe(response.settlement.value)
    }),
    { numRuns: 60 },
  )
})
