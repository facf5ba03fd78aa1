/** Intervals in a stretch of the least argument. */
const FINENESS = 40
/** No more than so many in all. */
const MOST = 65536

/**
 * The same function from a table: cubics through four equally spaced points each, between `least` and `most`; outside, the function
 * itself. For a function like 1/s from s = least up to 100 least the error is below 1e-6 of its value.
 * `f` is smooth and wanted for more arguments than the table has intervals: 40 for each stretch of the length `least`.
 */
export function tabulate(f: (s: number) => number, least: number, most: number): (s: number) => number {
  if (!(most > least)) return f
  const intervals = Math.min(MOST, Math.ceil((FINENESS * (most - least)) / least))
  const step = (most - least) / intervals
  const values = new Float64Array(intervals + 3)
  for (let i = 0; i < values.length; i++) values[i] = f(Math.max(least / 2, least + (i - 1) * step))
  const c = new Float64Array(4 * intervals)
  for (let i = 0; i < intervals; i++) {
    const [a, b, d, e] = [values[i]!, values[i + 1]!, values[i + 2]!, values[i + 3]!]
    c[4 * i] = b
    c[4 * i + 1] = d - a / 3 - b / 2 - e / 6
    c[4 * i + 2] = (a + d) / 2 - b
    c[4 * i + 3] = (e - a) / 6 + (b - d) / 2
  }
  const scale = 1 / step
  return (s) => {
    const place = (s - least) * scale
    const i = place | 0
    if (!(place >= 0 && i < intervals)) return f(s)
    const t = place - i
    const o = 4 * i
    return c[o]! + t * (c[o + 1]! + t * (c[o + 2]! + t * c[o + 3]!))
  }
}
