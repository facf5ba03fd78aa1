import { expect, test } from 'vitest'
import type { Schedule } from '../../../src/engine/assessment/schedule.ts'
import { assess, calculateSettlement, replay } from '../../../src/engine/index.ts'
import type { Layout } from '../../../src/engine/piles/layout.ts'

const pile = { section: { shape: 'circular', diameter: 0.6 }, length: 15, installation: 'bored' } as const
const ground = {
  layers: [
    { name: 'clay', unitWeight: 18, soil: 'cohesive', thickness: 6, undrainedShearStrength: 60, youngsModulus: 15_000 },
    { name: 'stiff', unitWeight: 20, soil: 'cohesive', undrainedShearStrength: 120, youngsModulus: 45_000 },
  ],
} as const
const schedule = (
  layout: Layout,
  places: readonly { x: number; y: number; V: number; My?: number }[],
  capInteraction: boolean,
): Schedule => ({
  title: 'caps beside one another',
  designBasis: { format: 'overall-factor', factor: 2 },
  capInteraction,
  ground: { BH1: ground },
  pileTypes: { B600: pile },
  caps: places.map((p, i) => ({ mark: `C${i + 1}`, x: p.x, y: p.y, ground: 'BH1', pileType: 'B600', layout })),
  loads: {
    signs: 'pressing',
    loadsAre: 'actions',
    combinations: { W: { limitState: 'working' }, S: { limitState: 'serviceability' } },
    rows: places.flatMap((p, i) =>
      ['W', 'S'].map((combination) => ({ cap: `C${i + 1}`, combination, V: p.V, Mx: 0, My: p.My ?? 0 })),
    ),
  },
})
const one: Layout = { kind: 'points', points: [{ x: 0, y: 0 }] }
const four: Layout = { kind: 'grid', columns: 2, rows: 2, spacing: 1.8 }
const settled = (s: Schedule, trace = false) => assess(s, { trace }).result.caps.map((c) => c.settlement[0]!)

test('caps on one pile each, side by side: the settlements of the same piles under a flexible cap', () => {
  const places = [
    { x: 0, y: 0, V: 500 },
    { x: 3, y: 0, V: 800 },
    { x: 1, y: 4, V: 300 },
  ]
  const alone = settled(schedule(one, places, false))
  const together = settled(schedule(one, places, true))
  const alpha = (s: number) => {
    const points = [
      { x: 0, y: 0 },
      { x: s, y: 0 },
    ]
    const { group } = calculateSettlement(
      { pile, ground, layout: { kind: 'points', points }, load: { V: 1000 } },
      { trace: false },
    ).result as unknown as { group: { settlementRatio: number } }
    return group.settlementRatio - 1
  }
  for (const [i, p] of places.entries()) {
    let expected = alone[i]!.settlement
    for (const [j, q] of places.entries())
      if (i !== j) expected += (alone[j]!.settlement * alpha(Math.hypot(p.x - q.x, p.y - q.y))) as number
    expect(together[i]!.settlement / expected).toBeCloseTo(1, 9)
  }
})

test('an unloaded cap follows its neighbour down and leans towards it; equal caps settle alike; the trace replays', () => {
  const s = schedule(
    four,
    [
      { x: 0, y: 0, V: 4000 },
      { x: 6, y: 0, V: 0 },
      { x: -6, y: 0, V: 0 },
    ],
    true,
  )
  const answer = assess(s, { trace: true })
  const [loaded, right, left] = answer.result.caps.map((c) => c.settlement[0]!)
  expect(right!.settlement).toBeGreaterThan(0.05 * loaded!.settlement)
  expect(right!.settlement).toBeLessThan(loaded!.settlement)
  expect(right!.settlement).toBeCloseTo(left!.settlement, 12)
  expect(right!.tilt).toBeGreaterThan(0)
  expect(replay({ steps: answer.trace!.steps }, s).steps.filter((step) => !step.holds)).toEqual([])
})

test('work is reciprocal: the moment of one cap on the settlement of the other is the load of the other on its slope', () => {
  const at = [
    { x: 0, y: 0 },
    { x: 5, y: 1 },
  ] as const
  const moment = settled(
    schedule(
      four,
      [
        { ...at[0], V: 0, My: 1000 },
        { ...at[1], V: 0 },
      ],
      true,
    ),
  )
  const load = assess(
    schedule(
      four,
      [
        { ...at[0], V: 0 },
        { ...at[1], V: 1000 },
      ],
      true,
    ),
    { trace: true },
  )
  const slope = load.trace!.steps.find((step) => step.id.includes('C1') && step.id.endsWith('t_x'))!
  expect((slope.value * 1000) / moment[1]!.settlement).toBeCloseTo(1, 9)
})

test('far caps as single points: within 0.3 % of all their piles', () => {
  const places = (l: number) => [
    { x: 0, y: 0, V: 4000 },
    { x: l, y: 0, V: 0 },
  ]
  // Just below and just above eight times both extents.
  const reach = Math.hypot(0.9, 0.9)
  const near = settled(schedule(four, places(16 * reach * 0.9999), true))[1]!.settlement
  const far = settled(schedule(four, places(16 * reach * 1.0001), true))[1]!.settlement
  expect(Math.abs(far / near - 1)).toBeLessThan(0.003)
})
