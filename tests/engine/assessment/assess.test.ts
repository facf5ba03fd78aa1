import { readFileSync } from 'node:fs'
import { expect, test } from 'vitest'
import { capActions } from '../../../src/engine/assessment/cap-loads.ts'
import { neighbourPairs } from '../../../src/engine/assessment/neighbours.ts'
import type { Cap, Loads } from '../../../src/engine/assessment/schedule.ts'
import { replay } from '../../../src/engine/index.ts'
import type { Problem } from '../../../src/errors.ts'
import { assessSchedule } from '../../../src/operations/assess-schedule.ts'

// biome-ignore lint/suspicious/noExplicitAny: an example that the tests bend out of shape
const example = (): any =>
  JSON.parse(readFileSync(new URL('../../../schema/examples/assessment.json', import.meta.url), 'utf8'))

function faultsOf(bend: (schedule: ReturnType<typeof example>) => void): [string, string][] {
  const schedule = example()
  bend(schedule)
  try {
    assessSchedule(schedule, { trace: false })
  } catch (problem) {
    return (problem as Problem).errors.map((e) => [e.pointer, e.code])
  }
  return []
}

test('every number of the result is the value of a step; the trace is closed; trace off changes nothing', () => {
  const answer = assessSchedule(example(), { trace: true })
  const steps = new Map(answer.trace!.steps.map((s) => [s.id, s]))
  let numbers = 0
  const walk = (node: unknown, pointer: string): void => {
    if (typeof node === 'number') {
      numbers++
      expect(steps.get(answer.trace!.results[pointer] ?? '')?.value, pointer).toBe(node)
    } else if (node && typeof node === 'object') for (const [k, v] of Object.entries(node)) walk(v, `${pointer}/${k}`)
  }
  walk(answer.result, '')
  expect(numbers).toBeGreaterThan(300)
  const seen = new Set<string>()
  for (const step of answer.trace!.steps) {
    if ('operands' in step) for (const o of step.operands) expect(seen.has(o.from), `${step.id}: ${o.from}`).toBe(true)
    seen.add(step.id)
  }
  expect(assessSchedule(example(), { trace: false }).result).toEqual(answer.result)
})

test('the full trace of one cap: every combination of every check, the same result, replayable', () => {
  const whole = assessSchedule(example(), { trace: true })
  const one = assessSchedule(example(), { trace: true, cap: 'C1' })
  expect(one.result).toEqual(whole.result)
  const ids = one.trace!.steps.map((s) => s.id)
  for (const combination of ['W1', 'W2']) expect(ids).toContain(`caps/C1/pile-compression/${combination}/u`)
  expect(ids.some((id) => id.startsWith('caps/') && !id.startsWith('caps/C1/'))).toBe(false)
  expect(replay(one.trace!).steps.filter((s) => !s.holds)).toEqual([])
  expect(() => assessSchedule(example(), { trace: true, cap: 'Z9' })).toThrow()
})

test('the example shows block failure, uplift and an exceeded limit', () => {
  const { result } = assessSchedule(example(), { trace: false })
  const checks = (mark: string) => result.caps.find((c) => c.mark === mark)!.checks
  const of = (mark: string, kind: string) => checks(mark).find((c) => c.check === kind)
  expect(of('B1', 'block-compression')!.utilisation).toBeGreaterThan(of('B1', 'group-compression')!.utilisation)
  expect(of('C1', 'pile-uplift')).toBeDefined()
  expect(result.summary.caps).toBe(6)
  expect(result.summary.satisfied + result.summary.exceeded).toBe(6)
  expect(result.summary.exceeded).toBeGreaterThan(0)
  expect(result.summary.worst!.utilisation).toBe(
    Math.max(...result.caps.flatMap((c) => c.checks.map((k) => k.utilisation))),
  )
})

test.each<[Loads['signs'], Loads['loadsAre'], [number, number, number]]>([
  // Fz 100, Mx 20, My 30: V, Mx, My.
  ['right-handed-z-up', 'actions', [-100, -20, 30]],
  ['right-handed-z-up', 'reactions', [100, 20, -30]],
  ['right-handed-z-down', 'actions', [100, 20, -30]],
  ['right-handed-z-down', 'reactions', [-100, -20, 30]],
])('%s %s', (signs, loadsAre, [V, Mx, My]) => {
  const row = { cap: 'C', combination: 'W', Fx: 0, Fy: 0, Fz: 100, Mx: 20, My: 30, Mz: 0 }
  expect(capActions({ signs, loadsAre, combinations: {}, rows: [row] }, row, 7)).toEqual({ V: V + 7, Mx, My })
})

test('faults of a schedule are told together, with what is known', () => {
  expect(
    faultsOf((s) => {
      s.caps[0].ground = 'BH9'
      s.caps[1].mark = 'A1'
    }).map(([, code]) => code),
  ).toContain('duplicate-mark')
  expect(
    faultsOf((s) => {
      s.caps[0].ground = 'BH9'
    }),
  ).toEqual([['/caps/0/ground', 'unknown-reference']])
  expect(
    faultsOf((s) => {
      s.loads.rows[4].combination = 'X'
    })[0],
  ).toEqual(['/loads/rows/4/combination', 'unknown-reference'])
  expect(
    faultsOf((s) => {
      s.loads.rows[3].Fz = 'about 3'
    }),
  ).toEqual([['/loads/rows/3/Fz', 'not-a-number']])
})

test('what the engine refuses is told of every pile type, layout and cap at once', () => {
  const faults = faultsOf((s) => {
    s.pileTypes.B600.length = 90
    s.ground[s.caps[0].ground].layers.at(-1).thickness = 3
    s.caps[2].layout = { kind: 'ring', count: 2, radius: 0.05 }
  })
  expect(faults.map((f) => f.join(' '))).toEqual([
    '/pileTypes/B600/length pile-below-known-ground',
    '/caps/2/layout piles-overlap',
  ])
})

test('factored loads against an overall factor are refused', () => {
  const faults = faultsOf((s) => {
    for (const c of Object.values<{ limitState: string }>(s.loads.combinations)) c.limitState = 'ultimate'
  })
  expect(faults).toEqual([['/loads/combinations', 'limit-state-mismatch']])
})

const caps = (xy: [number, number][]): Cap[] =>
  xy.map(([x, y], i) => ({
    mark: `C${i}`,
    x,
    y,
    ground: '',
    pileType: '',
    layout: { kind: 'points', points: [{ x: 0, y: 0 }] },
  }))

test('neighbours: none, one, a line, a square', () => {
  const edges = (xy: [number, number][]) => neighbourPairs(caps(xy)).map((p) => `${p.a}-${p.b}`)
  expect(edges([[0, 0]])).toEqual([])
  expect(
    edges([
      [0, 0],
      [3, 4],
    ]),
  ).toEqual(['0-1'])
  expect(
    neighbourPairs(
      caps([
        [0, 0],
        [3, 4],
      ]),
    )[0]!.distance,
  ).toBe(5)
  expect(
    edges([
      [0, 0],
      [10, 10],
      [5, 5],
      [20, 20],
    ]),
  ).toEqual(['0-2', '1-2', '1-3'])
  expect(
    edges([
      [0, 0],
      [4, 0],
      [0, 4],
      [4, 4.1],
    ]),
  ).toHaveLength(5)
})
