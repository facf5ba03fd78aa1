import type { Layout } from '../piles/layout.ts'
import {
  centroidOf,
  fromCentroid,
  meanLoad,
  momentAtCentroid,
  pileLoadOf,
  productOf,
  slopeAlongLine,
  slopeOfLoads,
} from '../piles/rigid-cap.ts'
import { pilePlaces } from '../settlement/pile-places.ts'
import type { Sheet } from '../trace/sheet.ts'
import type { Term } from '../trace/term.ts'
import type { CapTerms } from './cap-loads.ts'

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

export function pilePlan(sheet: Sheet, layout: Layout, pointer: string, n: Term<'1'>): PilePlan {
  const places = pilePlaces(sheet, layout, pointer)
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

/**
 * Load of one pile under a rigid cap with pinned heads, as steps, by the formulas of all pile loads. Whether a line of piles can
 * take the moment is judged before, with the bare numbers of every combination.
 */
export function pileLoad(sheet: Sheet, plan: PilePlan, load: CapTerms, pile: number): Term<'kN'> {
  const { n, x_m, y_m, u, v, w } = plan
  const P_m = sheet.step(meanLoad, { V: load.V, n })
  if (n.value === 1) return P_m
  const M = sheet.step(momentAtCentroid, { M: load.My, V: load.V, x_m }, 'My_m')
  const N = sheet.step(momentAtCentroid, { M: load.Mx, V: load.V, x_m: y_m }, 'Mx_m')
  // The bound that parts a plane of piles from a line is that of the bare numbers in piles/rigid-cap.ts.
  const spread = u.value * v.value - w.value * w.value > 1e-12 * (u.value + v.value) ** 2
  const rule = spread ? slopeOfLoads : slopeAlongLine
  const a = sheet.step(rule, { M, N, u, v, w }, 'a')
  const b = sheet.step(rule, { M: N, N: M, u: v, v: u, w }, 'b')
  return sheet.step(pileLoadOf, { P_m, a, x_i: plan.x[pile]!, b, y_i: plan.y[pile]! })
}
