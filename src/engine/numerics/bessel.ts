/** Polynomials of Abramowitz & Stegun (1964), 9.4.1 and 9.4.3, by powers of (x/3)^2 and 3/x. */
const SMALL = [1, -2.2499997, 1.2656208, -0.3163866, 0.0444479, -0.0039444, 0.00021]
const MODULUS = [0.79788456, -0.00000077, -0.0055274, -0.00009512, 0.00137237, -0.00072805, 0.00014476]
const PHASE = [-0.78539816, -0.04166397, -0.00003954, 0.00262573, -0.00054125, -0.00029333, 0.00013558]

function horner(c: readonly number[], t: number): number {
  let sum = 0
  for (let i = c.length - 1; i >= 0; i--) sum = sum * t + c[i]!
  return sum
}

/** Bessel function J0 of x >= 0; absolute error below 5e-8. */
export function besselJ0(x: number): number {
  if (x < 3) return horner(SMALL, (x / 3) ** 2)
  const t = 3 / x
  return (horner(MODULUS, t) / Math.sqrt(x)) * Math.cos(x + horner(PHASE, t))
}
