import { statics } from '../sources/bibliography.ts'
import { formula } from '../trace/formula.ts'
import type { Sheet } from '../trace/sheet.ts'
import type { Term } from '../trace/term.ts'
import { utilisationRatio } from './checks/serviceability.ts'
import { neighbourPairs } from './neighbours.ts'
import type { Cap, Schedule } from './schedule.ts'
import type { SettlementTerms } from './settle-cap.ts'

export const differential = formula({
  symbol: 'ds',
  name: 'differential settlement',
  unit: 'mm',
  text: 'abs(s_a - s_b)',
  where: { s_a: 'mm', s_b: 'mm' },
  source: statics('difference'),
})
export const distortion = formula({
  symbol: 'beta',
  name: 'angular distortion',
  unit: '1',
  text: 'ds / l',
  where: { ds: 'mm', l: 'm' },
  source: statics('difference over distance'),
})
export const planDistance = formula({
  symbol: 'l',
  name: 'distance of the caps',
  unit: 'm',
  text: 'sqrt((x_a - x_b)^2 + (y_a - y_b)^2)',
  where: { x_a: 'm', x_b: 'm', y_a: 'm', y_b: 'm' },
  source: statics('plan distance'),
})

export type NeighbourTerms = {
  readonly a: string
  readonly b: string
  readonly distance: Term<'m'>
  readonly combination: string
  readonly differentialSettlement: Term<'mm'>
  readonly angularDistortion: Term<'1'>
  /** With `satisfied`, where the schedule has a limit. */
  readonly utilisation?: Term<'1'>
  readonly satisfied?: boolean
}
type Settled = { readonly cap: Cap; readonly settlement: readonly SettlementTerms[] }

/** Differential settlement of neighbouring caps, in the combination where it is largest. */
export function compareNeighbours(sheet: Sheet, schedule: Schedule, assessed: readonly Settled[]): NeighbourTerms[] {
  const position = (here: Sheet, axis: 'x' | 'y', side: 'a' | 'b', index: number) =>
    here.input(
      { symbol: `${axis}_${side}`, name: `${axis} of cap ${side}`, unit: 'm' },
      schedule.caps[index]![axis],
      `/caps/${index}/${axis}`,
    )
  return neighbourPairs(schedule.caps).flatMap((pair) => {
    const [a, b] = [assessed[pair.a]!, assessed[pair.b]!]
    const byName = new Map(b.settlement.map((s) => [s.combination, s]))
    const shared = a.settlement.flatMap((s): [SettlementTerms, SettlementTerms][] =>
      byName.has(s.combination) ? [[s, byName.get(s.combination)!]] : [],
    )
    if (shared.length === 0) return []
    const gap = ([s, t]: [SettlementTerms, SettlementTerms]) => Math.abs(s.settlement.value - t.settlement.value)
    const [s_a, s_b] = shared.reduce((best, next) => (gap(next) > gap(best) ? next : best))
    const here = sheet.within(`neighbours/${pair.a}-${pair.b}`)
    const l = here.step(planDistance, {
      x_a: position(here, 'x', 'a', pair.a),
      x_b: position(here, 'x', 'b', pair.b),
      y_a: position(here, 'y', 'a', pair.a),
      y_b: position(here, 'y', 'b', pair.b),
    })
    const ds = here.step(differential, { s_a: s_a.settlement, s_b: s_b.settlement })
    const angularDistortion = here.step(distortion, { ds, l })
    const value = schedule.limits?.angularDistortion
    const t_lim =
      value === undefined
        ? undefined
        : here.input(
            { symbol: 't_lim', name: 'limit of the angular distortion', unit: '1' },
            value,
            '/limits/angularDistortion',
          )
    const utilisation = t_lim && here.step(utilisationRatio, { t: angularDistortion, t_lim })
    return [
      {
        a: a.cap.mark,
        b: b.cap.mark,
        distance: l,
        combination: s_a.combination,
        differentialSettlement: ds,
        angularDistortion,
        ...(utilisation && { utilisation, satisfied: utilisation.value <= 1 }),
      },
    ]
  })
}
