import { refuse } from '../faults.ts'
import { statics } from '../sources/bibliography.ts'
import { formula } from '../trace/formula.ts'
import type { Sheet } from '../trace/sheet.ts'
import type { Term } from '../trace/term.ts'
import type { Point } from './layout.ts'

/** Pile loads under a rigid cap with pinned heads: P_i = V/n + a x_i + b y_i about the centroid of the piles. */
export type RigidCap = {
  readonly centroid: Point
  /** Slopes a (kN/m along x) and b (along y) of the load plane for V, Mx, My at the cap's origin. */
  readonly plane: (
    load: { V: number; Mx: number; My: number },
    pointer: string,
  ) => { mean: number; a: number; b: number }
  readonly load: (plane: { mean: number; a: number; b: number }, index: number) => number
}

/** Whether piles with these second moments about their centroid spread in a plane, not along one line only. */
const spreads = (xx: number, yy: number, xy: number): boolean => xx * yy - xy * xy > 1e-12 * (xx + yy) ** 2

/** Prepares a layout once. A line of piles takes no moment about itself: refused with the moment named. */
export function rigidCap(points: readonly Point[]): RigidCap {
  const n = points.length
  const centroid = { x: points.reduce((s, p) => s + p.x, 0) / n, y: points.reduce((s, p) => s + p.y, 0) / n }
  const at = points.map((p) => ({ x: p.x - centroid.x, y: p.y - centroid.y }))
  const [xx, yy, xy] = at.reduce(
    ([a, b, c], p) => [a + p.x * p.x, b + p.y * p.y, c + p.x * p.y] as [number, number, number],
    [0, 0, 0] as [number, number, number],
  )
  const total = xx + yy
  const determinant = xx * yy - xy * xy
  const spread = spreads(xx, yy, xy)
  const reach = Math.max(...points.map((p) => Math.hypot(p.x, p.y)))
  return {
    centroid,
    plane: (load, pointer) => {
      const My = load.My - load.V * centroid.x
      const Mx = load.Mx - load.V * centroid.y
      const mean = load.V / n
      if (spread) return { mean, a: (My * yy - Mx * xy) / determinant, b: (Mx * xx - My * xy) / determinant }
      // One line of piles (or one pile): minimum norm along the line, nothing across it.
      const along = total > 0 ? (My * xx + Mx * xy) / (total * total) : 0
      const across = total > 0 ? (My * xy + Mx * yy) / (total * total) : 0
      const left = Math.hypot(My - (xx * along + xy * across), Mx - (xy * along + yy * across))
      // V on a line that passes the origin by rounding only leaves a moment of rounding.
      const size = Math.hypot(load.Mx, load.My) + Math.abs(load.V) * reach
      if (left > 1e-9 * size) refuse('line-cannot-take-moment', pointer, { moment: left, piles: n })
      return { mean, a: along, b: across }
    },
    load: (plane, i) => plane.mean + plane.a * at[i]!.x + plane.b * at[i]!.y,
  }
}

const cap = statics('rigid cap, pinned heads')
export const centroidOf = formula({
  symbol: 'x_m',
  name: 'coordinate of the centroid',
  unit: 'm',
  text: 'S / n',
  where: { S: 'm', n: '1' },
  source: cap,
})
export const fromCentroid = formula({
  symbol: 'x_i',
  name: 'distance of a pile from the centroid',
  unit: 'm',
  text: 'x - x_m',
  where: { x: 'm', x_m: 'm' },
  source: cap,
})
export const productOf = formula({
  symbol: 'u_i',
  name: 'product of two distances of a pile',
  unit: 'm2',
  text: 'x_i * y_i',
  where: { x_i: 'm', y_i: 'm' },
  source: cap,
})
export const momentAtCentroid = formula({
  symbol: 'M_m',
  name: 'moment about the centroid',
  unit: 'kN.m',
  text: 'M - V * x_m',
  where: { M: 'kN.m', V: 'kN', x_m: 'm' },
  source: cap,
})
export const meanLoad = formula({
  symbol: 'P_m',
  name: 'mean pile load',
  unit: 'kN',
  text: 'V / n',
  where: { V: 'kN', n: '1' },
  source: cap,
})
/** Slope of the loads along the axis of moment M, u its own second moment, v that of the other axis, w the product. */
export const slopeOfLoads = formula({
  symbol: 'a',
  name: 'slope of the pile loads',
  unit: 'kN/m',
  text: '(M * v - N * w) / (u * v - w^2)',
  where: { M: 'kN.m', v: 'm2', N: 'kN.m', w: 'm2', u: 'm2' },
  source: cap,
})
export const slopeAlongLine = formula({
  symbol: 'a',
  name: 'slope of the pile loads, one line of piles, minimum norm',
  unit: 'kN/m',
  text: '(M * u + N * w) / (u + v)^2',
  where: { M: 'kN.m', u: 'm2', N: 'kN.m', w: 'm2', v: 'm2' },
  source: cap,
})
export const pileLoadOf = formula({
  symbol: 'P_i',
  name: 'load of a pile',
  unit: 'kN',
  text: 'P_m + a * x_i + b * y_i',
  where: { P_m: 'kN', a: 'kN/m', x_i: 'm', b: 'kN/m', y_i: 'm' },
  source: cap,
})

type Place = { readonly x: Term<'m'>; readonly y: Term<'m'> }
export type CapLoadsAt = { readonly V: Term<'kN'>; readonly Mx: Term<'kN.m'>; readonly My: Term<'kN.m'> }

/**
 * Pile loads under a rigid cap as steps, from loads at the cap's origin: valid for any layout. One line of piles takes no
 * moment about itself: refused at `pointer`. Order of the result: that of `places`.
 */
export function pileLoads(
  sheet: Sheet,
  places: readonly Place[],
  n: Term<'1'>,
  load: CapLoadsAt,
  pointer: string,
): readonly Term<'kN'>[] {
  const points = places.map((p) => ({ x: p.x.value, y: p.y.value }))
  // Refuses what a line cannot take, by the same numbers.
  rigidCap(points).plane({ V: load.V.value, Mx: load.Mx.value, My: load.My.value }, pointer)
  const P_m = sheet.step(meanLoad, { V: load.V, n })
  if (places.length === 1) return [P_m]
  const offsets = (axis: 'x' | 'y') => {
    const S = sheet.sum(
      { symbol: `S_${axis}`, name: `sum of ${axis}`, unit: 'm' },
      places.map((p) => p[axis]),
    )
    const x_m = sheet.step(centroidOf, { S, n }, `${axis}_m`)
    return { x_m, own: places.map((p, i) => sheet.step(fromCentroid, { x: p[axis], x_m }, `piles/${i}/${axis}_i`)) }
  }
  const [along, across] = [offsets('x'), offsets('y')]
  const second = (symbol: string, a: readonly Term<'m'>[], b: readonly Term<'m'>[]) =>
    sheet.sum(
      { symbol, name: 'second moment of the piles', unit: 'm2' },
      a.map((x_i, i) => sheet.step(productOf, { x_i, y_i: b[i]! }, `piles/${i}/${symbol}`)),
    )
  const u = second('S_xx', along.own, along.own)
  const v = second('S_yy', across.own, across.own)
  const w = second('S_xy', along.own, across.own)
  const M = sheet.step(momentAtCentroid, { M: load.My, V: load.V, x_m: along.x_m }, 'My_m')
  const N = sheet.step(momentAtCentroid, { M: load.Mx, V: load.V, x_m: across.x_m }, 'Mx_m')
  const rule = spreads(u.value, v.value, w.value) ? slopeOfLoads : slopeAlongLine
  const a = sheet.step(rule, { M, N, u, v, w }, 'a')
  const b = sheet.step(rule, { M: N, N: M, u: v, v: u, w }, 'b')
  return places.map((_, i) =>
    sheet.step(pileLoadOf, { P_m, a, x_i: along.own[i]!, b, y_i: across.own[i]! }, `piles/${i}/P_i`),
  )
}
