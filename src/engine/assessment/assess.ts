import { refuse } from '../faults.ts'
import { type Notice, usualCautions } from '../notice.ts'
import { statics } from '../sources/bibliography.ts'
import { formula } from '../trace/formula.ts'
import { settleTerms, traceOf } from '../trace/outcome.ts'
import { Sheet } from '../trace/sheet.ts'
import { assessCap, type Row, serviceRows } from './assess-cap.ts'
import { capField } from './cap-field.ts'
import { utilisationRatio } from './checks/serviceability.ts'
import { neighbourPairs } from './neighbours.ts'
import { type ResistanceSet, resistanceSet } from './resistance-set.ts'
import type { Cap, Schedule } from './schedule.ts'
import { refuseFaults } from './schedule-faults.ts'
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

type Assessed = { readonly cap: Cap; readonly set: ResistanceSet } & ReturnType<typeof assessCap>

export type AssessOptions = {
  readonly trace: boolean
  /** Mark of one cap: the trace then holds every combination of that cap, and nothing of the others. */
  readonly cap?: string
}

/** The main job: every check of every cap of a schedule. Refuses a schedule with faults, all of them at once. */
export function assess(schedule: Schedule, options: AssessOptions) {
  refuseFaults(schedule)
  const alone = options.trace ? options.cap : undefined
  if (alone !== undefined && !schedule.caps.some((cap) => cap.mark === alone)) {
    refuse('unknown-reference', '', {
      kind: 'cap',
      name: alone,
      known: schedule.caps.slice(0, 20).map((cap) => cap.mark),
    })
  }
  const book = options.trace ? Sheet.recording() : Sheet.silent
  const sheetOf = (cap: Cap) => (alone === undefined || cap.mark === alone ? book : Sheet.silent)
  const sets = new Map<string, ResistanceSet>()
  const rowsOf = new Map<string, Row[]>(schedule.caps.map((cap) => [cap.mark, []]))
  for (const [index, row] of schedule.loads.rows.entries()) {
    rowsOf.get(row.cap)!.push({ index, row, limitState: schedule.loads.combinations[row.combination]!.limitState })
  }
  const setOf = schedule.caps.map((cap, index) => {
    const key = JSON.stringify([cap.pileType, cap.ground, cap.layout, cap.mark === alone])
    const set = sets.get(key) ?? resistanceSet(sheetOf(cap), schedule, cap, index, sets.size + 1)
    sets.set(key, set)
    return set
  })
  const field = schedule.capInteraction
    ? capField(schedule, setOf, [...rowsOf.values()].flatMap(serviceRows))
    : undefined
  const assessed = schedule.caps.map((cap, index): Assessed => {
    const set = setOf[index]!
    const rows = rowsOf.get(cap.mark)!
    return { cap, set, ...assessCap(sheetOf(cap), schedule, cap, index, set, rows, cap.mark === alone, field) }
  })
  const common = alone === undefined ? book : Sheet.silent
  const tree = {
    summary: summary(common, assessed),
    caps: assessed.map(({ cap, set, checks, settlement }) => ({
      mark: cap.mark,
      pileCount: set.pileCount,
      single: set.single,
      block: set.block,
      checks,
      settlement,
      stiffness: set.stiffness,
      notices: set.notices,
    })),
    neighbours: neighbours(common, schedule, assessed),
  }
  const { result, links } = settleTerms(tree)
  const notices: Notice[] = [usualCautions]
  if (field && sets.size > 1)
    notices.push({
      code: 'approximation',
      level: 'info',
      pointer: '/capInteraction',
      text: 'Between caps on different piles or ground the interaction of two piles is the mean of what either gives alone.',
    })
  return { result, notices, ...(options.trace && { trace: traceOf(book, links) }) }
}

function summary(sheet: Sheet, assessed: readonly Assessed[]) {
  const here = sheet.within('summary')
  const count = (symbol: string, name: string, value: number) =>
    here.assumed({ symbol, name, unit: '1' }, value, 'counted over the caps', statics('counting'))
  const good = assessed.filter((a) => a.checks.every((c) => c.satisfied)).length
  const all = assessed.flatMap(({ cap, checks }) =>
    checks.map((c) => ({ cap: cap.mark, check: c.check, combination: c.combination, utilisation: c.utilisation })),
  )
  const worst = all.reduce<(typeof all)[number] | undefined>(
    (a, b) => (!a || b.utilisation.value > a.utilisation.value ? b : a),
    undefined,
  )
  return {
    caps: count('n', 'number of caps', assessed.length),
    satisfied: count('n_s', 'caps with every check satisfied', good),
    exceeded: count('n_e', 'caps with a check exceeded', assessed.length - good),
    worst,
  }
}

/** Differential settlement of neighbouring caps, in the combination where it is largest. */
function neighbours(sheet: Sheet, schedule: Schedule, assessed: readonly Assessed[]) {
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
