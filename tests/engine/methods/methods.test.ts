import { describe, expect, test } from 'vitest'
import { EngineFault } from '../../../src/engine/faults.ts'
import { defaultMethod } from '../../../src/engine/methods/defaults.ts'
import { baseMethods, shaftMethods } from '../../../src/engine/methods/registry.ts'
import { replay } from '../../../src/engine/replay/replay.ts'
import { bibliography } from '../../../src/engine/sources/bibliography.ts'
import { citedSources } from '../../../src/engine/trace/outcome.ts'
import { clay, type Met, onBase, onShaft, type Place, sand } from './place.ts'

/** Ground with every parameter, and what the methods demand of the request. */
const full = {
  clay: clay(90, { effectiveFrictionAngle: 24, overconsolidationRatio: 2 }),
  sand: sand({ frictionAngle: 34, relativeDensity: 70, sptN60: 25 }),
}
const settings: Record<string, Place['settings']> = {
  'specified-alpha': { alpha: 0.45 },
  'specified-beta': { beta: 0.3 },
  'specified-nc': { bearingFactor: 9 },
}
type Ask = (place?: Partial<Place>) => Met
const shafts = Object.entries(shaftMethods).flatMap(([role, table]) =>
  Object.entries(table).map(([id, method]) => {
    const ground = role === 'cohesiveShaft' ? full.clay : full.sand
    const ask: Ask = (place) =>
      onShaft(role as keyof typeof shaftMethods, id, { ground, settings: settings[id], ...place })
    return { role, id, method, ask }
  }),
)
const bases = Object.entries(baseMethods).flatMap(([role, table]) =>
  Object.entries(table).map(([id, method]) => {
    const ground = role === 'cohesiveBase' ? full.clay : full.sand
    const ask: Ask = (place) =>
      onBase(role as keyof typeof baseMethods, id, { ground, settings: settings[id], ...place })
    return { role, id, method, ask }
  }),
)
const all = [...shafts, ...bases]

const faultOf = (ask: () => unknown) => {
  try {
    ask()
  } catch (error) {
    if (error instanceof EngineFault) return error.faults[0]!
    throw error
  }
  throw new Error('nothing was refused')
}

test('23 methods, each with an id, a kind and a source of the bibliography', () => {
  expect(all.map((m) => m.id)).toHaveLength(23)
  for (const { role, id, method } of all) {
    expect(method.id, role).toBe(id)
    expect(
      method.kind.replace(/-(.)/, (_, c: string) => c.toUpperCase()),
      id,
    ).toBe(role)
    expect(Object.hasOwn(bibliography, method.source), id).toBe(true)
  }
})

describe.each(all)('$role $id', ({ id, method, ask }) => {
  test('gives a stress, and cites only the bibliography', () => {
    const met = ask()
    expect(met.value).toBeGreaterThan(0)
    expect(citedSources(met.steps).every((s) => s !== undefined)).toBe(true)
  })

  test('its steps replay, and it lists the formulas that it used', () => {
    const met = ask()
    const steps = met.steps.filter((s) => s.id.startsWith('shaft/') || s.id.startsWith('base/'))
    const used = steps.flatMap((s) => (s.kind === 'formula' && !['sigma_v'].includes(s.symbol) ? [s.formula] : []))
    expect(used.length).toBeGreaterThan(0)
    expect(method.formulas.map((f) => f.text)).toEqual(expect.arrayContaining(used))
    const trace = { steps: met.steps, results: {}, sources: citedSources(met.steps) }
    const done = replay(trace)
    expect(done.steps.filter((s) => !s.holds)).toEqual([])
  })

  test('refuses ground without what it needs, by layer, parameter and method', () => {
    for (const need of method.needs) {
      const bare = { ...(method.kind.startsWith('cohesive') ? full.clay : full.sand), [need]: undefined }
      const fault = faultOf(() => ask({ ground: bare }))
      expect(fault).toMatchObject({
        code: 'missing-parameter',
        pointer: '/ground/layers/0',
        facts: { parameter: need, method: id, layer: bare.name },
      })
    }
  })

  test('warns of an installation that it was not published for, and of no other', () => {
    for (const installation of ['driven', 'bored', 'continuous-flight-auger'] as const) {
      const told = ask({ installation }).notices.filter((n) => n.text.includes('was published for'))
      expect(
        told.map((n) => n.code),
        installation,
      ).toEqual(method.installations.includes(installation) ? [] : ['outside-range'])
    }
  })

  test('refuses a request that leaves out what it demands', () => {
    const demanded = Object.entries(method.parameters).filter(([, p]) => p.required)
    expect(demanded.length).toBe(id in settings ? 1 : 0)
    for (const [parameter] of demanded) {
      expect(faultOf(() => ask({ settings: {} }))).toMatchObject({
        code: 'missing-parameter',
        facts: { parameter, method: id },
      })
    }
  })

  test('every parameter that a request may set moves the answer', () => {
    for (const [name, p] of Object.entries(method.parameters)) {
      const [low, high] = [p.min, p.max].map((value) => ask({ settings: { ...settings[id], [name]: value } }).value)
      expect(low, name).not.toBe(high)
    }
  })
})

describe('outside the published range', () => {
  const codes = (met: Met) => met.notices.map((n) => [n.code, n.pointer])
  const layer = '/ground/layers/0'

  test('rp2geo-2011: strength ratio above 3', () => {
    expect(codes(onShaft('cohesiveShaft', 'rp2geo-2011', { ground: clay(300) }))).toEqual([])
    expect(codes(onShaft('cohesiveShaft', 'rp2geo-2011', { ground: clay(301) }))).toEqual([['outside-range', layer]])
  })

  test('oneill-reese-1999 refuses clay above 2.5 atmospheres', () => {
    const at = (c_u: number) =>
      onShaft('cohesiveShaft', 'oneill-reese-1999', { ground: clay(c_u), installation: 'bored' })
    expect(at(250).value).toBeCloseTo(112.5, 9)
    expect(faultOf(() => at(250.1))).toMatchObject({
      code: 'method-not-applicable',
      pointer: `${layer}/undrainedShearStrength`,
      facts: { method: 'oneill-reese-1999', got: 250.1, limit: 250 },
    })
  })

  test('oneill-reese-1999: movement governs wide bases', () => {
    const at = (breadth: number) =>
      codes(onBase('cohesiveBase', 'oneill-reese-1999', { ground: clay(90), breadth, installation: 'bored' }))
    expect(at(1.9)).toEqual([])
    expect(at(1.91)).toEqual([['base-movement-governs', undefined]])
  })

  test('navfac-1986 holds N_q at the ends of its table', () => {
    const at = (frictionAngle: number) =>
      onBase('granularBase', 'navfac-1986', { ground: sand({ frictionAngle }), length: 5 })
    expect(at(20).value).toBe(at(26).value)
    expect(at(44).value).toBe(at(40).value)
    expect([20, 26, 40, 44].map((phi) => codes(at(phi)))).toEqual([
      [['outside-range', layer]],
      [],
      [],
      [['outside-range', layer]],
    ])
  })

  test('rp2geo-2011 refuses loose sand', () => {
    const ground = sand({ relativeDensity: 34.9 })
    for (const ask of [
      () => onShaft('granularShaft', 'rp2geo-2011', { ground }),
      () => onBase('granularBase', 'rp2geo-2011', { ground }),
    ]) {
      expect(faultOf(ask)).toMatchObject({ code: 'method-not-applicable', pointer: `${layer}/relativeDensity` })
    }
  })

  test('oneill-reese-1999 in sand: N60 above 50; janbu-1976: angles outside 75 to 105', () => {
    const spt = (sptN60: number) =>
      codes(onBase('granularBase', 'oneill-reese-1999', { ground: sand({ sptN60 }), installation: 'bored' }))
    expect([50, 51].map((n) => spt(n).length)).toEqual([0, 1])
    const janbu = (plastificationAngle: number) =>
      codes(onBase('granularBase', 'janbu-1976', { ground: full.sand, settings: { plastificationAngle } }))
    expect([74, 75, 105, 106].map((a) => janbu(a).length)).toEqual([1, 0, 0, 1])
  })
})

test('navfac-1986 holds the stress below 20 widths, of the pile and of the block', () => {
  const tall = {
    ground: sand({ frictionAngle: 34 }),
    section: { shape: 'circular', diameter: 0.3 } as const,
    length: 12,
  }
  const shaft = (depth: number) => onShaft('granularShaft', 'navfac-1986', { ...tall, depth }).value
  expect(shaft(11)).toBe(shaft(6))
  expect(shaft(3)).toBeCloseTo(shaft(6) / 2, 9)
  expect(onBase('granularBase', 'navfac-1986', tall).value).toBeCloseTo(6 * 20 * 42, 9)
  expect(onBase('granularBase', 'navfac-1986', { ...tall, breadth: 3 }).value).toBeCloseTo(12 * 20 * 42, 9)
})

test('the held stress is that of the ground above, below water too', () => {
  const layers = [
    { ...sand({ frictionAngle: 30 }), thickness: 4, unitWeight: 18 },
    { ...sand({ frictionAngle: 34 }), unitWeight: 20 },
  ]
  const ground = { waterTableDepth: 2, layers }
  const section = { shape: 'circular', diameter: 0.3 } as const
  // At 20 d = 6 m: 2 × 18 + 2 × (18 − 9.81) + 2 × (20 − 9.81) = 72.76 kPa.
  expect(onBase('granularBase', 'navfac-1986', { ground, section, length: 15 }).value).toBeCloseTo(72.76 * 42, 6)
})

test('a limit of the project caps the effective stress shaft', () => {
  const at = (limit?: number) =>
    onShaft('granularShaft', 'beta-effective-stress', { ground: full.sand, settings: limit ? { limit } : {} }).value
  expect(at(20)).toBe(20)
  expect(at(1000)).toBe(at())
})

test('bored shaft methods in clay leave the top 1.5 m out, the others nothing', () => {
  const idle = shafts.filter((m) => 'idleDepth' in m.method).map((m) => [m.role, m.id, m.method.idleDepth])
  expect(idle).toEqual([
    ['cohesiveShaft', 'oneill-reese-1999', 1.5],
    ['cohesiveShaft', 'gec10-2018', 1.5],
  ])
})

test('defaults exist, suit the installation, and give a reason', () => {
  for (const installation of ['driven', 'bored', 'continuous-flight-auger'] as const) {
    for (const role of ['cohesiveShaft', 'cohesiveBase', 'granularShaft', 'granularBase'] as const) {
      const { id, reason } = defaultMethod(role, installation)
      const found = all.find((m) => m.role === role && m.id === id)
      expect(found?.method.installations, `${role} ${installation}`).toContain(installation)
      expect(reason.length).toBeGreaterThan(10)
    }
  }
  expect(defaultMethod('cohesiveShaft', 'driven').id).toBe('rp2geo-2011')
  expect(defaultMethod('cohesiveShaft', 'bored').id).toBe('oneill-reese-1999')
  expect(defaultMethod('cohesiveShaft', 'continuous-flight-auger').id).toBe('oneill-reese-1999')
  expect(defaultMethod('cohesiveBase', 'bored').id).toBe('skempton-1951')
  expect(defaultMethod('granularShaft', 'driven').id).toBe('beta-effective-stress')
  expect(defaultMethod('granularBase', 'driven').id).toBe('navfac-1986')
})
