import { INCOMPRESSIBLE } from './elastic-half-space.ts'
import { type ElasticProfile, layerAt, modulusAt, SAME } from './elastic-profile.ts'

/** Cuts of a layer whose modulus grows with depth, where no source cuts it. */
const LINEAR_CUTS = 12

/**
 * Vertical displacements of a layered elastic half-space in the Hankel domain: for a wavenumber k, the amplitude at each source
 * depth for a unit vertical load at each other. Exact for layers of constant modulus; a layer of linear modulus is cut into slices.
 *
 * Each slice has a 4 x 4 stiffness in its faces' radial and vertical amplitudes (U, W), here split into the parts that are even
 * and odd about its middle; these stay regular for thin slices, long waves and nu = 0.5. The profile is block tridiagonal with
 * 2 x 2 blocks; two sweeps give the stiffness seen upwards and downwards from each node, a third the off-diagonal terms.
 */
export class LayeredGreen {
  readonly sources: Int32Array
  readonly #n: number
  readonly #thickness: Float64Array
  readonly #mu: Float64Array
  readonly #nu: Float64Array
  readonly #rigid: boolean
  /** Blocks per node: diagonal from the slice above and below, coupling to the next node, sweeps. Four numbers each. */
  readonly #above: Float64Array
  readonly #below: Float64Array
  readonly #couple: Float64Array
  readonly #up: Float64Array
  readonly #down: Float64Array
  readonly #carry: Float64Array

  /** `depths` of the sources, increasing. */
  constructor(profile: ElasticProfile, depths: Float64Array) {
    const cuts: number[] = [0, ...depths]
    for (const layer of profile.layers) {
      if (!Number.isFinite(layer.bottom)) continue
      cuts.push(layer.bottom)
      if (layer.E.top === layer.E.bottom) continue
      for (let i = 1; i < LINEAR_CUTS; i++) cuts.push(layer.top + ((layer.bottom - layer.top) * i) / LINEAR_CUTS)
    }
    cuts.sort((a, b) => a - b)
    const end = profile.rigidBase ? profile.layers.at(-1)!.bottom : Number.POSITIVE_INFINITY
    const nodes = cuts.filter((z, i) => (i === 0 || z - cuts[i - 1]! > SAME) && z < end + SAME)
    this.#rigid = profile.rigidBase
    const slices = this.#rigid ? nodes.length - 1 : nodes.length
    this.#n = this.#rigid ? nodes.length - 1 : nodes.length
    this.#thickness = new Float64Array(slices)
    this.#mu = new Float64Array(slices)
    this.#nu = new Float64Array(slices)
    for (let i = 0; i < slices; i++) {
      const next = nodes[i + 1] ?? Number.POSITIVE_INFINITY
      const middle = Number.isFinite(next) ? (nodes[i]! + next) / 2 : nodes[i]! + 2 * SAME
      const layer = layerAt(profile, middle)
      const nu = Math.min(layer.nu, INCOMPRESSIBLE)
      this.#thickness[i] = next - nodes[i]!
      this.#nu[i] = nu
      this.#mu[i] = modulusAt(layer, middle) / (2 * (1 + nu))
    }
    this.sources = Int32Array.from(depths, (z) => nodes.findIndex((node) => Math.abs(node - z) <= SAME))
    const blocks = () => new Float64Array(4 * (this.#n + 1))
    this.#above = blocks()
    this.#below = blocks()
    this.#couple = blocks()
    this.#up = blocks()
    this.#down = blocks()
    this.#carry = blocks()
  }

  /** Fills `out`, row-major over the sources, with u(k) such that u(r) is the integral of u(k) J0(kr) k dk for a unit load; symmetric. */
  at(k: number, out: Float64Array): void {
    this.#assemble(k)
    this.#sweep()
    const { sources } = this
    const count = sources.length
    const carry = this.#carry
    const scale = 1 / (2 * Math.PI)
    for (let j = 0; j < count; j++) {
      const at = sources[j]!
      // A source on rigid rock moves nothing.
      if (at >= this.#n) {
        for (let i = 0; i <= j; i++) out[i * count + j] = out[j * count + i] = 0
        continue
      }
      const o = 4 * at
      const d0 = this.#up[o]! + this.#down[o]!
      const d1 = this.#up[o + 1]! + this.#down[o + 1]!
      const d3 = this.#up[o + 3]! + this.#down[o + 3]!
      const det = d0 * d3 - d1 * d1
      let u = (-d1 / det) * scale
      let w = (d0 / det) * scale
      let i = j
      for (let node = at; i >= 0; node--) {
        if (node < at) {
          const p = 4 * node
          const next = carry[p]! * u + carry[p + 1]! * w
          w = carry[p + 2]! * u + carry[p + 3]! * w
          u = next
        }
        while (i >= 0 && sources[i] === node) {
          out[i * count + j] = out[j * count + i] = w
          i--
        }
      }
    }
  }

  /** Stiffness of every slice; the half-space below the last node. */
  #assemble(k: number): void {
    const n = this.#n
    this.#above.fill(0, 0, 4)
    for (let i = 0; i < this.#mu.length; i++) {
      const nu = this.#nu[i]!
      const m = 2 * this.#mu[i]! * k
      const o = 4 * i
      if (i === n - 1 && !this.#rigid) {
        const f = m / (3 - 4 * nu)
        this.#below[o] = this.#below[o + 3] = f * 2 * (1 - nu)
        this.#below[o + 1] = this.#below[o + 2] = f * (1 - 2 * nu)
        continue
      }
      this.#slice(k * this.#thickness[i]!, m, nu, o)
    }
  }

  /** Even and odd stiffness of a slice of kh, scaled by exp(-kh) so that nothing overflows. */
  #slice(kh: number, m: number, nu: number, o: number): void {
    const x = kh / 2
    const p = 1 - 2 * nu
    const dash = 1 - nu
    const e = Math.exp(-kh)
    const ss = (1 - e) * (1 - e)
    const cc = (1 + e) * (1 + e)
    const sc = 1 - e * e
    const xe = 4 * x * e
    // sinh(2x)/2 - x by its series where the difference would lose digits.
    const even = 2 * p * sc + (kh < 1 ? 4 * e * excess(kh) : sc - xe)
    const odd = (3 - 4 * nu) * sc + xe
    const fe = (0.5 * m) / even
    const fo = (0.5 * m) / odd
    const e0 = fe * 2 * dash * ss
    const e1 = fe * (xe - p * sc)
    const e3 = fe * 2 * dash * cc
    const o0 = fo * 2 * dash * cc
    const o1 = fo * (-xe - p * sc)
    const o3 = fo * 2 * dash * ss
    this.#below[o] = e0 + o0
    this.#below[o + 1] = this.#below[o + 2] = -(e1 + o1)
    this.#below[o + 3] = e3 + o3
    this.#above[o + 4] = e0 + o0
    this.#above[o + 5] = this.#above[o + 6] = e1 + o1
    this.#above[o + 7] = e3 + o3
    // Force at the upper face for a movement of the lower one.
    this.#couple[o] = e0 - o0
    this.#couple[o + 1] = e1 - o1
    this.#couple[o + 2] = o1 - e1
    this.#couple[o + 3] = o3 - e3
  }

  /** Stiffness of all that lies above (`up`) and below (`down`) each node, and how a movement carries to the node above. */
  #sweep(): void {
    const n = this.#n
    const [up, down, B] = [this.#up, this.#down, this.#couple]
    for (let i = 0; i < 4; i++) up[i] = 0
    for (let i = 0; i + 1 < n; i++) {
      const o = 4 * i
      const a = up[o]! + this.#below[o]!
      const b = up[o + 1]! + this.#below[o + 1]!
      const d = up[o + 3]! + this.#below[o + 3]!
      const det = a * d - b * b
      const [b0, b1, b2, b3] = [B[o]!, B[o + 1]!, B[o + 2]!, B[o + 3]!]
      const c0 = -(d * b0 - b * b2) / det
      const c1 = -(d * b1 - b * b3) / det
      const c2 = -(a * b2 - b * b0) / det
      const c3 = -(a * b3 - b * b1) / det
      this.#carry[o] = c0
      this.#carry[o + 1] = c1
      this.#carry[o + 2] = c2
      this.#carry[o + 3] = c3
      up[o + 4] = this.#above[o + 4]! + b0 * c0 + b2 * c2
      up[o + 5] = up[o + 6] = this.#above[o + 5]! + b0 * c1 + b2 * c3
      up[o + 7] = this.#above[o + 7]! + b1 * c1 + b3 * c3
    }
    const last = 4 * (n - 1)
    for (let i = 0; i < 4; i++) down[last + i] = this.#below[last + i]!
    for (let i = n - 2; i >= 0; i--) {
      const o = 4 * i
      const a = down[o + 4]! + this.#above[o + 4]!
      const b = down[o + 5]! + this.#above[o + 5]!
      const d = down[o + 7]! + this.#above[o + 7]!
      const det = a * d - b * b
      const [b0, b1, b2, b3] = [B[o]!, B[o + 1]!, B[o + 2]!, B[o + 3]!]
      // B D^-1 B^T
      const t0 = (b0 * d - b1 * b) / det
      const t1 = (b1 * a - b0 * b) / det
      const t2 = (b2 * d - b3 * b) / det
      const t3 = (b3 * a - b2 * b) / det
      down[o] = this.#below[o]! - (t0 * b0 + t1 * b1)
      down[o + 1] = down[o + 2] = this.#below[o + 1]! - (t0 * b2 + t1 * b3)
      down[o + 3] = this.#below[o + 3]! - (t2 * b2 + t3 * b3)
    }
  }
}

/** sinh(y)/2 - y/2 for y < 1. */
function excess(y: number): number {
  const yy = y * y
  return ((y * yy) / 12) * (1 + (yy / 20) * (1 + (yy / 42) * (1 + (yy / 72) * (1 + yy / 110))))
}
