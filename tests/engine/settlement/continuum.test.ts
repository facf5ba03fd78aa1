import fc from 'fast-check'
import { expect, test } from 'vitest'
import { calculateSettlement, type EngineFault } from '../../../src/engine/index.ts'
import type { SettlementRequest } from '../../../src/engine/requests.ts'
import { mindlin, mindlinLine } from '../../../src/engine/settlement/continuum/elastic-half-space.ts'
import type {
  ElasticLayer,
  ElasticPile,
  ElasticProfile,
} from '../../../src/engine/settlement/continuum/elastic-profile.ts'
import { interactionAt, interactionCurve } from '../../../src/engine/settlement/continuum/interaction-curve.ts'
import { solvePile } from '../../../src/engine/settlement/continuum/single-pile.ts'

/** Layers by thickness, modulus and Poisson's ratio; a modulus of two is linear. */
function profile(spec: readonly [number, number | [number, number], number][], rigidBase = false): ElasticProfile {
  let z = 0
  const layers = spec.map(([h, E, nu]): ElasticLayer => {
    const top = z
    z += h
    return { top, bottom: z, nu, E: typeof E === 'number' ? { top: E, bottom: E } : { top: E[0], bottom: E[1] } }
  })
  return { layers, rigidBase }
}
const pile = (d = 0.6, L = 15, more: Partial<ElasticPile> = {}): ElasticPile => ({
  head: 0,
  toe: L,
  radius: d / 2,
  baseRadius: d / 2,
  axialStiffness: (30e6 * Math.PI * d * d) / 4,
  ...more,
})
const deep = Number.POSITIVE_INFINITY
const hard: readonly (readonly [string, ElasticPile, ElasticProfile])[] = [
  [
    'a crust',
    pile(),
    profile([
      [3, 50e3, 0.3],
      [deep, 10e3, 0.3],
    ]),
  ],
  [
    'a thin crust 20 times stiffer',
    pile(),
    profile([
      [1, 200e3, 0.3],
      [deep, 10e3, 0.3],
    ]),
  ],
  [
    'a weak incompressible seam',
    pile(),
    profile([
      [7, 40e3, 0.5],
      [0.5, 1e3, 0.5],
      [deep, 40e3, 0.5],
    ]),
  ],
  [
    'a soft layer under the toe',
    pile(),
    profile([
      [15.3, 60e3, 0.3],
      [3, 3e3, 0.5],
      [deep, 60e3, 0.3],
    ]),
  ],
  ['a rigid base at 1.05 L', pile(), profile([[15.75, 25e3, 0.3]], true)],
  ['a toe on rock', pile(), profile([[15, 25e3, 0.3]], true)],
  [
    'a toe on ground 80 times stiffer',
    pile(),
    profile([
      [15, 10e3, 0.3],
      [deep, 800e3, 0.3],
    ]),
  ],
  [
    'an enlarged base',
    pile(0.6, 12, { baseRadius: 0.9 }),
    profile([
      [8, 15e3, 0.5],
      [deep, 50e3, 0.3],
    ]),
  ],
  [
    'a modulus growing with depth',
    pile(),
    profile([
      [30, [1e3, 61e3], 0.3],
      [deep, 61e3, 0.3],
    ]),
  ],
  [
    'a head below the surface',
    pile(0.6, 18, { head: 3 }),
    profile([
      [2, 5e3, 0.3],
      [deep, 25e3, 0.4],
    ]),
  ],
  [
    'a slender pile in three layers',
    pile(0.5, 50),
    profile([
      [10, 8e3, 0.5],
      [20, 20e3, 0.3],
      [deep, 60e3, 0.3],
    ]),
  ],
]

test.each(hard)('%s: twice the elements change the settlement by less than 0.5 %', (_, p, ground) => {
  const [once, twice] = [solvePile(p, ground), solvePile(p, ground, 2)]
  expect(Math.abs(once.stiffness / twice.stiffness - 1)).toBeLessThan(0.005)
  expect(once.compatibility).toBeLessThan(1e-10)
  expect(Math.abs(once.forces.reduce((s, q) => s + q, 0) / once.stiffness - 1)).toBeLessThan(1e-12)
})

test.each(hard)(
  '%s: the flexibility is symmetric and positive definite, and the curve is met between its nodes',
  (_, p, ground) => {
    const solved = solvePile(p, ground)
    const own = solved.soil.own()
    const n = solved.soil.size
    console.info(`raw asymmetry ${solved.soil.asymmetry.toExponential(1)} of the diagonal`)
    expect(solved.soil.asymmetry).toBeLessThan(0.02)
    for (let i = 0; i < n; i++)
      for (let j = 0; j < i; j++)
        expect(Math.abs(own[i * n + j]! - own[j * n + i]!)).toBeLessThan(1e-8 * own[i * n + i]! + 1e-15)
    const curve = interactionCurve(solved)
    // Half way between two nodes of the curve, in ln(spacing), at distances where caps stand.
    for (const at of [2, 5, 8]) {
      const s = Math.sqrt(curve.spacings[at]! * curve.spacings[at + 1]!)
      expect(Math.abs(curve.at(s) - interactionAt(solved, s))).toBeLessThan(0.002 * curve.at(s) + 1e-4)
    }
  },
)

test('Mindlin (1936) at four places, 1000 kN, E = 20 MPa; the first is Boussinesq [formula, memory]', () => {
  const cases = [
    [1, 0, 0, 0.3, 14.4831],
    [2, 10, 10, 0.5, 3.86471],
    [3, 5, 10, 0.3, 2.73103],
    [0.5, 12, 10, 0.2, 5.37542],
  ] as const
  for (const [r, z, c, nu, w] of cases) {
    const G = 20_000 / (2 * (1 + nu))
    expect(Math.abs((1e6 * mindlin(z, c, r, nu)) / (16 * Math.PI * G * (1 - nu)) / w - 1)).toBeLessThan(5e-4)
  }
})

test('the line of load is the integral of the point', () => {
  fc.assert(
    fc.property(
      fc.double({ min: 0.1, max: 20, noNaN: true }),
      fc.double({ min: 0.05, max: 20, noNaN: true }),
      fc.double({ min: 0, max: 0.5, noNaN: true }),
      (z, r, nu) => {
        const h = 1e-4
        const slope = (mindlinLine(z, 7 + h, r, nu) - mindlinLine(z, 7 - h, r, nu)) / (2 * h)
        expect(slope / mindlin(z, 7, r, nu)).toBeCloseTo(1, 5)
      },
    ),
  )
})

test('equal layers are homogeneous ground to 1e-6; a very thick layer is a half-space', () => {
  for (const nu of [0, 0.3, 0.5]) {
    const whole = solvePile(pile(), profile([[deep, 30e3, nu]])).stiffness
    const cut = solvePile(pile(), {
      ...profile([
        [6, 30e3, nu],
        [12, 30e3, nu],
        [deep, 30e3, nu],
      ]),
    }).stiffness
    // The cut pile has its own mesh: the same cuts in ground that differs in the twelfth digit keep to the layered path.
    const layered = solvePile(
      pile(),
      profile([
        [6, 30e3, nu],
        [12, 30e3 * (1 + 1e-12), nu],
        [deep, 30e3, nu],
      ]),
    ).stiffness
    expect(Math.abs(layered / cut - 1)).toBeLessThan(1e-6)
    expect(Math.abs(cut / whole - 1)).toBeLessThan(1e-3)
    const thick = solvePile(pile(), profile([[15_000, 30e3, nu]], true)).stiffness
    expect(Math.abs(thick / whole - 1)).toBeLessThan(1e-3)
  }
})

test('a rigid pile does not compress; piles far apart do not know each other; more ground stiffness, less settlement', () => {
  const stiff = solvePile(pile(0.6, 15, { axialStiffness: 1e15 }), profile([[deep, 30e3, 0.3]]))
  const stiffer = solvePile(pile(0.6, 15, { axialStiffness: 1e16 }), profile([[deep, 30e3, 0.3]]))
  expect(stiff.stiffness / stiffer.stiffness).toBeCloseTo(1, 8)
  const curve = interactionCurve(stiff)
  expect(curve.at(1e5)).toBeLessThan(1e-4)
  expect(curve.at(1e6) / curve.at(1e5)).toBeCloseTo(0.1, 6)
  fc.assert(
    fc.property(fc.double({ min: 0.2, max: 5, noNaN: true }), fc.integer({ min: 0, max: 2 }), (factor, which) => {
      const moduli = [10e3, 30e3, 20e3]
      const spec = (E: readonly number[]) =>
        profile([
          [5, E[0]!, 0.3],
          [6, E[1]!, 0.4],
          [deep, E[2]!, 0.3],
        ])
      const changed = moduli.map((E, i) => (i === which ? E * factor : E))
      const [before, after] = [solvePile(pile(), spec(moduli)).stiffness, solvePile(pile(), spec(changed)).stiffness]
      expect(Math.sign(after - before)).toBe(
        Math.abs(factor - 1) < 1e-9 ? Math.sign(after - before) : Math.sign(factor - 1),
      )
    }),
    { numRuns: 30 },
  )
})

const request: SettlementRequest = {
  pile: { section: { shape: 'circular', diameter: 0.6 }, length: 15, headDepth: 1, installation: 'bored' },
  ground: {
    layers: [
      {
        name: 'clay',
        unitWeight: 18,
        soil: 'cohesive',
        thickness: 8,
        undrainedShearStrength: { top: 30, bottom: 60 },
        youngsModulus: { top: 9000, bottom: 20_000 },
      },
      { name: 'stiff', unitWeight: 20, soil: 'cohesive', undrainedShearStrength: 150, youngsModulus: 60_000 },
    ],
  },
  layout: { kind: 'grid', columns: 3, rows: 3, spacing: 1.8 },
  load: { V: 5000, My: 600 },
}
type Answer = {
  single: {
    settlement: number
    stiffness: number
    curve?: { load: number; settlement: number }[]
    axial?: { axialLoad: number }[]
    load: number
    baseLoadShare: number
  }
  group: {
    settlement: number
    curve?: { load: number; settlement: number }[]
    piles: { load: number }[]
    stiffness: { atOrigin: { flexibility: number[][]; stiffness: number[][] } }
  }
}
const run = (more: Partial<SettlementRequest>) =>
  calculateSettlement({ ...request, ...more }, { trace: false }).result as unknown as Answer
const faults = (more: Partial<SettlementRequest>) => {
  try {
    run(more)
  } catch (fault) {
    return (fault as EngineFault).faults
  }
  throw new Error('nothing was refused')
}

test('the axial load starts at the head and ends at the base', () => {
  const { single } = run({})
  const last = single.axial!.at(-1)!.axialLoad
  expect(last / (single.load * single.baseLoadShare)).toBeCloseTo(1, 8)
  for (const [i, row] of single.axial!.entries())
    if (i > 0) expect(row.axialLoad).toBeLessThan(single.axial![i - 1]!.axialLoad)
})

test('the stiffness matrix is the inverse of the flexibility, and both are symmetric', () => {
  const { flexibility: F, stiffness: K } = run({
    layout: {
      kind: 'points',
      points: [
        { x: 0, y: 0 },
        { x: 3, y: 1 },
        { x: -1, y: 4 },
        { x: 5, y: 5 },
      ],
    },
  }).group.stiffness.atOrigin
  for (let r = 0; r < 3; r++)
    for (let c = 0; c < 3; c++) {
      expect(K[r]![c]! / K[c]![r]!).toBeCloseTo(1, 8)
      expect(F[r]![c]! / F[c]![r]!).toBeCloseTo(1, 8)
      const sum = [0, 1, 2].reduce((s, i) => s + F[r]![i]! * K[i]![c]!, 0)
      expect(sum).toBeCloseTo(r === c ? 1 : 0, 8)
    }
})

test('coupled in full: below superposition, by up to 14 %; equal for one pile', () => {
  const [loose, full] = [run({}).group.settlement, run({ coupling: 'full' }).group.settlement]
  expect(full).toBeLessThan(loose)
  expect(full).toBeGreaterThan(0.86 * loose)
  const lone = { layout: { kind: 'points' as const, points: [{ x: 0, y: 0 }] }, load: { V: 700 } }
  expect(run({ ...lone, coupling: 'full' }).group.settlement / run(lone).group.settlement).toBeCloseTo(1, 9)
})

test('softening springs: elastic at small load, softer with more, never less settlement for more load, ending at the resistance', () => {
  const soft = { nonlinearity: 'hyperbolic' as const, layout: undefined }
  expect(
    run({ ...soft, load: { V: 1 } }).single.settlement / run({ layout: undefined, load: { V: 1 } }).single.settlement,
  ).toBeCloseTo(1, 2)
  const straight = { ...soft, failureRatio: { shaft: 0, base: 0 } }
  // Without softening the law is elastic until elements slip.
  expect(
    run({ ...straight, load: { V: 100 } }).single.settlement /
      run({ layout: undefined, load: { V: 100 } }).single.settlement,
  ).toBeCloseTo(1, 6)
  const { curve } = run({ ...soft, load: { V: 900 } }).single
  for (const [i, p] of curve!.entries())
    if (i > 1) {
      expect(p.load).toBeGreaterThan(curve![i - 1]!.load)
      expect((p.settlement - curve![i - 1]!.settlement) / (p.load - curve![i - 1]!.load)).toBeGreaterThan(
        (0.999 * curve![i - 1]!.settlement) / curve![i - 1]!.load,
      )
    }
  const [elastic, hyperbolic] = [run({}).group, run({ nonlinearity: 'hyperbolic' }).group]
  expect(hyperbolic.settlement).toBeGreaterThan(elastic.settlement)
  expect(hyperbolic.piles.reduce((s, p) => s + p.load, 0)).toBeCloseTo(5000, 4)
  // The corner piles soften first: they carry less than elastic ones.
  expect(hyperbolic.piles[8]!.load).toBeLessThan(elastic.piles[8]!.load)
  expect(hyperbolic.curve!.length).toBeGreaterThan(6)
})

test('points of a curve carry the residual that they were found with; the method that nobody named is told', () => {
  const answer = calculateSettlement({ ...request, nonlinearity: 'hyperbolic' }, { trace: true })
  const found = answer.trace!.steps.flatMap((s) => (s.kind === 'solution' && s.id.includes('curve/') ? [s] : []))
  expect(found.some((s) => s.symbol === 'P') && found.some((s) => s.symbol === 's')).toBe(true)
  expect(found.filter((s) => s.residuals[0]!.value > 0).length).toBeGreaterThan(found.length / 2)
  expect(found.filter((s) => s.residuals[0]!.value > s.tolerance)).toEqual([])
  expect(answer.notices.some((n) => n.code === 'default-used' && n.text.includes('elastic-continuum'))).toBe(true)
})

test('what cannot be answered is refused with its reason', () => {
  expect(faults({ failureRatio: { shaft: 0.7 } })).toMatchObject([{ pointer: '/failureRatio' }])
  expect(faults({ methods: {} })).toMatchObject([{ pointer: '/methods' }])
  expect(faults({ layout: { kind: 'grid', columns: 2, rows: 2, spacing: 0.8 } })).toMatchObject([
    { code: 'piles-too-close', pointer: '/layout', facts: { spacing: 0.8 } },
  ])
  expect(faults({ nonlinearity: 'hyperbolic', load: { V: 90_000 } })).toMatchObject([
    { code: 'load-beyond-resistance' },
  ])
  expect(faults({ coupling: 'full', method: 'randolph-wroth-1978' })).toMatchObject([
    { code: 'method-not-applicable', pointer: '/coupling' },
  ])
  expect(faults({ coupling: 'full', layout: { kind: 'grid', columns: 9, rows: 9, spacing: 2 } })).toMatchObject([
    { code: 'method-not-applicable' },
  ])
  const [clay, stiff] = request.ground.layers
  const { youngsModulus: _, ...without } = clay!
  expect(faults({ ground: { layers: [without, stiff!] } })).toMatchObject([
    { code: 'missing-parameter', facts: { layer: 'clay', method: 'elastic-continuum' } },
  ])
  expect(faults({ layout: { kind: 'grid', columns: 4, rows: 1, spacing: 2 }, load: { V: 100, Mx: 50 } })).toMatchObject(
    [{ code: 'line-cannot-take-moment' }],
  )
})
