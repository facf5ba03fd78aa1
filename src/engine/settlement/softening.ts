import { refuse } from '../faults.ts'
import type { SettlementRequest } from '../requests.ts'
import { cite, practice } from '../sources/bibliography.ts'
import type { Sheet } from '../trace/sheet.ts'
import type { Term } from '../trace/term.ts'
import { type PileCurve, pileCurve } from './continuum/hyperbolic-group.ts'
import { type CurvePoint, FOUND, loadCurve, settlementUnder, type Ultimate } from './continuum/hyperbolic-pile.ts'
import type { PileResponse } from './pile-response.ts'

/** Ultimate resistance of a pile, as the methods of resistance give it. */
export type UltimateTerms = {
  readonly layers: readonly {
    readonly top: Term<'m'>
    readonly bottom: Term<'m'>
    readonly shaftResistance: Term<'kN'>
  }[]
  readonly shaft: Term<'kN'>
  readonly base: Term<'kN'>
}

/** Common practice where a request names no R_f: [practice]. */
const USUAL = { shaft: 0.5, base: 0.9 } as const
const SOLVE = "boundary elements whose own springs soften hyperbolically; Newton's method on the element forces"

export type Softening = {
  readonly operands: readonly Term[]
  /** Ultimate resistance of one pile, kN. */
  readonly ultimate: number
  readonly curve: readonly CurvePoint[]
  readonly pile: PileCurve
  readonly settle: (P: Term<'kN'>, pointer: string) => Term<'mm'>
}

/** The load-settlement law of one pile from its elastic solution and its resistance. */
export function softening(
  sheet: Sheet,
  request: SettlementRequest,
  pile: PileResponse,
  resistance: UltimateTerms,
): Softening {
  const { elements } = pile
  if (!elements)
    return refuse('method-not-applicable', '/nonlinearity', {
      method: 'elastic-continuum',
      reason: 'nonlinearity "hyperbolic" is of the method elastic-continuum',
    })
  const here = sheet.within('softening')
  const ratioOf = (part: 'shaft' | 'base') => {
    const label = {
      symbol: part === 'shaft' ? 'R_fs' : 'R_fb',
      name: `failure ratio of the ${part}`,
      unit: '1',
    } as const
    const value = request.failureRatio?.[part]
    return value === undefined
      ? here.assumed(label, USUAL[part], 'no failureRatio was given', practice('hyperbola of pile springs'))
      : here.input(label, value, `/failureRatio/${part}`)
  }
  const ratio = { shaft: ratioOf('shaft'), base: ratioOf('base') }
  const { solved } = elements
  const { edges } = solved.soil.mesh
  const m = edges.length - 1
  const given = resistance.layers.reduce((s, l) => s + l.shaftResistance.value, 0)
  const scale = given > 0 ? resistance.shaft.value / given : 0
  // A part without resistance carries next to nothing, but its equation must stay regular.
  const least = 1e-9 * (resistance.shaft.value + resistance.base.value)
  const forces = new Float64Array(m + 1).fill(least)
  for (let i = 0; i < m; i++)
    for (const layer of resistance.layers) {
      const length = layer.bottom.value - layer.top.value
      const common = Math.min(layer.bottom.value, edges[i + 1]!) - Math.max(layer.top.value, edges[i]!)
      if (common > 0) forces[i]! += (scale * layer.shaftResistance.value * common) / length
    }
  forces[m]! += resistance.base.value
  const failureRatio = Float64Array.from(forces, (_, i) => (i === m ? ratio.base.value : ratio.shaft.value))
  const ultimate: Ultimate = { forces, failureRatio }
  const own = solved.soil.own()
  const ground = Float64Array.from(forces, (_, i) => own[i * (m + 1) + i]!)
  const curve = loadCurve(solved, ground, ultimate)
  const operands = [pile.stiffness, resistance.shaft, resistance.base, ratio.shaft, ratio.base]
  const total = forces.reduce((s, q) => s + q, 0)
  return {
    operands,
    ultimate: total,
    curve,
    pile: pileCurve(curve),
    settle: (P, pointer) => {
      const under = settlementUnder(solved, ground, ultimate, curve, Math.abs(P.value))
      if (!under)
        return refuse('load-beyond-resistance', pointer, {
          load: Math.abs(P.value),
          resistance: curve.at(-1)!.load,
          unit: 'kN',
        })
      if (!(under.residual <= FOUND)) return refuse('not-finite', pointer, { symbol: 's' })
      return here.solution({
        symbol: 's',
        name: 'settlement of the pile head with softening springs',
        unit: 'mm',
        value: Math.sign(P.value) * under.settlement * 1000,
        method: SOLVE,
        operands: [P, ...operands],
        unknowns: Array.from(under.forces, (value, i) => ({
          symbol: i === m ? 'Q_b' : `Q_${i + 1}`,
          value,
          unit: 'kN' as const,
        })),
        residuals: [{ name: 'compatibility and equilibrium, relative', value: under.residual }],
        tolerance: FOUND,
        mesh: Array.from(edges),
        source: cite('fleming-1992', 'hyperbolic springs'),
      })
    },
  }
}

/** How the points of a curve were found: the loads for chosen settlements of one pile, or the settlements for chosen loads of a group. */
export type CurveWay = {
  readonly chosen: 'load' | 'settlement'
  readonly method: string
  readonly tolerance: number
  readonly operands: readonly Term[]
}

/** The curve of one pile is followed by steps of settlement. */
export const pileCurveWay = (operands: readonly Term[]): CurveWay => ({
  chosen: 'settlement',
  method: SOLVE,
  tolerance: FOUND,
  operands,
})

/** Points of a curve as terms: what was chosen is a given step, what was found a solution with its residual. */
export function curveTerms(sheet: Sheet, points: readonly CurvePoint[], way: CurveWay) {
  return points.map((point, i) => {
    const term = <const U extends 'kN' | 'mm'>(part: 'load' | 'settlement', symbol: string, unit: U, value: number) => {
      const label = { symbol, name: `${part} of the curve`, unit } as const
      const id = `${i}/${symbol}`
      if (part === way.chosen)
        return sheet.assumed(
          label,
          value,
          `the curve is followed by steps of ${part}`,
          practice('points of a curve'),
          id,
        )
      const { method, tolerance, operands } = way
      return sheet.solution(
        {
          ...label,
          ...{ value, method, tolerance },
          // All operands stand once, with the first point.
          operands: i === 0 ? operands : operands.slice(0, 1),
          unknowns: [{ symbol, value, unit }],
          residuals: [{ name: 'compatibility and equilibrium, relative', value: point.residual }],
          source: cite('fleming-1992', 'hyperbolic springs'),
        },
        id,
      )
    }
    return {
      load: term('load', 'P', 'kN', point.load),
      settlement: term('settlement', 's', 'mm', point.settlement * 1000),
    }
  })
}
