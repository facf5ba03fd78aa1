import { refuse } from '../../faults.ts'
import { factor, solveFactored } from '../../numerics/cholesky.ts'
import { conjugateGradient, dot } from '../../numerics/conjugate-gradient.ts'
import { timesPacked } from '../../numerics/packed-symmetric.ts'
import { SplineTable } from '../../numerics/spline.ts'
import type { Point } from '../../piles/layout.ts'
import type { ModeLoads } from '../kernel-solve.ts'
import type { SolvedPile } from './single-pile.ts'

/** Spacings at which the ground between two piles is computed. */
const NODES = 24

/**
 * Equal piles whose every element acts on every element of every pile: N q = B w, with N the ground between all elements and the
 * compression within each pile. The blocks of two piles depend on their distance alone: each entry, times the distance, is a cubic
 * spline over ln(distance). Solved by conjugate gradients; the approximation to the inverse takes what one pile does to another as
 * uniform along its length, which leaves superposed interaction factors to be factored: n x n instead of n m x n m.
 */
export class CoupledPiles {
  readonly #n: number
  readonly #m: number
  readonly #packed: Float64Array
  readonly #own: Float64Array
  readonly #forces: Float64Array
  readonly #stiffness: number
  readonly #coarse: Float64Array
  readonly #heads: Float64Array

  constructor(pile: SolvedPile, points: readonly Point[]) {
    const n = points.length
    const m = pile.soil.size
    this.#n = n
    this.#m = m
    this.#forces = pile.forces
    this.#stiffness = pile.stiffness
    this.#own = Float64Array.from(pile.flexibility)
    factor(this.#own, m)
    this.#packed = new Float64Array((n * m * (n * m + 1)) / 2)
    this.#coarse = new Float64Array(n * n)
    this.#heads = new Float64Array(n)
    this.#assemble(pile, points)
    if (!factor(this.#coarse, n)) refuse('not-finite', '/layout', { symbol: 'group flexibility' })
  }

  #assemble(pile: SolvedPile, points: readonly Point[]): void {
    const [n, m] = [this.#n, this.#m]
    const pairs = distances(points)
    const table = pairs && tableOf(pile, pairs.least, pairs.most)
    const block = new Float64Array(m * m)
    for (let a = 0; a < n; a++) {
      for (let b = 0; b <= a; b++) {
        if (a === b) block.set(pile.flexibility)
        else {
          const s = Math.hypot(points[a]!.x - points[b]!.x, points[a]!.y - points[b]!.y)
          table!.at(s, block)
        }
        for (let i = 0; i < m; i++) {
          const row = a * m + i
          const from = (row * (row + 1)) / 2 + b * m
          const last = a === b ? i : m - 1
          for (let j = 0; j <= last; j++) this.#packed[from + j] = block[i * m + j]!
        }
        this.#coarse[a * n + b] = this.#coarse[b * n + a] = a === b ? 1 : this.#factorOf(block)
      }
    }
  }

  /** Interaction factor by superposition: the mean movement that the single pile's forces give its neighbour, over its own. */
  #factorOf(block: Float64Array): number {
    const m = this.#m
    const q = this.#forces
    let sum = 0
    for (let i = 0; i < m; i++) for (let j = 0; j < m; j++) sum += q[i]! * block[i * m + j]! * q[j]!
    return sum / this.#stiffness
  }

  /** z = D^-1 r - D^-1 B (1 - S^-1) B^T D^-1 r / k: Woodbury for blocks that act uniformly; S holds the interaction factors. */
  readonly #precondition = (r: Float64Array, z: Float64Array): void => {
    const [n, m, k] = [this.#n, this.#m, this.#stiffness]
    const heads = this.#heads
    z.set(r)
    for (let a = 0; a < n; a++) {
      const part = z.subarray(a * m, (a + 1) * m)
      solveFactored(this.#own, m, part)
      let sum = 0
      for (let i = 0; i < m; i++) sum += part[i]!
      heads[a] = sum
    }
    const before = Float64Array.from(heads)
    solveFactored(this.#coarse, n, heads)
    for (let a = 0; a < n; a++) {
      const rest = (before[a]! - heads[a]!) / k
      for (let i = 0; i < m; i++) z[a * m + i]! -= rest * this.#forces[i]!
    }
  }

  /** Pile loads for given settlements of the heads, one vector of n each. */
  loads(heads: readonly Float64Array[]): ModeLoads {
    const [n, m] = [this.#n, this.#m]
    const b = heads.map((w) => Float64Array.from({ length: n * m }, (_, i) => w[Math.floor(i / m)]!))
    const q = heads.map(() => new Float64Array(n * m))
    const solved = conjugateGradient((x, y) => timesPacked(this.#packed, n * m, x, y), this.#precondition, b, q, 1e-11)
    if (!solved) return refuse('not-finite', '/layout', { symbol: 'group flexibility' })
    const loads = q.map((forces) => {
      const out = new Float64Array(n)
      for (let i = 0; i < n * m; i++) out[Math.floor(i / m)]! += forces[i]!
      return out
    })
    return { loads, ...solved }
  }

  /** Settlements of the heads under given loads: the same system, solved for its other side. */
  settlements(loads: Float64Array): Float64Array {
    const heads = new Float64Array(this.#n)
    const solved = conjugateGradient(
      ([w], [p]) => p!.set(this.loads([w!]).loads[0]!),
      (r, z) => this.#superposed(r, z),
      [loads],
      [heads],
      1e-10,
    )
    if (!solved) return refuse('not-finite', '/layout', { symbol: 'group flexibility' })
    return heads
  }

  /** z = S r / k, from the Cholesky factor of S. */
  #superposed(r: Float64Array, z: Float64Array): void {
    const n = this.#n
    const l = this.#coarse
    const half = new Float64Array(n)
    for (let j = 0; j < n; j++) for (let i = j; i < n; i++) half[j]! += l[i * n + j]! * r[i]!
    for (let i = 0; i < n; i++) z[i] = dot(l.subarray(i * n, i * n + i + 1), half.subarray(0, i + 1)) / this.#stiffness
  }
}

function distances(points: readonly Point[]): { least: number; most: number } | undefined {
  let [least, most] = [Number.POSITIVE_INFINITY, 0]
  for (const [i, p] of points.entries())
    for (const q of points.slice(0, i)) {
      const s = Math.hypot(p.x - q.x, p.y - q.y)
      least = Math.min(least, s)
      most = Math.max(most, s)
    }
  return points.length > 1 ? { least, most } : undefined
}

function tableOf({ soil }: SolvedPile, least: number, most: number): { at: (s: number, out: Float64Array) => void } {
  const step = Math.log(Math.max(most / least, 1.001)) / (NODES - 1)
  const spacings = Array.from({ length: NODES }, (_, i) => least * Math.exp(i * step))
  const table = new SplineTable(spacings.map((s) => soil.between(s).map((v) => v * s)))
  return {
    at: (s, out) => {
      table.at(Math.log(s / least) / step, out)
      for (let i = 0; i < out.length; i++) out[i]! /= s
    },
  }
}
