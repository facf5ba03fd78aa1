import { readFileSync } from 'node:fs'
import { expect, test } from 'vitest'
import { parse } from '../../../src/contract/parse.ts'
import { scheduleRequest } from '../../../src/contract/schedule.ts'
import type { ModelRow, Schedule } from '../../../src/engine/assessment/schedule.ts'
import { assess } from '../../../src/engine/index.ts'

const example: Schedule = parse(
  scheduleRequest,
  JSON.parse(readFileSync(new URL('../../../schema/examples/assessment.json', import.meta.url), 'utf8')),
)
const rows = example.loads.rows as readonly ModelRow[]
const withRows = (changed: readonly ModelRow[]): Schedule => ({
  ...example,
  loads: { ...example.loads, rows: changed },
})

test('the worst of each kind of check is told with how many were made and how many exceed', () => {
  const { summary, caps, neighbours } = assess(example, { trace: false }).result
  const all = [
    ...caps.flatMap((c) => c.checks),
    ...neighbours.map((n) => ({ ...n, check: 'angular-distortion', utilisation: n.utilisation! })),
  ]
  expect(summary.checks.map((c) => c.check)).toEqual([...new Set(all.map((c) => c.check))])
  for (const kind of summary.checks) {
    const own = all.filter((c) => c.check === kind.check)
    expect(kind.utilisation).toBe(Math.max(...own.map((c) => c.utilisation)))
    expect(kind.count).toBe(own.length)
    expect(kind.exceeded).toBe(own.filter((c) => !c.satisfied).length)
  }
})

test('neighbours that exceed their limit are the worst check where nothing else is worse', () => {
  const tight = { ...example, limits: { ...example.limits, angularDistortion: 1e-6 } }
  const { summary, neighbours } = assess(tight, { trace: false }).result
  const worst = [...neighbours].sort((a, b) => b.utilisation! - a.utilisation!)[0]!
  expect(worst.utilisation).toBeGreaterThan(10)
  const { a, b, combination, utilisation } = worst
  expect(summary.worst).toEqual({ cap: a, neighbour: b, check: 'angular-distortion', combination, utilisation })
  expect(summary.checks.find((c) => c.check === 'angular-distortion')!.exceeded).toBeGreaterThan(0)
})

test('without a limit of the angular distortion no neighbours are counted', () => {
  const { angularDistortion: _, ...limits } = example.limits!
  const { summary } = assess({ ...example, limits }, { trace: false }).result
  expect(summary.checks.map((c) => c.check)).not.toContain('angular-distortion')
})

test('a cap without a combination that others have says so, and no other cap does', () => {
  const [cap, combination] = [rows[0]!.cap, rows[0]!.combination]
  const { result } = assess(withRows(rows.slice(1)), { trace: false })
  const told = result.caps.flatMap((c) => c.notices.filter((n) => n.code === 'missing-combinations'))
  expect(told).toHaveLength(1)
  expect(told[0]).toMatchObject({ level: 'warning', pointer: '/caps/0' })
  expect(told[0]!.text).toContain(`Cap "${cap}" has no row for ${combination}, which other caps have`)
})

test('a combination that no cap has, or that is not checked, is no cap’s lack', () => {
  const combinations = {
    ...example.loads.combinations,
    idle: { limitState: 'working' },
    factored: { limitState: 'ultimate' },
  } as const
  const more = { ...rows[0]!, combination: 'factored' }
  const { result } = assess(
    { ...example, loads: { ...example.loads, combinations, rows: [...rows, more] } as Schedule['loads'] },
    { trace: false },
  )
  expect(result.caps.flatMap((c) => c.notices.map((n) => n.code))).not.toContain('missing-combinations')
})

test('horizontal loads and torsion are named once when they are left out, and not when they are zero', () => {
  const bare = rows.map((row) => ({ ...row, Fx: 0, Fy: 0, Mz: 0 }))
  const codes = (schedule: Schedule) => assess(schedule, { trace: false }).notices.map((n) => n.code)
  expect(codes(withRows(bare))).toEqual(['usual-cautions'])
  const pushed = assess(withRows(bare.map((row) => ({ ...row, Fx: 12, Mz: -3 }))), { trace: false })
  expect(pushed.notices.map((n) => n.code)).toEqual(['usual-cautions', 'loads-not-used'])
  expect(pushed.notices[1]!.text).toContain('does not use Fx, Mz:')
  expect(pushed.result.caps).toEqual(assess(withRows(bare), { trace: false }).result.caps)
})
