import { gaussLegendre } from '../../numerics/gauss-legendre.ts'
import { bimaterial, divisor, INCOMPRESSIBLE, mindlin, mindlinLine, surfaceShare } from './elastic-half-space.ts'
import { type ElasticPile, type ElasticProfile, layerAt, modulusAt, SAME } from './elastic-profile.ts'
import {
  type Wavenumbers,
  wavenumbers,
  weightsAtDistance,
  weightsOfPunch,
  weightsOfRing,
  weightsOfRingAndPunch,
} from './hankel-weights.ts'
import { LayeredGreen } from './layered-green.ts'
import type { Mesh } from './mesh.ts'
import { aroundRing, type Distances, ringAndPunch } from './ring-distances.ts'

/** Two points an element stand for its length, both where it is loaded and where it is measured. */
const POINTS = gaussLegendre(2)

/**
 * What the ground around a pile answers: mean vertical displacement of each element (m shaft elements, then the base) for a unit
 * force on each other, of the same pile or of an equal pile at a distance; m/kN, symmetric. The shaft element is a ring with uniform
 * stress, the base a rigid punch.
 *
 * Each pair is the closed form of Mindlin for a homogeneous half-space with the pair's mean modulus, plus the difference that the
 * layers make, integrated over the wavenumbers.
 */
export class SoilFlexibility {
  readonly size: number
  readonly pile: ElasticPile
  readonly mesh: Mesh
  /** Largest difference of two mirrored entries of `own` before they are made equal, of the geometric mean of their diagonals; known after it. */
  asymmetry = 0
  readonly #depths: Float64Array
  readonly #E: Float64Array
  readonly #nu: Float64Array
  readonly #grid: Wavenumbers | undefined
  /** Difference to the homogeneous half-space by wavenumber, element by element; (size x size) per wavenumber. */
  readonly #difference: Float64Array
  /** Flexibility of the bimaterial at the base for short waves, times k. */
  readonly #punch: number
  readonly #onRock: boolean

  constructor(pile: ElasticPile, profile: ElasticProfile, mesh: Mesh) {
    this.pile = pile
    this.mesh = mesh
    const m = mesh.edges.length - 1
    this.size = m + 1
    this.#depths = new Float64Array(2 * m + 1)
    for (let i = 0; i < m; i++)
      for (let g = 0; g < 2; g++)
        this.#depths[2 * i + g] = mesh.edges[i]! + (mesh.edges[i + 1]! - mesh.edges[i]!) * POINTS.nodes[g]!
    this.#depths[2 * m] = pile.toe
    this.#E = new Float64Array(this.size)
    this.#nu = new Float64Array(this.size)
    for (let i = 0; i < m; i++) {
      const middle = (mesh.edges[i]! + mesh.edges[i + 1]!) / 2
      const layer = layerAt(profile, middle)
      this.#E[i] = modulusAt(layer, middle)
      this.#nu[i] = Math.min(layer.nu, INCOMPRESSIBLE)
    }
    const above = layerAt(profile, pile.toe)
    const below = layerAt(profile, pile.toe, 'below')
    this.#nu[m] = Math.min((above.nu + below.nu) / 2, INCOMPRESSIBLE)
    this.#E[m] = (modulusAt(above, pile.toe) + modulusAt(below, pile.toe)) / 2
    const end = profile.layers.at(-1)!.bottom
    this.#onRock = profile.rigidBase && pile.toe > end - SAME
    this.#punch = bimaterial(
      { E: modulusAt(above, pile.toe), nu: Math.min(above.nu, INCOMPRESSIBLE) },
      { E: modulusAt(below, pile.toe), nu: Math.min(below.nu, INCOMPRESSIBLE) },
    )
    const first = profile.layers[0]!
    const even = profile.layers.every((l) => l.E.top === first.E.top && l.E.bottom === first.E.top && l.nu === first.nu)
    this.#grid = even && !profile.rigidBase ? undefined : this.#gridFor(profile)
    this.#difference = this.#grid ? this.#differences(profile, this.#grid) : new Float64Array(0)
  }

  #gridFor(profile: ElasticProfile): Wavenumbers {
    const { pile, mesh } = this
    const boundaries = profile.layers.map((l) => l.bottom).filter(Number.isFinite)
    const reach = Math.max(pile.toe, ...boundaries)
    let finest = Number.POSITIVE_INFINITY
    for (let i = 0; i + 1 < mesh.edges.length; i++) finest = Math.min(finest, mesh.edges[i + 1]! - mesh.edges[i]!)
    const radius = Math.min(pile.radius, pile.baseRadius)
    return wavenumbers(0.02 / reach, Math.min(150 / radius, Math.max(40 / finest, 10 / radius)))
  }

  #differences(profile: ElasticProfile, { k }: Wavenumbers): Float64Array {
    const { size } = this
    const points = this.#depths.length
    const green = new LayeredGreen(profile, this.#depths)
    const at = new Float64Array(points * points)
    const out = new Float64Array(k.length * size * size)
    const half = this.#halfSpaceFactors()
    for (let i = 0; i < k.length; i++) {
      green.at(k[i]!, at)
      this.#subtract(k[i]!, at, half, out.subarray(i * size * size, (i + 1) * size * size))
    }
    return out
  }

  /** For each pair: 1/divisor, q and 8(1 - nu)^2 - q of its homogeneous half-space. */
  #halfSpaceFactors(): Float64Array {
    const { size } = this
    const out = new Float64Array(3 * size * size)
    for (let a = 0; a < size; a++)
      for (let b = 0; b < size; b++) {
        const nu = (this.#nu[a]! + this.#nu[b]!) / 2
        const q = 3 - 4 * nu
        const o = 3 * (a * size + b)
        out[o] = 1 / divisor((this.#E[a]! + this.#E[b]!) / 2, nu)
        out[o + 1] = q
        out[o + 2] = 8 * (1 - nu) ** 2 - q
      }
    return out
  }

  /** Layered less homogeneous, means over the two points of each element. */
  #subtract(k: number, at: Float64Array, half: Float64Array, out: Float64Array): void {
    const { size } = this
    const depths = this.#depths
    const points = depths.length
    const base = size - 1
    for (let p = 0; p < points; p++) {
      const a = p >> 1
      const z = depths[p]!
      for (let r = p; r < points; r++) {
        const b = r >> 1
        const c = depths[r]!
        const o = 3 * (a * size + b)
        const u = c - z
        const v = c + z
        const q = half[o + 1]!
        // Two punches: their near part is the bimaterial's, in closed form.
        const near = a === base ? this.#punch / k : half[o]! * (q / k + u) * Math.exp(-k * u)
        const image = half[o]! * (half[o + 2]! / k + q * v + 2 * c * z * k) * Math.exp(-k * v)
        const weight = (a === base ? 1 : 0.5) * (b === base ? 1 : 0.5)
        const difference = weight * (at[p * points + r]! - near - image)
        out[a * size + b]! += difference
        if (r !== p && a === b) out[a * size + b]! += difference
      }
    }
    for (let a = 0; a < size; a++) for (let b = 0; b < a; b++) out[a * size + b] = out[b * size + a]!
  }

  /** Adds the layers' difference under weights for shaft with shaft, shaft with base, base with base. */
  #addDifference(out: Float64Array, shaft: Float64Array, mixed: Float64Array, base: Float64Array): void {
    const { size } = this
    const square = size * size
    for (let i = 0; i < shaft.length; i++) {
      const [s, x, b] = [shaft[i]!, mixed[i]!, base[i]!]
      if (s === 0 && x === 0 && b === 0) continue
      const from = i * square
      for (let a = 0; a < size; a++) {
        const row = a * size
        for (let c = 0; c < size - 1; c++) out[row + c]! += (a < size - 1 ? s : x) * this.#difference[from + row + c]!
        out[row + size - 1]! += (a < size - 1 ? x : b) * this.#difference[from + row + size - 1]!
      }
    }
  }

  /** Ground under and around the pile itself. */
  own(): Float64Array {
    const { size, pile, mesh } = this
    const out = new Float64Array(size * size)
    const { radius: a, baseRadius: b } = pile
    const rings = aroundRing(a, a)
    for (let i = 0; i < size - 1; i++) this.#shaftRow(out, i, rings, mesh)
    this.#baseRow(out, ringAndPunch(a, b))
    const E = this.#E[size - 1]!
    const nu = this.#nu[size - 1]!
    out[size * size - 1] = (this.#punch * Math.PI) / (2 * b) + surfaceShare(pile.toe, nu) / divisor(E, nu)
    this.asymmetry = asymmetryOf(out, size)
    symmetrise(out, size)
    const grid = this.#grid
    if (grid)
      this.#addDifference(out, weightsOfRing(grid, a), weightsOfRingAndPunch(grid, a, b), weightsOfPunch(grid, b))
    return this.#rest(out)
  }

  /** Ground at an equal pile, axis to axis at a distance of r. */
  between(r: number): Float64Array {
    const { size, pile } = this
    const out = new Float64Array(size * size)
    const axis = { r: Float64Array.of(r), weight: Float64Array.of(1) }
    for (let i = 0; i < size - 1; i++) this.#shaftRow(out, i, axis, this.mesh)
    this.#baseRow(out, axis)
    const nu = this.#nu[size - 1]!
    out[size * size - 1] = mindlin(pile.toe, pile.toe, r, nu) / divisor(this.#E[size - 1]!, nu)
    symmetrise(out, size)
    const grid = this.#grid
    if (grid) {
      const w = weightsAtDistance(grid, r)
      // The punch's own near part, which the difference holds, is not the half-space's one seen from a distance.
      this.#addDifference(out, w, w, w)
      out[size * size - 1]! += this.#punchCorrection(r, nu)
    }
    return this.#rest(out)
  }

  /** At a distance the base is a point on the bimaterial: punch / k transforms to punch / r, where the closed form took the mean modulus. */
  #punchCorrection(r: number, nu: number): number {
    return this.#punch / r - (3 - 4 * nu) / divisor(this.#E[this.size - 1]!, nu) / r
  }

  /** Rigid rock under the toe: nothing there moves. */
  #rest(out: Float64Array): Float64Array {
    const { size } = this
    if (this.#onRock) for (let i = 0; i < size; i++) out[i * size + size - 1] = out[(size - 1) * size + i] = 0
    return out
  }

  /** Row of a measured shaft element for all loaded ones. */
  #shaftRow(out: Float64Array, i: number, around: Distances, { edges }: Mesh): void {
    const { size } = this
    for (let g = 0; g < 2; g++) {
      const z = this.#depths[2 * i + g]!
      for (let t = 0; t < around.r.length; t++) {
        const r = around.r[t]!
        const weight = 0.5 * around.weight[t]!
        let nuBefore = -1
        let before = 0
        for (let j = 0; j < size - 1; j++) {
          const nu = (this.#nu[i]! + this.#nu[j]!) / 2
          if (nu !== nuBefore) before = mindlinLine(z, edges[j]!, r, nu)
          nuBefore = nu
          const after = mindlinLine(z, edges[j + 1]!, r, nu)
          const E = (this.#E[i]! + this.#E[j]!) / 2
          out[i * size + j]! += (weight * (after - before)) / ((edges[j + 1]! - edges[j]!) * divisor(E, nu))
          before = after
        }
      }
    }
  }

  /** Displacement of the base for all loaded shaft elements; both triangles, so that symmetrising keeps it. */
  #baseRow(out: Float64Array, around: Distances): void {
    const { size, pile } = this
    const { edges } = this.mesh
    const base = size - 1
    for (let t = 0; t < around.r.length; t++) {
      for (let j = 0; j < base; j++) {
        const nu = (this.#nu[base]! + this.#nu[j]!) / 2
        const line =
          mindlinLine(pile.toe, edges[j + 1]!, around.r[t]!, nu) - mindlinLine(pile.toe, edges[j]!, around.r[t]!, nu)
        const E = (this.#E[base]! + this.#E[j]!) / 2
        out[base * size + j]! += (around.weight[t]! * line) / ((edges[j + 1]! - edges[j]!) * divisor(E, nu))
      }
    }
    for (let j = 0; j < base; j++) out[j * size + base] = out[base * size + j]!
  }
}

function asymmetryOf(a: Float64Array, n: number): number {
  let most = 0
  for (let i = 0; i < n; i++)
    for (let j = 0; j < i; j++)
      most = Math.max(most, Math.abs(a[i * n + j]! - a[j * n + i]!) / Math.sqrt(a[i * n + i]! * a[j * n + j]!))
  return most
}

function symmetrise(a: Float64Array, n: number): void {
  for (let i = 0; i < n; i++)
    for (let j = 0; j < i; j++) a[i * n + j] = a[j * n + i] = (a[i * n + j]! + a[j * n + i]!) / 2
}
