import { gaussLegendre } from '../../numerics/gauss-legendre.ts'

/** Around a ring: theta = pi t^3 meets the logarithm at theta = 0. */
const AROUND = gaussLegendre(8)
const ALONG_PUNCH = gaussLegendre(6)

/** Distances between two bodies, with weights that sum to 1. */
export type Distances = { readonly r: Float64Array; readonly weight: Float64Array }

/** Distances between the points of two coaxial rings, seen in plan. */
export function aroundRing(a: number, b: number): Distances {
  const n = AROUND.nodes.length
  const r = new Float64Array(n)
  const weight = new Float64Array(n)
  for (let i = 0; i < n; i++) {
    const t = AROUND.nodes[i]!
    r[i] = Math.sqrt((a - b) ** 2 + 4 * a * b * Math.sin((Math.PI * t ** 3) / 2) ** 2)
    weight[i] = AROUND.weights[i]! * 3 * t * t
  }
  return { r, weight }
}

/** A ring of radius a and a punch of radius b: the punch is rings of b sin(t), each loaded by sin(t) dt. */
export function ringAndPunch(a: number, b: number): Distances {
  const r: number[] = []
  const weight: number[] = []
  for (let i = 0; i < ALONG_PUNCH.nodes.length; i++) {
    const t = (Math.PI / 2) * ALONG_PUNCH.nodes[i]!
    const ring = aroundRing(a, b * Math.sin(t))
    for (let j = 0; j < ring.r.length; j++) {
      r.push(Math.max(ring.r[j]!, 1e-9))
      weight.push(ring.weight[j]! * ALONG_PUNCH.weights[i]! * (Math.PI / 2) * Math.sin(t))
    }
  }
  return { r: Float64Array.from(r), weight: Float64Array.from(weight) }
}
