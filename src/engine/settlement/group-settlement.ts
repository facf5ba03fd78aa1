import type { Layout } from '../piles/layout.ts'
import { type CapTerms, pileLoads } from '../piles/pile-plan.ts'
import { practice, statics } from '../sources/bibliography.ts'
import { formula } from '../trace/formula.ts'
import type { Sheet } from '../trace/sheet.ts'
import type { Term } from '../trace/term.ts'
import { capStiffness } from './cap-stiffness.ts'
import type { CoupledPiles } from './continuum/coupled-piles.ts'
import { type ElasticGroup, elasticGroup, type Plane, superposed } from './group.ts'
import type { PilePlace } from './pile-places.ts'
import type { PileResponse } from './pile-response.ts'
import { groupResponse, type PreparedGroup, prepareFrom } from './prepared-group.ts'
import { SOFT_SOLVE, SOFT_TOLERANCE, softCurve, softPlane, softSettlements } from './soft-group.ts'
import type { Softening } from './softening.ts'

export const planeSettlement = formula({
  symbol: 's',
  name: 'settlement of a point of the rigid cap',
  unit: 'mm',
  text: 's_o + theta_x * x + theta_y * y',
  where: { s_o: 'mm', theta_x: '1', x: 'm', theta_y: '1', y: 'm' },
  source: statics('plane'),
})
export const meanPlace = formula({
  symbol: 'x_m',
  name: 'coordinate of the centroid of the piles',
  unit: 'm',
  text: 'S / n',
  where: { S: 'm', n: '1' },
  source: statics('centroid'),
})
export const meanSettlement = formula({
  symbol: 's_g',
  name: 'mean settlement of the piles',
  unit: 'mm',
  text: 'S / n',
  where: { S: 'mm', n: '1' },
  source: statics('mean'),
})
export const settlementRatioOf = formula({
  symbol: 'R_s',
  name: 'settlement ratio',
  unit: '1',
  text: 's_g / s',
  where: { s_g: 'mm', s: 'mm' },
  source: practice('group over single pile at the same mean load'),
})
export const spreadOf = formula({
  symbol: 'ds',
  name: 'differential settlement',
  unit: 'mm',
  text: 's_max - s_min',
  where: { s_max: 'mm', s_min: 'mm' },
  source: statics('difference'),
})

export type GroupJob = {
  readonly pile: PileResponse
  /** Settlement of the single pile under the mean load. */
  readonly single: Term<'mm'>
  readonly layout: Layout
  readonly cap: 'rigid' | 'flexible'
  readonly places: readonly PilePlace[]
  readonly n: Term<'1'>
  readonly load: CapTerms
  readonly coupled: CoupledPiles | undefined
  readonly soft: Softening | undefined
  /** Place of the load in the request. */
  readonly pointer: string
}

const TOLERANCE = 1e-9
const SOLVE = 'rigid plane on interacting piles; Cholesky, from 160 unknowns on conjugate gradients'

/**
 * Settlement, tilt, pile loads and stiffness of a group. Superposition neglects that neighbours stiffen the ground;
 * the stiffness is that of a rigid cap about the centroid of the piles, each component acting alone (0: it cannot be taken).
 */
export function groupSettlement(sheet: Sheet, job: GroupJob) {
  const prepared = prepareFrom(sheet.within('flexibility'), job.pile, job.layout, job.pointer, job.coupled)
  const solved = job.cap === 'flexible' ? flexible(sheet, job, prepared) : rigid(sheet, job, prepared)
  const { piles, settlement, tilt, ...spread } = solved
  return {
    settlement,
    settlementRatio:
      job.single.value === 0 ? undefined : sheet.step(settlementRatioOf, { s_g: settlement, s: job.single }),
    tilt,
    ...spread,
    piles: job.places.map((p, i) => ({ x: p.x, y: p.y, ...piles[i]! })),
    curve: job.soft && job.cap === 'rigid' ? softCurve(sheet, job, prepared, job.soft) : undefined,
    stiffness: capStiffness(sheet, prepared),
  }
}

/** How a rigid cap moves, and the loads of its piles. */
function movement(sheet: Sheet, job: GroupJob, prepared: PreparedGroup) {
  const { load, pile, soft, pointer } = job
  const { elastic } = prepared
  const asked = { V: load.V.value, Mx: load.Mx.value, My: load.My.value }
  if (!soft) {
    const response = groupResponse(sheet, prepared, load, pointer)
    const plane = elastic.plane(asked, pointer)
    const { settlement: s_o, tiltAlongX: theta_x, tiltAlongY: theta_y } = response
    return { s_o, theta_x, theta_y, plane, loads: elastic.pileLoads(plane), method: SOLVE }
  }
  const { plane, loads, residual } = softPlane(elastic, pile, soft, asked, pointer)
  const { x, y } = elastic.centroid
  const method = SOFT_SOLVE
  const term = <const U extends 'mm' | '1'>(symbol: string, name: string, unit: U, value: number) =>
    sheet.solution({
      symbol,
      name,
      unit,
      value,
      method,
      operands: [load.V, load.Mx, load.My, ...soft.operands, ...prepared.basis],
      unknowns: unknownsOf(plane),
      residuals: [{ name: 'change of the last step, relative', value: residual }],
      tolerance: SOFT_TOLERANCE,
      source: pile.source,
    })
  return {
    s_o: term(
      's_o',
      'settlement of the cap at its origin',
      'mm',
      1000 * (plane.centre - plane.alongX * x - plane.alongY * y),
    ),
    theta_x: term('theta_x', 'tilt along x', '1', plane.alongX),
    theta_y: term('theta_y', 'tilt along y', '1', plane.alongY),
    plane,
    loads,
    method,
  }
}

function rigid(sheet: Sheet, job: GroupJob, prepared: PreparedGroup) {
  const { places, load, n, pile } = job
  const { s_o, theta_x, theta_y, plane, loads, method } = movement(sheet, job, prepared)
  const residuals = equilibrium(loads, job)
  const piles = places.map(({ x, y }, i) => ({
    load: sheet.solution(
      {
        symbol: 'P_i',
        name: `load of pile ${i + 1}`,
        unit: 'kN',
        value: loads[i]!,
        method,
        operands: [load.V, load.Mx, load.My, pile.stiffness, ...prepared.basis],
        unknowns: unknownsOf(plane),
        residuals,
        tolerance: TOLERANCE,
        source: pile.source,
      },
      `piles/${i}/P_i`,
    ),
    settlement: sheet.step(planeSettlement, { s_o, theta_x, x, theta_y, y }, `piles/${i}/s`),
  }))
  const centre = (axis: 'x' | 'y') =>
    sheet.step(
      meanPlace,
      {
        S: sheet.sum(
          { symbol: `S_${axis}`, name: `sum of ${axis}`, unit: 'm' },
          places.map((p) => p[axis]),
        ),
        n,
      },
      `${axis}_m`,
    )
  return {
    settlement: sheet.step(planeSettlement, { s_o, theta_x, x: centre('x'), theta_y, y: centre('y') }, 's_g'),
    tilt: { alongX: theta_x, alongY: theta_y },
    piles,
  }
}

/** A flexible cap hands each pile its share by statics; the tilt is that of the plane that fits the settlements best. */
function flexible(sheet: Sheet, job: GroupJob, { elastic, basis }: PreparedGroup) {
  const { pile, n } = job
  const loads = pileLoads(sheet.within('statics'), job.places, n, job.load, job.pointer)
  const given = Float64Array.from(loads, (p) => p.value)
  const settled = job.soft ? softSettlements(elastic, pile, job.soft, given) : elastic.settlements(given)
  const fit = bestPlane(elastic, settled)
  const solution = <const U extends 'mm' | '1'>(
    symbol: string,
    name: string,
    unit: U,
    value: number,
    operands: readonly Term[],
    method: string,
    id: string,
  ) =>
    sheet.solution(
      {
        symbol,
        name,
        unit,
        value,
        method,
        operands,
        unknowns: [{ symbol, value, unit }],
        residuals: equilibrium(
          Float64Array.from(loads, (p) => p.value),
          job,
        ),
        tolerance: TOLERANCE,
        source: pile.source,
      },
      id,
    )
  const from = [...loads, pile.stiffness, ...basis]
  const settlements = loads.map((_, i) =>
    solution(
      's',
      `settlement of pile ${i + 1}`,
      'mm',
      settled[i]! * 1000,
      // All loads stand once, with the first pile; the others name their own.
      i === 0 ? from : [loads[i]!, pile.stiffness],
      'interaction factors times pile loads',
      `piles/${i}/s`,
    ),
  )
  const S = sheet.sum({ symbol: 'S', name: 'sum of the settlements', unit: 'mm' }, settlements)
  const tilt = (symbol: string, axis: string, value: number) =>
    solution(symbol, `tilt along ${axis}`, '1', value, settlements, 'plane of least squares', symbol)
  const s_max = sheet.choice(
    { symbol: 's_max', name: 'largest settlement of a pile', unit: 'mm' },
    'largest',
    settlements,
  )
  const s_min = sheet.choice(
    { symbol: 's_min', name: 'smallest settlement of a pile', unit: 'mm' },
    'smallest',
    settlements,
  )
  return {
    settlement: sheet.step(meanSettlement, { S, n }),
    tilt: { alongX: tilt('theta_x', 'x', fit.alongX), alongY: tilt('theta_y', 'y', fit.alongY) },
    largest: s_max,
    differential: sheet.step(spreadOf, { s_max, s_min }),
    piles: loads.map((load, i) => ({ load, settlement: settlements[i]! })),
  }
}

/** Least squares is the rigid cap on equal springs of 1: the settlements in the place of the loads. */
function bestPlane({ points, centroid }: ElasticGroup, settled: Float64Array): { alongX: number; alongY: number } {
  const F = elasticGroup(
    points,
    superposed(points, 1, () => 0),
  ).flexibility
  const total = (weight: (i: number) => number) => settled.reduce((sum, s, i) => sum + s * weight(i), 0)
  const My = total((i) => points[i]!.x - centroid.x)
  const Mx = total((i) => points[i]!.y - centroid.y)
  return { alongX: F[4]! * My + F[5]! * Mx, alongY: F[7]! * My + F[8]! * Mx }
}

const unknownsOf = (plane: Plane) => [
  { symbol: 's_c', value: plane.centre, unit: 'm' as const },
  { symbol: 'theta_x', value: plane.alongX, unit: '1' as const },
  { symbol: 'theta_y', value: plane.alongY, unit: '1' as const },
]

/** What the pile loads leave of V, My, Mx, relative to the loads and their levers. */
function equilibrium(loads: Float64Array, { places, load }: GroupJob) {
  const total = (weight: (i: number) => number) => loads.reduce((sum, p, i) => sum + p * weight(i), 0)
  // Against the loads times the largest arm: moments that all vanish would leave nothing to compare with.
  const size = (weight: (i: number) => number) => {
    const arm = places.reduce((most, _, i) => Math.max(most, Math.abs(weight(i))), 0)
    return loads.reduce((sum, p) => sum + Math.abs(p), 0) * arm + 1e-30
  }
  const left = (name: string, weight: (i: number) => number, given: number) => ({
    name: `${name}, relative`,
    value: Math.abs(total(weight) - given) / (size(weight) + Math.abs(given)),
  })
  return [
    left('vertical equilibrium', () => 1, load.V.value),
    left('moment equilibrium along x', (i) => places[i]!.x.value, load.My.value),
    left('moment equilibrium along y', (i) => places[i]!.y.value, load.Mx.value),
  ]
}
