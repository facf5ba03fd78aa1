import { pileLoad } from '../../piles/pile-plan.ts'
import { practice, statics } from '../../sources/bibliography.ts'
import { formula } from '../../trace/formula.ts'
import type { Sheet } from '../../trace/sheet.ts'
import type { Term } from '../../trace/term.ts'
import { capTerms } from '../cap-loads.ts'
import type { ResistanceSet } from '../resistance-set.ts'
import type { Cap, ModelRow, PressingRow, Schedule } from '../schedule.ts'
import type { Demand, StrengthCheck } from './strength-check.ts'

export const utilisationForce = formula({
  symbol: 'u',
  name: 'utilisation',
  unit: '1',
  text: 'E / R',
  where: { E: 'kN', R: 'kN' },
  source: practice('demand over resistance'),
})
export const pull = formula({
  symbol: 'T',
  name: 'pull',
  unit: 'kN',
  text: '-F',
  where: { F: 'kN' },
  source: statics('pull is negative compression'),
})
export const compressionOf = formula({
  symbol: 'E',
  name: 'compression, nothing where the pile is pulled',
  unit: 'kN',
  text: 'max((0 kN), F)',
  where: { F: 'kN' },
  source: statics('compression'),
})

export type StrengthTerms = {
  readonly demand: Term<'kN'>
  readonly resistance: Term<'kN'>
  readonly utilisation: Term<'1'>
  readonly pile?: Term<'1'>
}
export type LoadedRow = {
  readonly schedule: Schedule
  readonly cap: Cap
  readonly set: ResistanceSet
  readonly index: number
  readonly row: ModelRow | PressingRow
  readonly weight: Term<'kN'>
}

/** The steps of one check under one combination, from the row of the model to the utilisation. */
export function traceStrength(sheet: Sheet, check: StrengthCheck, at: LoadedRow, demand: Demand): StrengthTerms {
  const load = capTerms(sheet, at.schedule.loads, at.index, at.row, at.weight)
  const F = demand.pile === undefined ? load.V : pileLoad(sheet, at.set.plan, load, demand.pile)
  const E = demand.pulled ? sheet.step(pull, { F }) : demand.pile === undefined ? F : sheet.step(compressionOf, { F })
  const resistance = check.resistance(at, demand, sheet)
  const utilisation = sheet.step(utilisationForce, { E, R: resistance })
  if (demand.pile === undefined) return { demand: E, resistance, utilisation }
  const why = demand.pulled ? 'the most pulled pile' : 'the most loaded pile'
  const pile = sheet.assumed(
    { symbol: 'i', name: 'number of the pile in its layout', unit: '1' },
    demand.pile + 1,
    why,
    statics('largest pile load'),
  )
  return { demand: E, resistance, utilisation, pile }
}
