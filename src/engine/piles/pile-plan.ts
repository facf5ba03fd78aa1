import { statics } from '../sources/bibliography.ts'
import { formula } from '../trace/formula.ts'
import type { Sheet } from '../trace/sheet.ts'
import type { Term } from '../trace/term.ts'
import { rigidCap, spreads } from './rigid-cap.ts'

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
export type CapTerms = { readonly V: Term<'kN'>; readonly Mx: Term<'kN.m'>; readonly My: Term<'kN.m'> }

/** The piles of a layout about their centroid, as steps: once for every cap and combination that uses the layout. */
export type PilePlan = {
  readonly n: Term<'1'>
  readonly x_m: Term<'m'>
  readonly y_m: Term<'m'>
  /** Distances of each pile from the centroid, in the order of the layout. */
  readonly x: readonly Term<'m'>[]
  readonly y: readonly Term<'m'>[]
  /** Second moments: along x, along y, mixed. */
  readonly u: Term<'m2'>
  readonly v: Term<'m2'>
  readonly w: Term<'m2'>
}

export function pilePlan(sheet: Sheet, places: readonly Place[], n: Term<'1'>): PilePlan {
  const about = (axis: 'x' | 'y') => {
    const given = places.map((p) => p[axis])
    const S = sheet.sum({ symbol: `S_${axis}`, name: `sum of ${axis}`, unit: 'm' }, given)
    const x_m = sheet.step(centroidOf, { S, n }, `${axis}_m`)
    return { x_m, own: given.map((x, i) => sheet.step(fromCentroid, { x, x_m }, `piles/${i}/${axis}_i`)) }
  }
  const [along, across] = [about('x'), about('y')]
  const second = (symbol: string, a: readonly Term<'m'>[], b: readonly Term<'m'>[]) =>
    sheet.sum(
      { symbol, name: 'second moment of the piles', unit: 'm2' },
      a.map((x_i, i) => sheet.step(productOf, { x_i, y_i: b[i]! }, `piles/${i}/${symbol}`)),
    )
  return {
    n,
    x_m: along.x_m,
    y_m: across.x_m,
    x: along.own,
    y: across.own,
    u: second('S_xx', along.own, along.own),
    v: second('S_yy', across.own, across.own),
    w: second('S_xy', along.own, across.own),
  }
}

/** Slopes of the loads along x and y, from loads at the cap's origin. */
function slopes(sheet: Sheet, { x_m, y_m, u, v, w }: PilePlan, load: CapTerms) {
  const M = sheet.step(momentAtCentroid, { M: load.My, V: load.V, x_m }, 'My_m')
  const N = sheet.step(momentAtCentroid, { M: load.Mx, V: load.V, x_m: y_m }, 'Mx_m')
  const rule = spreads(u.value, v.value, w.value) ? slopeOfLoads : slopeAlongLine
  const a = sheet.step(rule, { M, N, u, v, w }, 'a')
  const b = sheet.step(rule, { M: N, N: M, u: v, v: u, w }, 'b')
  return { a, b }
}

/**
 * Load of one pile under a rigid cap with pinned heads, as steps. Whether a line of piles can take the moment is judged
 * before, with the bare numbers of every combination.
 */
export function pileLoad(sheet: Sheet, plan: PilePlan, load: CapTerms, pile: number): Term<'kN'> {
  const P_m = sheet.step(meanLoad, { V: load.V, n: plan.n })
  if (plan.n.value === 1) return P_m
  return sheet.step(pileLoadOf, { P_m, ...slopes(sheet, plan, load), x_i: plan.x[pile]!, y_i: plan.y[pile]! })
}

/**
 * Pile loads under a rigid cap as steps, from loads at the cap's origin: valid for any layout. One line of piles takes no
 * moment about itself: refused at `pointer`. Order of the result: that of `places`.
 */
export function pileLoads(
  sheet: Sheet,
  places: readonly Place[],
  n: Term<'1'>,
  load: CapTerms,
  pointer: string,
): readonly Term<'kN'>[] {
  const points = places.map((p) => ({ x: p.x.value, y: p.y.value }))
  // Refuses what a line cannot take, by the same numbers.
  rigidCap(points).plane({ V: load.V.value, Mx: load.Mx.value, My: load.My.value }, pointer)
  const P_m = sheet.step(meanLoad, { V: load.V, n })
  if (places.length === 1) return [P_m]
  const plan = pilePlan(sheet, places, n)
  const { a, b } = slopes(sheet, plan, load)
  return places.map((_, i) => sheet.step(pileLoadOf, { P_m, a, x_i: plan.x[i]!, b, y_i: plan.y[i]! }, `piles/${i}/P_i`))
}
