import { factor, solveFactored } from './cholesky.ts'

/** Neighbours that a row of the approximate inverse knows. */
const NEIGHBOURS = 16

/**
 * Sparse approximate inverse of a kernel matrix over points in a plane, M = G^T G: with the points ordered from far apart to close
 * together, row i of G makes point i independent of its nearest predecessors (Vecchia 1988; Kolotilina & Yeremin 1993).
 * Good where the kernel falls with distance: coarse points carry what is far, near ones screen each other.
 * Cost n^2 to order, n k^3/3 to factor.
 */
export class LocalInverse {
  readonly #n: number
  readonly #columns: Int32Array
  readonly #values: Float64Array
  readonly #counts: Int32Array
  readonly #inner: Float64Array
  readonly #local = new Float64Array(NEIGHBOURS * NEIGHBOURS)
  readonly #side = new Float64Array(NEIGHBOURS)
  readonly #given = new Float64Array(NEIGHBOURS)
  /** False when the matrix is not positive definite. */
  readonly definite: boolean

  constructor(x: Float64Array, y: Float64Array, entry: (i: number, j: number) => number) {
    const n = x.length
    const width = NEIGHBOURS + 1
    this.#n = n
    this.#columns = new Int32Array(n * width)
    this.#values = new Float64Array(n * width)
    this.#counts = new Int32Array(n)
    this.#inner = new Float64Array(n)
    const order = spreadOrder(x, y)
    const near = new Int32Array(NEIGHBOURS)
    const reach = new Float64Array(NEIGHBOURS)
    let definite = true
    for (let place = 0; place < n; place++) {
      const i = order[place]!
      let count = 0
      for (let p = 0; p < place; p++) {
        const j = order[p]!
        const d = (x[i]! - x[j]!) ** 2 + (y[i]! - y[j]!) ** 2
        if (count === NEIGHBOURS && d >= reach[count - 1]!) continue
        let at = count < NEIGHBOURS ? count++ : count - 1
        for (; at > 0 && reach[at - 1]! > d; at--) {
          reach[at] = reach[at - 1]!
          near[at] = near[at - 1]!
        }
        reach[at] = d
        near[at] = j
      }
      definite = this.#row(i, near, count, entry) && definite
    }
    this.definite = definite
  }

  #row(i: number, near: Int32Array, count: number, entry: (i: number, j: number) => number): boolean {
    const width = NEIGHBOURS + 1
    const local = this.#local
    const b = this.#side
    const given = this.#given
    for (let r = 0; r < count; r++) {
      b[r] = given[r] = entry(i, near[r]!)
      for (let c = 0; c <= r; c++) local[r * count + c] = entry(near[r]!, near[c]!)
    }
    if (count > 0 && !factor(local, count)) return false
    solveFactored(local, count, b)
    let rest = entry(i, i)
    for (let r = 0; r < count; r++) rest -= given[r]! * b[r]!
    if (!(rest > 0)) return false
    const scale = 1 / Math.sqrt(rest)
    for (let r = 0; r < count; r++) {
      this.#columns[i * width + r] = near[r]!
      this.#values[i * width + r] = -b[r]! * scale
    }
    this.#columns[i * width + count] = i
    this.#values[i * width + count] = scale
    this.#counts[i] = count + 1
    return true
  }

  /** z = G^T G r. */
  apply(r: Float64Array, z: Float64Array): void {
    const width = NEIGHBOURS + 1
    z.fill(0)
    for (let i = 0; i < this.#n; i++) {
      let sum = 0
      const [from, to] = [i * width, i * width + this.#counts[i]!]
      for (let o = from; o < to; o++) sum += this.#values[o]! * r[this.#columns[o]!]!
      this.#inner[i] = sum
    }
    for (let i = 0; i < this.#n; i++) {
      const sum = this.#inner[i]!
      const [from, to] = [i * width, i * width + this.#counts[i]!]
      for (let o = from; o < to; o++) z[this.#columns[o]!]! += this.#values[o]! * sum
    }
  }
}

/** Each next point is the one farthest from all before it. */
function spreadOrder(x: Float64Array, y: Float64Array): Int32Array {
  const n = x.length
  const order = new Int32Array(n)
  const gap = new Float64Array(n).fill(Number.POSITIVE_INFINITY)
  let next = 0
  for (let place = 0; place < n; place++) {
    order[place] = next
    const [px, py] = [x[next]!, y[next]!]
    gap[next] = -1
    let best = -1
    for (let j = 0; j < n; j++) {
      if (gap[j]! < 0) continue
      const d = (x[j]! - px) ** 2 + (y[j]! - py) ** 2
      if (d < gap[j]!) gap[j] = d
      if (gap[j]! > best) {
        best = gap[j]!
        next = j
      }
    }
  }
  return order
}
