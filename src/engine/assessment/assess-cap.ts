import { limitStateFor } from '../design-basis/design-resistance.ts'
import { practice } from '../sources/bibliography.ts'
import { Sheet } from '../trace/sheet.ts'
import type { Term } from '../trace/term.ts'
import type { CapField } from './cap-field.ts'
import { type CapActions, capActions } from './cap-loads.ts'
import { settlementCheck, tiltCheck } from './checks/serviceability.ts'
import type { Demand, LoadedCap, StrengthCheck, StrengthKind } from './checks/strength-check.ts'
import { strengthChecks } from './checks/strength-checks.ts'
import { traceStrength } from './checks/trace-strength.ts'
import { idPart } from './places.ts'
import type { ResistanceSet } from './resistance-set.ts'
import type { Cap, LimitState, ModelRow, PressingRow, Schedule } from './schedule.ts'
import { settleCap } from './settle-cap.ts'

export type Row = { readonly index: number; readonly row: ModelRow | PressingRow; readonly limitState: LimitState }
export type CheckTerms = {
  readonly check: StrengthKind | 'settlement' | 'tilt'
  readonly combination: string
  readonly demand: Term
  readonly resistance: Term
  readonly utilisation: Term<'1'>
  readonly satisfied: boolean
  readonly pile?: Term<'1'>
}

/** A check under one combination, by numbers. */
type Compared = { readonly row: Row; readonly demand: Demand; readonly utilisation: number }

/**
 * All checks of a cap: every combination by numbers, the governing one of each kind as steps.
 * With `every`, the steps of every combination are kept (`caps/<mark>/<check>/<combination>/…`).
 */
export function assessCap(
  root: Sheet,
  schedule: Schedule,
  cap: Cap,
  index: number,
  set: ResistanceSet,
  rows: readonly Row[],
  every: boolean,
  field?: CapField,
) {
  const sheet = root.within(`caps/${idPart(cap.mark)}`)
  const label = { symbol: 'W_c', name: 'weight of the cap', unit: 'kN' } as const
  const weight =
    cap.capWeight === undefined
      ? sheet.assumed(label, 0, 'no capWeight was given', practice('no weight of the cap'))
      : sheet.input(label, cap.capWeight, `/caps/${index}/capWeight`)
  const strength = limitStateFor(schedule.designBasis)
  const loaded = rows
    .filter((r) => r.limitState === strength)
    .map((row) => ({ row, at: loadedCap(schedule, cap, set, row, capActions(schedule.loads, row.row, weight.value)) }))
  const checks = strengthChecks.flatMap((check): CheckTerms[] => {
    const compared = loaded.flatMap(({ row, at }) => compare(check, row, at))
    if (compared.length === 0) return []
    const governing = compared.reduce((a, b) => (b.utilisation > a.utilisation ? b : a))
    const traced = new Map(
      (every ? compared : [governing]).map((c) => {
        const here = sheet.within(every ? `${check.kind}/${idPart(c.row.row.combination)}` : check.kind)
        return [c, traceStrength(here, check, { schedule, cap, set, weight, ...c.row }, c.demand)]
      }),
    )
    const terms = traced.get(governing)!
    return [
      {
        check: check.kind,
        combination: governing.row.row.combination,
        ...terms,
        satisfied: terms.utilisation.value <= 1,
      },
    ]
  })
  const settlement = serviceRows(rows).map(({ row, index: at }) =>
    settleCap(sheet, set, schedule.loads, at, row, weight, field?.(index, row.combination)),
  )
  const limits = schedule.limits ?? {}
  const limited =
    settlement.length === 0
      ? []
      : [
          ...(limits.settlement === undefined
            ? []
            : [
                {
                  check: 'settlement' as const,
                  ...settlementCheck(sheet.within('settlement'), settlement, limits.settlement),
                },
              ]),
          ...(limits.tilt === undefined
            ? []
            : [{ check: 'tilt' as const, ...tiltCheck(sheet.within('tilt'), settlement, limits.tilt) }]),
        ].map((c): CheckTerms => ({ ...c, satisfied: c.utilisation.value <= 1 }))
  return { settlement, checks: [...checks, ...limited] }
}

/** Rows that a cap settles under: serviceability ones, or working ones where there are none. */
export function serviceRows(rows: readonly Row[]): readonly Row[] {
  const service = rows.some((r) => r.limitState === 'serviceability') ? 'serviceability' : 'working'
  return rows.filter((r) => r.limitState === service)
}

function compare(check: StrengthCheck, row: Row, at: LoadedCap): Compared[] {
  const demand = check.demand(at)
  if (!demand) return []
  return [{ row, demand, utilisation: demand.value / check.resistance(at, demand, Sheet.silent).value }]
}

function loadedCap(schedule: Schedule, cap: Cap, set: ResistanceSet, row: Row, load: CapActions): LoadedCap {
  const plane = set.statics.plane(load, `/loads/rows/${row.index}`)
  let most = { pile: 0, load: set.statics.load(plane, 0) }
  let least = most
  for (let pile = 1; pile < set.points.length; pile++) {
    const own = set.statics.load(plane, pile)
    if (own > most.load) most = { pile, load: own }
    if (own < least.load) least = { pile, load: own }
  }
  return { schedule, cap, set, load, most, least }
}
