import { readFileSync } from 'node:fs'
import fc from 'fast-check'
import { expect, test } from 'vitest'
import { parse } from '../../src/contract/parse.ts'
import { scheduleRequest } from '../../src/contract/schedule.ts'
import type { EngineFault } from '../../src/engine/faults.ts'
import { assess, calculateSettlement, replay } from '../../src/engine/index.ts'
import type { SettlementRequest } from '../../src/engine/requests.ts'

const real = (min: number, max: number) => fc.double({ min, max, noNaN: true })
const layer = (modulus: fc.Arbitrary<number | { top: number; bottom: number }>) =>
  fc.record({
    name: fc.constant('ground'),
    soil: fc.constantFrom('cohesive' as const, 'granular' as const),
    unitWeight: fc.constant(19),
    thickness: real(0.5, 9),
    youngsModulus: modulus,
    poissonsRatio: fc.option(real(0, 0.5), { nil: undefined }),
  })
const modulus = fc.oneof(real(3e3, 2e5), fc.record({ top: real(3e3, 1e5), bottom: real(3e3, 1e5) }))
const request: fc.Arbitrary<SettlementRequest> = fc.record({
  pile: fc.record({
    section: fc.constantFrom(
      { shape: 'circular', diameter: 0.6 } as const,
      { shape: 'square', width: 0.4 } as const,
      { shape: 'tubular', diameter: 0.7, wallThickness: 0.012, toe: 'open' } as const,
      { shape: 'h', depth: 0.3, flangeWidth: 0.3, area: 0.012 } as const,
    ),
    length: real(5, 25),
    headDepth: fc.option(real(0, 2), { nil: undefined }),
    installation: fc.constant('bored' as const),
    baseDiameter: fc.option(fc.constant(1.1), { nil: undefined }),
  }),
  ground: fc.record({
    layers: fc
      .tuple(
        layer(modulus),
        layer(modulus),
        layer(real(2e4, 9e4)).map((l) => ({ ...l, thickness: undefined })),
      )
      .map((l) => [...l]),
  }),
  layout: fc.constantFrom(
    undefined,
    { kind: 'grid', columns: 3, rows: 2, spacing: 2 } as const,
    { kind: 'ring', count: 5, radius: 3 } as const,
    {
      kind: 'points',
      points: [
        { x: 0, y: 0 },
        { x: 3, y: 1 },
        { x: 1, y: 4 },
      ],
    } as const,
  ),
  load: fc.record({
    V: real(100, 5000),
    Mx: fc.option(real(-500, 500), { nil: undefined }),
    My: fc.option(real(-500, 500), { nil: undefined }),
  }),
  cap: fc.constantFrom('rigid' as const, 'flexible' as const),
})

type Traced = {
  result: unknown
  trace?: { steps: readonly { id: string; value: number }[]; results: Readonly<Record<string, string>> }
}
function complete({ result, trace }: Traced): void {
  const steps = new Map(trace!.steps.map((s) => [s.id, s]))
  const walk = (node: unknown, pointer: string): void => {
    if (typeof node === 'number') expect(steps.get(trace!.results[pointer] ?? '')?.value, pointer).toBe(node)
    else if (node && typeof node === 'object') for (const [k, v] of Object.entries(node)) walk(v, `${pointer}/${k}`)
  }
  walk(result, '')
}

test('settlement: complete, replayable, the same with the trace off: 400 generated requests', {
  timeout: 120_000,
}, () => {
  let answered = 0
  fc.assert(
    fc.property(request, (asked) => {
      let answer: ReturnType<typeof calculateSettlement>
      try {
        answer = calculateSettlement(asked, { trace: true })
      } catch (fault) {
        expect((fault as EngineFault).faults.map((f) => f.code)).toEqual(['method-not-applicable'])
        return
      }
      answered++
      complete(answer)
      expect(replay(answer.trace!, asked).steps.filter((s) => !s.holds)).toEqual([])
      expect(calculateSettlement(asked, { trace: false }).result).toEqual(answer.result)
    }),
    { numRuns: 400 },
  )
  expect(answered).toBeGreaterThan(200)
})

test.each(['overall-factor', 'DA1-1', 'DA1-2', 'DA2', 'DA3', 'custom'])(
  'an assessment under %s is complete and replayable',
  (format) => {
    const raw = JSON.parse(readFileSync(new URL('../../schema/examples/assessment.json', import.meta.url), 'utf8'))
    if (format === 'custom') raw.designBasis = { format, shaft: 0.45, base: 0.4, block: 0.55, uplift: 0.35 }
    if (format.startsWith('DA'))
      raw.designBasis = {
        format: 'en1997-1-2004',
        approach: format,
        characteristic: { route: 'profiles', count: 3, stiffStructure: true },
      }
    if (format !== 'overall-factor')
      raw.loads.combinations = {
        W1: { limitState: 'ultimate' },
        W2: { limitState: 'ultimate' },
        S1: { limitState: 'serviceability' },
      }
    const schedule = parse(scheduleRequest, raw)
    const answer = assess(schedule, { trace: true })
    complete(answer)
    expect(replay(answer.trace!, schedule).steps.filter((s) => !s.holds)).toEqual([])
  },
)
