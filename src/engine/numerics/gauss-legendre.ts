export type Rule = { readonly nodes: Float64Array; readonly weights: Float64Array }

const made = new Map<number, Rule>()

/** Gauss-Legendre rule of n points on (0, 1), by Newton on the Legendre polynomial; exact for degree 2n - 1. */
export function gaussLegendre(n: number): Rule {
  const known = made.get(n)
  if (known) return known
  const nodes = new Float64Array(n)
  const weights = new Float64Array(n)
  for (let i = 0; i < n; i++) {
    let x = Math.cos((Math.PI * (i + 0.75)) / (n + 0.5))
    let slope = 1
    for (let step = 0; step < 100; step++) {
      let [before, now] = [1, x]
      for (let k = 2; k <= n; k++) [before, now] = [now, ((2 * k - 1) * x * now - (k - 1) * before) / k]
      slope = (n * (x * now - before)) / (x * x - 1)
      const change = now / slope
      x -= change
      if (Math.abs(change) < 1e-15) break
    }
    nodes[n - 1 - i] = (1 + x) / 2
    weights[n - 1 - i] = 1 / ((1 - x * x) * slope * slope)
  }
  const rule = { nodes, weights }
  made.set(n, rule)
  return rule
}
