import type { GroundProfile } from '../ground/profile-types.ts'
import type { Notice } from '../notice.ts'
import { smallestSpacing } from '../piles/enclosing-prism.ts'
import { type Layout, positions } from '../piles/layout.ts'
import type { CapTerms } from '../piles/pile-plan.ts'
import type { PileType } from '../piles/pile-type.ts'
import type { SettlementMethod } from '../requests.ts'
import { statics } from '../sources/bibliography.ts'
import { formula } from '../trace/formula.ts'
import type { Sheet } from '../trace/sheet.ts'
import type { Term } from '../trace/term.ts'
import { assertSpacing } from './assert-spacing.ts'
import type { CoupledPiles } from './continuum/coupled-piles.ts'
import { type ElasticGroup, elasticGroup, type PileAnswers, superposed } from './group.ts'
import type { PileResponse, SettlementPlaces } from './pile-response.ts'
import { pileResponse } from './settlement-method.ts'

export const originSettlement = formula({
  symbol: 's_o',
  name: 'settlement of the cap at its origin',
  unit: 'mm',
  text: 'f * (V + a_x * My + a_y * Mx)',
  where: { f: 'm/kN', V: 'kN', a_x: '1/m', My: 'kN.m', a_y: '1/m', Mx: 'kN.m' },
  source: statics('flexibility of the rigid cap'),
})
export const tiltAlongX = formula({
  symbol: 'theta_x',
  name: 'tilt along x',
  unit: '1',
  text: 'r_x * (My + e_x * V + c_x * Mx)',
  where: { r_x: 'rad/(kN.m)', My: 'kN.m', e_x: 'm', V: 'kN', c_x: '1', Mx: 'kN.m' },
  source: statics('flexibility of the rigid cap'),
})
export const tiltAlongY = formula({
  symbol: 'theta_y',
  name: 'tilt along y',
  unit: '1',
  text: 'r_y * (Mx + e_y * V + c_y * My)',
  where: { r_y: 'rad/(kN.m)', Mx: 'kN.m', e_y: 'm', V: 'kN', c_y: '1', My: 'kN.m' },
  source: statics('flexibility of the rigid cap'),
})
export const tiltOf = formula({
  symbol: 'theta',
  name: 'tilt of the cap',
  unit: '1',
  text: 'sqrt(theta_x^2 + theta_y^2)',
  where: { theta_x: '1', theta_y: '1' },
  source: statics('steepest slope'),
})

/** How the pile loads under a rigid plane are found. */
const SOLVE = 'rigid plane on interacting piles; Cholesky, from 160 unknowns on conjugate gradients'

/**
 * Flexibility of a rigid cap for V, My, Mx at the cap's origin, symmetric 3 x 3, each row as its diagonal and ratios to it:
 * s = f (V + a_x My + a_y Mx), theta_x = r_x (My + e_x V + c_x Mx), theta_y = r_y (Mx + e_y V + c_y My).
 * A direction in which the piles do not spread has r = 0.
 */
export type CapFlexibility = {
  readonly f: Term<'m/kN'>
  readonly a_x: Term<'1/m'>
  readonly a_y: Term<'1/m'>
  readonly r_x: Term<'rad/(kN.m)'>
  readonly e_x: Term<'m'>
  readonly c_x: Term<'1'>
  readonly r_y: Term<'rad/(kN.m)'>
  readonly e_y: Term<'m'>
  readonly c_y: Term<'1'>
}
export type PreparedGroup = {
  readonly pile: PileResponse
  /** What the interaction rests on. */
  readonly basis: readonly Term[]
  /** Stiffness of one pile alone. */
  readonly stiffness: Term<'kN/m'>
  readonly elastic: ElasticGroup
  readonly flexibility: CapFlexibility
  readonly load: string
}
export type GroupResponse = {
  /** At the cap's origin. */
  readonly settlement: Term<'mm'>
  /** Steepest slope. */
  readonly tilt: Term<'1'>
  readonly tiltAlongX: Term<'1'>
  readonly tiltAlongY: Term<'1'>
}

/** One pile's stiffness, interaction, factorisation and cap flexibility, once for all combinations. */
export function prepareGroup(
  sheet: Sheet,
  pile: PileType,
  ground: GroundProfile,
  layout: Layout,
  at: SettlementPlaces,
  method: SettlementMethod | undefined,
  notice: (n: Notice) => void,
): PreparedGroup {
  const response = pileResponse(sheet, method, pile, ground, at, notice)
  assertSpacing(response, smallestSpacing(positions(layout), 0, at.layout), at.layout)
  return prepareFrom(sheet.within('group'), response, layout, at.load)
}

/** The same from a pile that is already known; `coupled` lets every element act on every other. */
export function prepareFrom(
  sheet: Sheet,
  pile: PileResponse,
  layout: Layout,
  load: string,
  coupled?: CoupledPiles,
): PreparedGroup {
  const points = positions(layout)
  const elastic = elasticGroup(
    points,
    coupled ? coupledAnswers(coupled) : superposed(points, pile.stiffness.value, pile.interaction),
  )
  const basis = points.length > 1 ? pile.basis(sheet, smallestSpacing(points, 0, '')) : []
  return {
    pile,
    basis,
    stiffness: pile.stiffness,
    elastic,
    flexibility: capFlexibility(sheet, pile, basis, elastic),
    load,
  }
}

const coupledAnswers = (piles: CoupledPiles): PileAnswers => ({
  modes: (about, _, modes) =>
    piles.loads(modes.map((mode) => Float64Array.from(about, (p) => mode.v + mode.x * p.x + mode.y * p.y))),
  settlements: (loads) => piles.settlements(loads),
})

/** What a load at the cap's origin does to a prepared group: its own arithmetic only. `pointer` is the load's place, for a refusal. */
export function groupResponse(
  sheet: Sheet,
  prepared: PreparedGroup,
  load: CapTerms,
  pointer: string = prepared.load,
): GroupResponse {
  const { V, Mx, My } = load
  prepared.elastic.assertTaken({ V: V.value, Mx: Mx.value, My: My.value }, pointer)
  const { f, a_x, a_y, r_x, e_x, c_x, r_y, e_y, c_y } = prepared.flexibility
  const theta_x = sheet.step(tiltAlongX, { r_x, My, e_x, V, c_x, Mx })
  const theta_y = sheet.step(tiltAlongY, { r_y, Mx, e_y, V, c_y, My })
  return {
    settlement: sheet.step(originSettlement, { f, V, a_x, My, a_y, Mx }),
    tilt: sheet.step(tiltOf, { theta_x, theta_y }),
    tiltAlongX: theta_x,
    tiltAlongY: theta_y,
  }
}

function capFlexibility(
  sheet: Sheet,
  pile: PileResponse,
  basis: readonly Term[],
  elastic: ElasticGroup,
): CapFlexibility {
  const F = atOrigin(elastic)
  const own = elastic.flexibility
  // A unit load at the centroid: the pile loads that it causes must give it back, and no moment.
  const loads = elastic.pileLoads({ centre: own[0]!, alongX: own[3]!, alongY: own[6]! })
  const sum = (weight: (i: number) => number) => loads.reduce((s, p, i) => s + p * weight(i), 0)
  const { points, centroid } = elastic
  const extent = 1 + Math.max(...points.map((p) => Math.hypot(p.x - centroid.x, p.y - centroid.y)))
  const residuals = [
    { name: 'compatibility: residual of the solve', value: elastic.residual },
    { name: 'vertical equilibrium of a unit load', value: Math.abs(sum(() => 1) - 1) },
    {
      name: 'moment along x of a unit load, relative',
      value: Math.abs(sum((i) => points[i]!.x - centroid.x)) / extent,
    },
    {
      name: 'moment along y of a unit load, relative',
      value: Math.abs(sum((i) => points[i]!.y - centroid.y)) / extent,
    },
  ]
  const entry = <const U extends 'm/kN' | '1/m' | 'm' | 'rad/(kN.m)' | '1'>(
    symbol: string,
    name: string,
    unit: U,
    value: number,
  ) =>
    sheet.solution({
      symbol,
      name,
      unit,
      value,
      method: SOLVE,
      operands: [pile.stiffness, ...basis],
      unknowns: [{ symbol, value, unit }],
      residuals,
      tolerance: 1e-9,
      source: pile.source,
    })
  const share = (row: number, column: number) => (F[row * 4]! > 0 ? F[row * 3 + column]! / F[row * 4]! : 0)
  return {
    f: entry('f', "settlement at the cap's origin for a unit load", 'm/kN', F[0]!),
    a_x: entry('a_x', 'settlement for a moment along x over that for a load', '1/m', share(0, 1)),
    a_y: entry('a_y', 'settlement for a moment along y over that for a load', '1/m', share(0, 2)),
    r_x: entry('r_x', 'slope along x for a unit moment along x', 'rad/(kN.m)', F[4]!),
    e_x: entry('e_x', 'slope along x for a load over that for a moment along x', 'm', share(1, 0)),
    c_x: entry('c_x', 'slope along x for a moment along y over that for one along x', '1', share(1, 2)),
    r_y: entry('r_y', 'slope along y for a unit moment along y', 'rad/(kN.m)', F[8]!),
    e_y: entry('e_y', 'slope along y for a load over that for a moment along y', 'm', share(2, 0)),
    c_y: entry('c_y', 'slope along y for a moment along x over that for one along y', '1', share(2, 1)),
  }
}

/** Tt F T, where T takes V, My, Mx from the cap's origin to the centroid. */
function atOrigin({ flexibility: F, centroid }: ElasticGroup): Float64Array {
  const T = [1, 0, 0, -centroid.x, 1, 0, -centroid.y, 0, 1]
  const out = new Float64Array(9)
  for (let r = 0; r < 3; r++)
    for (let c = 0; c < 3; c++)
      for (let i = 0; i < 3; i++)
        for (let j = 0; j < 3; j++) out[r * 3 + c]! += T[i * 3 + r]! * F[i * 3 + j]! * T[j * 3 + c]!
  return out
}
