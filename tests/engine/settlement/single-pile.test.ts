import { expect, test } from 'vitest'
import { calculateSettlement } from '../../../src/engine/index.ts'
import type { SettlementRequest } from '../../../src/engine/requests.ts'

/**
 * The pile as a column on shaft springs 2 pi G rho / zeta and a base spring 4 r_b G_b / (1 - nu), marched from toe to head
 * (Runge-Kutta, 4000 steps): the differential equation behind the closed form, solved without it.
 */
function march(L: number, d: number, d_b: number, E_p: number, G_L: number, G_b: number, rho: number, nu: number) {
  const r_0 = d / 2
  const r_m = (0.25 + (G_L / G_b) * (2.5 * rho * (1 - nu) - 0.25)) * L
  const shaft = (2 * Math.PI * G_L * rho) / Math.log(r_m / r_0)
  const EA = (E_p * Math.PI * d * d) / 4
  const base = (4 * (d_b / 2) * G_b) / (1 - nu)
  let [w, P] = [1, base]
  const h = L / 4000
  for (let i = 0; i < 4000; i++) {
    const [k1, m1] = [P / EA, shaft * w]
    const [k2, m2] = [(P + (h / 2) * m1) / EA, shaft * (w + (h / 2) * k1)]
    const [k3, m3] = [(P + (h / 2) * m2) / EA, shaft * (w + (h / 2) * k2)]
    const [k4, m4] = [(P + h * m3) / EA, shaft * (w + h * k3)]
    w += (h / 6) * (k1 + 2 * k2 + 2 * k3 + k4)
    P += (h / 6) * (m1 + 2 * m2 + 2 * m3 + m4)
  }
  return { stiffness: P / w, baseLoadShare: base / P }
}

test.each([
  { L: 12, d: 0.6, d_b: 0.6, E_p: 30e6, E: 30_000, below: 30_000, nu: 0.3 },
  { L: 40, d: 0.6, d_b: 0.6, E_p: 20e6, E: 60_000, below: 60_000, nu: 0.5 },
  { L: 15, d: 0.9, d_b: 1.8, E_p: 30e6, E: 15_000, below: 90_000, nu: 0.2 },
])('stiffness, base share, settlement and influence factor of $L m, d = $d, base $d_b', (c) => {
  const layer = { name: 'ground', unitWeight: 19, soil: 'granular' as const, poissonsRatio: c.nu }
  const request: SettlementRequest = {
    pile: {
      section: { shape: 'circular', diameter: c.d },
      length: c.L,
      installation: 'bored',
      youngsModulus: c.E_p,
      baseDiameter: c.d_b,
    },
    ground: {
      layers: [
        { ...layer, thickness: c.L, youngsModulus: c.E },
        { ...layer, youngsModulus: c.below },
      ],
    },
    load: { V: 1500 },
    method: 'randolph-wroth-1978',
  }
  const { single } = calculateSettlement(request, { trace: false }).result
  const G = (E: number) => E / (2 * (1 + c.nu))
  const expected = march(c.L, c.d, c.d_b, c.E_p, G(c.E), G(c.below), 1, c.nu)
  expect(single.stiffness / expected.stiffness).toBeCloseTo(1, 8)
  expect(single.baseLoadShare / expected.baseLoadShare).toBeCloseTo(1, 8)
  expect(single.load).toBe(1500)
  expect(single.settlement / ((1500 / expected.stiffness) * 1000)).toBeCloseTo(1, 8)
  // I from s = P I / (E_s d), E_s of the ground above the toe.
  expect(single.influenceFactor / ((single.settlement / 1000) * ((c.E * c.d) / 1500))).toBeCloseTo(1, 10)
})
