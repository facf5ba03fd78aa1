/** Cubic splines, with straight ends, of many functions at once of the place among the nodes 0, 1 ... n - 1. Error of the fourth order inside, of the second at the ends. */
export class SplineTable {
  readonly #values: readonly Float64Array[]
  readonly #second: readonly Float64Array[]

  /** `values[i]` holds all functions at node i. */
  constructor(values: readonly Float64Array[]) {
    const n = values.length
    const width = values[0]!.length
    // Second derivatives by the tridiagonal system m[i-1] + 4 m[i] + m[i+1] = 6 (y[i+1] - 2 y[i] + y[i-1]).
    const second = values.map(() => new Float64Array(width))
    const pivot = new Float64Array(n)
    for (let i = 1; i < n - 1; i++) {
      pivot[i] = 1 / (4 - pivot[i - 1]!)
      for (let c = 0; c < width; c++) {
        const bend = values[i + 1]![c]! - 2 * values[i]![c]! + values[i - 1]![c]!
        second[i]![c] = (6 * bend - second[i - 1]![c]!) * pivot[i]!
      }
    }
    for (let i = n - 2; i > 0; i--) for (let c = 0; c < width; c++) second[i]![c]! -= pivot[i]! * second[i + 1]![c]!
    this.#values = values
    this.#second = second
  }

  /** Writes all functions at a place; the end cubics go on outside. */
  at(place: number, out: Float64Array): void {
    const i = Math.min(this.#values.length - 2, Math.max(0, Math.floor(place)))
    const t = place - i
    const u = 1 - t
    const [left, right] = [this.#values[i]!, this.#values[i + 1]!]
    const [bentLeft, bentRight] = [this.#second[i]!, this.#second[i + 1]!]
    const a = (u * u * u - u) / 6
    const b = (t * t * t - t) / 6
    for (let c = 0; c < out.length; c++) out[c] = u * left[c]! + t * right[c]! + a * bentLeft[c]! + b * bentRight[c]!
  }
}

/** The spline of one function. */
export function naturalSpline(values: Float64Array): (place: number) => number {
  const table = new SplineTable(Array.from(values, (v) => Float64Array.of(v)))
  const out = new Float64Array(1)
  return (place) => {
    table.at(place, out)
    return out[0]!
  }
}
