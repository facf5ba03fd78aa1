import fc from 'fast-check'
import { expect, test } from 'vitest'
import { EngineFault } from '../../src/engine/faults.ts'
import type { Answer } from '../../src/engine/index.ts'
import { calculateBlock, calculateGroup, calculateSinglePile, replay } from '../../src/engine/index.ts'
import type { GroupRequest } from '../../src/engine/requests.ts'

/** Ground that every method can answer: all parameters given. */
const layer = fc.oneof(
  fc.record({
    name: fc.constant('clay'),
    soil: fc.constant('cohesive' as const),
    thickness: fc.double({ min: 0.5, max: 9, noNaN: true }),
    unitWeight: fc.double({ min: 14, max: 22, noNaN: true }),
    effectiveFrictionAngle: fc.double({ min: 18, max: 30, noNaN: true }),
    overconsolidationRatio: fc.double({ min: 1, max: 6, noNaN: true }),
    undrainedShearStrength: fc.oneof(
      fc.double({ min: 10, max: 240, noNaN: true }),
      fc.record({
        top: fc.double({ min: 10, max: 100, noNaN: true }),
        bottom: fc.double({ min: 20, max: 200, noNaN: true }),
      }),
    ),
  }),
  fc.record({
    name: fc.constant('sand'),
    soil: fc.constant('granular' as const),
    thickness: fc.double({ min: 0.5, max: 9, noNaN: true }),
    unitWeight: fc.double({ min: 14, max: 22, noNaN: true }),
    frictionAngle: fc.double({ min: 26, max: 40, noNaN: true }),
    relativeDensity: fc.double({ min: 36, max: 95, noNaN: true }),
    sptN60: fc.double({ min: 5, max: 50, noNaN: true }),
  }),
)
const section = fc.oneof(
  fc.record({ shape: fc.constant('circular' as const), diameter: fc.double({ min: 0.3, max: 1.5, noNaN: true }) }),
  fc.record({ shape: fc.constant('square' as const), width: fc.double({ min: 0.2, max: 0.6, noNaN: true }) }),
  fc.record({
    shape: fc.constant('tubular' as const),
    diameter: fc.double({ min: 0.4, max: 1.2, noNaN: true }),
    wallThickness: fc.double({ min: 0.008, max: 0.03, noNaN: true }),
    toe: fc.constantFrom('open' as const, 'closed' as const),
  }),
  fc.record({
    shape: fc.constant('h' as const),
    depth: fc.double({ min: 0.2, max: 0.4, noNaN: true }),
    flangeWidth: fc.double({ min: 0.2, max: 0.4, noNaN: true }),
    area: fc.double({ min: 0.008, max: 0.02, noNaN: true }),
  }),
)
const methods = fc.record({
  cohesiveShaft: fc.constantFrom(
    'rp2geo-2011',
    'rp2a-1984',
    'randolph-murphy-1985',
    'kolk-van-der-velde-1996',
    'skempton-1959',
    'oneill-reese-1999',
    'gec10-2018',
    'burland-1973',
    { method: 'specified-alpha', alpha: 0.45 } as const,
  ),
  cohesiveBase: fc.constantFrom('skempton-1951', 'linear-depth', 'nhi-2006', 'oneill-reese-1999', {
    method: 'specified-nc',
    bearingFactor: 9,
  } as const),
  granularShaft: fc.constantFrom('beta-effective-stress', 'navfac-1986', 'rp2geo-2011', 'oneill-reese-1999', {
    method: 'specified-beta',
    beta: 0.3,
  } as const),
  granularBase: fc.constantFrom('navfac-1986', 'janbu-1976', 'rp2geo-2011', 'oneill-reese-1999'),
}) as fc.Arbitrary<GroupRequest['methods']>
const designBasis = fc.constantFrom(
  undefined,
  { format: 'overall-factor', factor: 2.5, split: { shaft: 1.5, base: 3 } },
  ...['DA1-1', 'DA1-2', 'DA2', 'DA3'].map((approach) => ({
    format: 'en1997-1-2004',
    approach,
    characteristic: { route: 'model-factor', value: 1.4 },
  })),
  { format: 'custom', shaft: 0.45, base: 0.4, block: 0.55, uplift: 0.35 },
) as fc.Arbitrary<GroupRequest['designBasis']>

const request: fc.Arbitrary<GroupRequest> = fc.record({
  pile: fc.record({
    section,
    length: fc.double({ min: 3, max: 12, noNaN: true }),
    headDepth: fc.double({ min: 0, max: 2, noNaN: true }),
    installation: fc.constantFrom('driven' as const, 'bored' as const, 'continuous-flight-auger' as const),
  }),
  ground: fc.record({
    waterTableDepth: fc.option(fc.double({ min: 0, max: 12, noNaN: true }), { nil: undefined }),
    layers: fc
      .tuple(
        layer,
        layer,
        layer,
        fc.constant({
          name: 'deep clay',
          soil: 'cohesive' as const,
          unitWeight: 20,
          undrainedShearStrength: 120,
          effectiveFrictionAngle: 24,
        }),
      )
      .map((l) => [...l]),
  }),
  direction: fc.constantFrom('compression' as const, 'uplift' as const),
  layout: fc.constantFrom(
    { kind: 'grid', columns: 3, rows: 2, spacing: 4 } as const,
    { kind: 'ring', count: 5, radius: 4 } as const,
    {
      kind: 'points',
      points: [
        { x: 0, y: 0 },
        { x: 5, y: 1 },
      ],
    } as const,
  ),
  methods,
  designBasis,
})

/** Every number of a result is the value of the step that it is tied to. */
function complete(answer: Answer<unknown>): void {
  const steps = new Map(answer.trace!.steps.map((s) => [s.id, s]))
  const walk = (node: unknown, pointer: string): void => {
    if (typeof node === 'number') expect(steps.get(answer.trace!.results[pointer] ?? '')?.value, pointer).toBe(node)
    else if (node && typeof node === 'object') for (const [k, v] of Object.entries(node)) walk(v, `${pointer}/${k}`)
  }
  walk(answer.result, '')
}

test('closed, complete, replayable, and the same with the trace off: 1000 generated requests', {
  timeout: 240_000,
}, () => {
  let answered = 0
  fc.assert(
    fc.property(request, fc.constantFrom(calculateSinglePile, calculateBlock, calculateGroup), (asked, calculate) => {
      const { layout, ...single } = asked
      const input = (calculate === calculateSinglePile ? single : asked) as GroupRequest
      let answer: Answer<unknown>
      try {
        answer = calculate(input, { trace: true })
      } catch (fault) {
        // Some methods refuse some strengths; the refusal names where.
        expect(fault).toBeInstanceOf(EngineFault)
        for (const f of (fault as EngineFault).faults) {
          expect(['method-not-applicable', 'missing-thickness', 'piles-overlap']).toContain(f.code)
        }
        return
      }
      answered++
      complete(answer)
      expect(calculate(input, { trace: false }).result).toEqual(answer.result)
      expect(JSON.stringify(calculate(input, { trace: true }))).toBe(JSON.stringify(answer))
      expect(replay(answer.trace!, input).steps.filter((step) => !step.holds)).toEqual([])
    }),
    { numRuns: 1000 },
  )
  expect(answered).toBeGreaterThan(600)
})
