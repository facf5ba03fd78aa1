import { expect, test } from 'vitest'
import { replay } from '../../../src/engine/replay/replay.ts'
import { sliceTrace } from '../../../src/engine/trace/slice.ts'
import { adHocSteps } from '../replay/ad-hoc.ts'

const steps = adHocSteps()
const trace = {
  steps,
  results: { '/force': 'R', '/force2': 'W', '/parts/0': 'low/R', '/parts/1': 'high/R' },
  sources: [],
}
const ids = (pointer: string) => sliceTrace(trace, pointer).steps.map((s) => s.id)

test('a slice holds what the number depends on, in order, and nothing else', () => {
  expect(ids('/parts/0')).toEqual(['phi', 'sigma_v', 'd', 'q/0', 'q/1', 'q/2', 'f', 'A', 'q_min', 'low/R'])
  expect(ids('/force').at(-1)).toBe('R')
  expect(sliceTrace(trace, '/force').results).toEqual({ '/force': 'R' })
})

test('a pointer to an object takes all numbers below it; an unknown one gives nothing', () => {
  expect(ids('/parts')).toEqual(
    [...new Set(steps.map((s) => s.id))].filter((id) => [...ids('/parts/0'), ...ids('/parts/1')].includes(id)),
  )
  expect(ids('/nothing')).toEqual([])
})

test('a slice is closed: it replays on its own', () => {
  for (const pointer of Object.keys(trace.results)) expect(replay(sliceTrace(trace, pointer)).holds, pointer).toBe(true)
})
