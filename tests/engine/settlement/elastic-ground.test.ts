import { expect, test } from 'vitest'
import { EngineFault } from '../../../src/engine/faults.ts'
import type { Layer } from '../../../src/engine/ground/profile-types.ts'
import { calculateSettlement } from '../../../src/engine/index.ts'
import type { SettlementRequest } from '../../../src/engine/requests.ts'

const clay = (rest: Partial<Layer>): Layer => ({ name: 'clay', unitWeight: 18, soil: 'cohesive', ...rest }) as Layer
const sand = (rest: Partial<Layer>): Layer => ({ name: 'sand', unitWeight: 19, soil: 'granular', ...rest }) as Layer
const request = (layers: Layer[], rest: Partial<SettlementRequest['pile']> = {}): SettlementRequest => ({
  pile: { section: { shape: 'circular', diameter: 0.6 }, length: 12, headDepth: 1, installation: 'bored', ...rest },
  ground: { layers },
  load: { V: 800 },
  method: 'randolph-wroth-1978',
})
const run = (r: SettlementRequest) => calculateSettlement(r, { trace: true })
const step = (r: SettlementRequest, id: string) => run(r).trace!.steps.find((s) => s.id === id)
const faults = (r: SettlementRequest) => {
  try {
    run(r)
  } catch (fault) {
    expect(fault).toBeInstanceOf(EngineFault)
    return (fault as EngineFault).faults
  }
  throw new Error('nothing was refused')
}

test('every layer along the shaft and under the toe that lacks its modulus is named at once; one above the head is not', () => {
  const layers = [
    clay({ name: 'fill', thickness: 1 }),
    clay({ name: 'soft clay', thickness: 5 }),
    sand({ name: 'sand', thickness: 7, youngsModulus: 30_000 }),
    clay({ name: 'deep clay' }),
  ]
  expect(faults(request(layers))).toEqual([
    {
      pointer: '/ground/layers/1',
      code: 'missing-parameter',
      facts: { layer: 'soft clay', parameter: 'youngsModulus', method: 'randolph-wroth-1978' },
    },
    {
      pointer: '/ground/layers/3',
      code: 'missing-parameter',
      facts: { layer: 'deep clay', parameter: 'youngsModulus', method: 'randolph-wroth-1978' },
    },
  ])
})

test('the mean shear modulus is weighted with thickness, and a modulus may grow with depth', () => {
  const layers = [
    clay({ thickness: 5, youngsModulus: 6000 }),
    sand({ thickness: 20, youngsModulus: { top: 20_000, bottom: 60_000 } }),
  ]
  // Head 1 m, toe 13 m: clay from 1 to 5 m, sand from 5 to 13 m, its middle at 9 m: E = 20 + 40 * 4/20 = 28 MPa; toe: 36 MPa.
  const mean = ((4 * 6000) / 3 + (8 * 28_000) / 2.6) / 12
  expect(step(request(layers), 'stiffness/rho')!.value).toBeCloseTo(mean / (36_000 / 2.6), 12)
  expect(step(request(layers), 'stiffness/xi')!.value).toBe(1)
})

test("Poisson's ratio is 0.5 in cohesive ground and 0.3 elsewhere, as defaults with their reason", () => {
  const layers = [clay({ thickness: 5, youngsModulus: 6000 }), sand({ youngsModulus: 30_000 })]
  expect(step(request(layers), 'ground/0/nu')).toMatchObject({ value: 0.5, default: true })
  expect(step(request(layers), 'ground/1/nu')).toMatchObject({ value: 0.3, default: true })
})

test('a pile below the last layer is settled on that layer carried on with the modulus of its bottom, with a warning', () => {
  const short = [clay({ thickness: 8, youngsModulus: { top: 4000, bottom: 10_000 } })]
  const long = [clay({ thickness: 8, youngsModulus: { top: 4000, bottom: 10_000 } }), clay({ youngsModulus: 10_000 })]
  expect(run(request(short)).result.single).toEqual(run(request(long)).result.single)
  expect(run(request(short)).notices).toContainEqual(
    expect.objectContaining({ code: 'ground-carried-on', level: 'warning', pointer: '/ground/layers/0' }),
  )
  expect(run(request(long)).notices.map((n) => n.code)).not.toContain('ground-carried-on')
})

test('a rigid base: refused above the toe, and said to be left out below it', () => {
  const base = (thickness: number): SettlementRequest => {
    const r = request([sand({ thickness, youngsModulus: 30_000 })])
    return { ...r, ground: { ...r.ground, rigidBase: true } }
  }
  expect(faults(base(10))).toMatchObject([{ code: 'pile-below-known-ground', pointer: '/pile/length' }])
  expect(run(base(20)).notices).toContainEqual(
    expect.objectContaining({ code: 'approximation', pointer: '/ground/rigidBase' }),
  )
})

test('softer ground below the toe, and a shaft in much softer ground, are outside the published range; even ground is not', () => {
  const codes = (layers: Layer[]) => run(request(layers)).notices.map((n) => n.code)
  expect(codes([sand({ youngsModulus: 30_000 })])).not.toContain('outside-range')
  expect(codes([sand({ thickness: 13, youngsModulus: 30_000 }), clay({ youngsModulus: 10_000 })])).toContain(
    'outside-range',
  )
  expect(codes([clay({ thickness: 10, youngsModulus: 3000 }), sand({ youngsModulus: 60_000 })])).toContain(
    'outside-range',
  )
})

test('ground so stiff at the toe that the shaft has no zone of influence is refused with a reason', () => {
  const layers = [clay({ thickness: 12.9, youngsModulus: 1000 }), sand({ youngsModulus: 5e6 })]
  expect(faults(request(layers))).toMatchObject([{ code: 'method-not-applicable', pointer: '/ground' }])
})

test('the default modulus of the pile goes with its material, and a tube counts as a solid of its axial stiffness', () => {
  const layers = [sand({ youngsModulus: 30_000 })]
  expect(step(request(layers), 'pile/E_p')).toMatchObject({ value: 30e6, default: true })
  const tube = request(layers, {
    section: { shape: 'tubular', diameter: 0.6, wallThickness: 0.02, toe: 'closed' },
    installation: 'driven',
  })
  expect(step(tube, 'pile/E_p')).toMatchObject({ value: 210e6, default: true })
  expect(step(tube, 'stiffness/E_pe')!.value / (210e6 * ((0.6 ** 2 - 0.56 ** 2) / 0.6 ** 2))).toBeCloseTo(1, 12)
})
