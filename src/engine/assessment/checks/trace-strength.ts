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
export const pileLoad = formula({
  symbol: 'P',
  name: 'load of the pile',
  unit: 'kN',
  text: 'V / n + a * x + b * y',
  where: { V: 'kN', n: '1', a: 'kN/m', x: 'm', b: 'kN/m', y: 'm' },
  source: statics('rigid cap, pinned heads'),
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
  const F = demand.pile === undefined ? load.V : loadOfPile(sheet, at, load, demand.pile)
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

function loadOfPile(
  sheet: Sheet,
  { set, index }: LoadedRow,
  load: ReturnType<typeof capTerms>,
  pile: number,
): Term<'kN'> {
  const { centroid } = set.statics
  const plane = set.statics.plane({ V: load.V.value, Mx: load.Mx.value, My: load.My.value }, `/loads/rows/${index}`)
  const solved = { residuals: [], tolerance: 1e-9 }
  const slope = (symbol: 'a' | 'b', axis: 'x' | 'y') =>
    sheet.solution({
      symbol,
      name: `slope of the pile loads along ${axis}`,
      unit: 'kN/m',
      value: plane[symbol],
      method: 'second moments of the pile positions about their centroid, 2 x 2',
      operands: [load.V, load.Mx, load.My],
      unknowns: [{ symbol, value: plane[symbol], unit: 'kN/m' }],
      source: statics('rigid cap, pinned heads'),
      ...solved,
    })
  const offset = (axis: 'x' | 'y') =>
    sheet.solution({
      symbol: axis,
      name: `${axis} of pile ${pile + 1} from the centroid`,
      unit: 'm',
      value: set.points[pile]![axis] - centroid[axis],
      method: 'position less centroid',
      operands: [set.pileCount],
      unknowns: [{ symbol: `${axis}_c`, value: centroid[axis], unit: 'm' }],
      source: statics('centroid'),
      ...solved,
    })
  return sheet.step(pileLoad, {
    V: load.V,
    n: set.pileCount,
    a: slope('a', 'x'),
    x: offset('x'),
    b: slope('b', 'y'),
    y: offset('y'),
  })
}
