import { besselJ0 } from '../../numerics/bessel.ts'
import { gaussLegendre } from '../../numerics/gauss-legendre.ts'

/** Log-spaced wavenumbers, 1/m. */
export type Wavenumbers = { readonly k: Float64Array; readonly step: number }

export function wavenumbers(least: number, most: number, step = 0.2): Wavenumbers {
  const n = Math.max(8, Math.ceil(Math.log(most / least) / step) + 1)
  return { k: Float64Array.from({ length: n }, (_, i) => least * Math.exp(i * step)), step }
}

const POINTS = 6
const PANEL = gaussLegendre(5)

/**
 * Weights w such that the sum of w f(k) over the wavenumbers is the integral of f(k) kernel(k) k dk. f k is smooth in ln k and steady
 * below the first wavenumber; between them it is interpolated by a polynomial of six points. The kernel is met exactly: panels of
 * equal ln k while k length < 1, of 1.5/length beyond.
 */
function weightsOf(grid: Wavenumbers, kernel: (k: number) => number, length: number, most: number): Float64Array {
  const { k, step } = grid
  const n = k.length
  const out = new Float64Array(n)
  const first = k[0]!
  const last = Math.min(k[n - 1]!, most)
  // Below the first wavenumber f k keeps its value.
  const from = first * 1e-3
  out[0]! += from * kernel(from) * first
  const lagrange = new Float64Array(POINTS)
  let low = from
  while (low < last) {
    const wide = low * length < 1 ? low * 1.6 : low + 1.5 / length
    const high = Math.min(wide, low < first && wide > first ? first : last)
    for (let g = 0; g < PANEL.nodes.length; g++) {
      const at = low + (high - low) * PANEL.nodes[g]!
      const weight = (high - low) * PANEL.weights[g]! * kernel(at)
      if (at <= first) {
        out[0]! += weight * first
        continue
      }
      const place = Math.log(at / first) / step
      const start = Math.min(n - POINTS, Math.max(0, Math.floor(place) - POINTS / 2 + 1))
      lagrangeAt(place - start, lagrange)
      for (let i = 0; i < POINTS; i++) out[start + i]! += weight * lagrange[i]! * k[start + i]!
    }
    low = high
  }
  return out
}

/** Values at t of the Lagrange polynomials of the points 0 ... 5. */
function lagrangeAt(t: number, out: Float64Array): void {
  for (let i = 0; i < POINTS; i++) {
    let value = 1
    for (let j = 0; j < POINTS; j++) if (j !== i) value *= (t - j) / (i - j)
    out[i] = value
  }
}

/** From where the oscillation of J0 is faded out, and where it is gone, in units of kr. What is left out is below 1e-6 of the value. */
const FADE = { from: 20, to: 60 }

/** Smooth step from 1 to 0. */
function fade(x: number): number {
  if (x <= FADE.from) return 1
  const t = (x - FADE.from) / (FADE.to - FADE.from)
  return t >= 1 ? 0 : 1 / (1 + Math.exp((2 * t - 1) / (t * (1 - t))))
}

/** Weights for J0(kr): the displacement at distance r. */
export const weightsAtDistance = (grid: Wavenumbers, r: number): Float64Array =>
  weightsOf(grid, (k) => besselJ0(k * r) * fade(k * r), r, FADE.to / r)

/** Weights for a ring of radius a seen by the same ring: J0(ka)^2. */
export const weightsOfRing = (grid: Wavenumbers, a: number): Float64Array =>
  weightsOf(grid, (k) => besselJ0(k * a) ** 2, 2 * a, Number.POSITIVE_INFINITY)

const punch = (x: number): number => (x < 1e-4 ? 1 - (x * x) / 6 : Math.sin(x) / x)

/** Weights for a ring of radius a and a rigid punch of radius b, whose pressure transforms to sin(kb)/(kb). */
export const weightsOfRingAndPunch = (grid: Wavenumbers, a: number, b: number): Float64Array =>
  weightsOf(grid, (k) => besselJ0(k * a) * punch(k * b), a + b, Number.POSITIVE_INFINITY)

/** Weights for a rigid punch of radius b seen by itself. */
export const weightsOfPunch = (grid: Wavenumbers, b: number): Float64Array =>
  weightsOf(grid, (k) => punch(k * b) ** 2, 2 * b, Number.POSITIVE_INFINITY)
