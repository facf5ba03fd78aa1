import { limitStateFor } from '../design-basis/design-resistance.ts'
import { cite, practice, statics } from '../sources/bibliography.ts'
import { formula } from '../trace/formula.ts'
import type { Sheet } from '../trace/sheet.ts'
import type { Term } from '../trace/term.ts'
import { type CapActions, capActions, capTerms } from './cap-loads.ts'
import type { ResistanceSet } from './resistance-set.ts'
import type { Cap, LimitState, ModelRow, PressingRow, Schedule } from './schedule.ts'

export const utilisationForce = formula({
  symbol: 'u',
  name: 'utilisation',
  unit: '1',
  text: 'E / R',
  where: { E: 'kN', R: 'kN' },
  source: practice('demand over resistance'),
})
export const utilisationSettlement = formula({
  symbol: 'u',
  name: 'utilisation',
  unit: '1',
  text: 's / s_lim',
  where: { s: 'mm', s_lim: 'mm' },
  source: practice('demand over limit'),
})
export const utilisationRatio = formula({
  symbol: 'u',
  name: 'utilisation',
  unit: '1',
  text: 't / t_lim',
  where: { t: '1', t_lim: '1' },
  source: practice('demand over limit'),
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

export type CheckKind =
  | 'pile-compression'
  | 'pile-uplift'
  | 'group-compression'
  | 'block-compression'
  | 'group-uplift'
  | 'block-uplift'
  | 'pile-section'
  | 'settlement'
  | 'tilt'
export type Row = { readonly index: number; readonly row: ModelRow | PressingRow; readonly limitState: LimitState }
export type CheckTerms = {
  readonly check: CheckKind
  readonly combination: string
  readonly demand: Term
  readonly resistance: Term
  readonly utilisation: Term<'1'>
  readonly satisfied: boolean
  readonly pile?: Term<'1'>
}
export type SettlementTerms = {
  readonly combination: string
  readonly settlement: Term<'mm'>
  readonly tilt: Term<'1'>
}

/** One demand of one combination: numbers only, so that thousands of combinations stay cheap. */
type Candidate = {
  readonly check: CheckKind
  readonly row: Row
  readonly demand: number
  readonly utilisation: number
  readonly pile?: number
  readonly pulled?: boolean
}

/** All checks of a cap: every combination by numbers, the governing one of each kind as steps. */
export function assessCap(
  root: Sheet,
  schedule: Schedule,
  cap: Cap,
  index: number,
  set: ResistanceSet,
  rows: readonly Row[],
) {
  const sheet = root.within(`caps/${cap.mark.replaceAll('/', '~')}`)
  const weight =
    cap.capWeight === undefined
      ? sheet.assumed(
          { symbol: 'W_c', name: 'weight of the cap', unit: 'kN' },
          0,
          'no capWeight was given',
          practice('no weight of the cap'),
        )
      : sheet.input({ symbol: 'W_c', name: 'weight of the cap', unit: 'kN' }, cap.capWeight, `/caps/${index}/capWeight`)
  const actions = new Map(rows.map((r) => [r, capActions(schedule.loads, r.row, weight.value)]))
  const governing = new Map<CheckKind, Candidate>()
  const offer = (c: Candidate) => {
    const best = governing.get(c.check)
    if (!best || c.utilisation > best.utilisation) governing.set(c.check, c)
  }
  const strength = limitStateFor(schedule.designBasis)
  for (const row of rows)
    if (row.limitState === strength) strengthCandidates(schedule, cap, set, row, actions.get(row)!, offer)
  const service = rows.some((r) => r.limitState === 'serviceability') ? 'serviceability' : 'working'
  const settlement = rows
    .filter((r) => r.limitState === service)
    .map((row) => settle(sheet, set, row, actions.get(row)!))
  const checks = [...governing.values()].map((c) => traced(sheet, schedule, cap, set, weight, c))
  const limited = [
    limit(sheet, 'settlement', settlement, schedule.limits?.settlement),
    limit(sheet, 'tilt', settlement, schedule.limits?.tilt),
  ].filter((c) => c !== undefined)
  return { settlement, checks: [...checks, ...limited] }
}

function strengthCandidates(
  schedule: Schedule,
  cap: Cap,
  set: ResistanceSet,
  row: Row,
  load: CapActions,
  offer: (c: Candidate) => void,
): void {
  const plane = set.statics.plane(load, `/loads/rows/${row.index}`)
  let [most, least] = [0, 0]
  const loads = set.points.map((_, i) => set.statics.load(plane, i))
  for (let i = 1; i < loads.length; i++) {
    if (loads[i]! > loads[most]!) most = i
    if (loads[i]! < loads[least]!) least = i
  }
  const against = (check: CheckKind, demand: number, resistance: number, rest: Partial<Candidate> = {}) =>
    offer({ check, row, demand, utilisation: demand / resistance, ...rest })
  const { pile, piles, block } = set.compression
  against('pile-compression', Math.max(0, loads[most]!), pile.value, { pile: most })
  if (load.V >= 0) {
    against('group-compression', load.V, piles.value)
    against('block-compression', load.V, block.value)
  } else {
    against('group-uplift', -load.V, set.uplift().piles.value, { pulled: true })
    against('block-uplift', -load.V, set.uplift().block.value, { pulled: true })
  }
  if (loads[least]! < -1e-9)
    against('pile-uplift', -loads[least]!, set.uplift().pile.value, { pile: least, pulled: true })
  const section = schedule.pileTypes[cap.pileType]!.sectionResistance
  if (section?.compression) against('pile-section', Math.max(0, loads[most]!), section.compression, { pile: most })
  if (section?.tension && loads[least]! < 0)
    against('pile-section', -loads[least]!, section.tension, { pile: least, pulled: true })
}

/** Settlement at the centroid and the slope of the cap: the prepared plane, one product for each combination. */
function settle(sheet: Sheet, set: ResistanceSet, row: Row, load: CapActions): SettlementTerms {
  const plane = set.elastic.plane(load, `/loads/rows/${row.index}`)
  const here = sheet.within(`settlement/${row.row.combination.replaceAll('/', '~')}`)
  const solved = {
    method: 'prepared plane flexibility times the actions',
    operands: [set.pileStiffness],
    residuals: [],
    tolerance: 1e-9,
    source: cite('randolph-wroth-1978', 'superposition'),
  }
  const value = plane.centre * 1000
  const tilt = Math.hypot(plane.alongX, plane.alongY)
  return {
    combination: row.row.combination,
    settlement: here.solution({
      symbol: 's',
      name: 'settlement of the cap at the centroid of its piles',
      unit: 'mm',
      value,
      unknowns: [{ symbol: 's', value, unit: 'mm' }],
      ...solved,
    }),
    tilt: here.solution({
      symbol: 'theta',
      name: 'tilt of the cap',
      unit: '1',
      value: tilt,
      unknowns: [
        { symbol: 'theta_x', value: plane.alongX, unit: '1' },
        { symbol: 'theta_y', value: plane.alongY, unit: '1' },
      ],
      ...solved,
    }),
  }
}

/** The steps of a governing combination, from the row of the model to the utilisation. */
function traced(
  sheet: Sheet,
  schedule: Schedule,
  cap: Cap,
  set: ResistanceSet,
  weight: Term<'kN'>,
  c: Candidate,
): CheckTerms {
  const here = sheet.within(c.check)
  const load = capTerms(here, schedule.loads, c.row.index, c.row.row, weight)
  const safe = c.pulled ? set.uplift() : set.compression
  const demand = c.pile === undefined ? load.V : loadOfPile(here, set, c.row, load, c.pile)
  const E = c.pulled
    ? here.step(pull, { F: demand })
    : c.demand === 0 && demand.value < 0
      ? here.assumed(
          { symbol: 'E', name: 'compression', unit: 'kN' },
          0,
          'no pile is compressed',
          statics('all piles pulled'),
        )
      : demand
  const kind = c.pulled ? 'tension' : 'compression'
  const R =
    c.check === 'pile-section'
      ? here.input(
          { symbol: 'R_sec', name: `design resistance of the section in ${kind}`, unit: 'kN' },
          schedule.pileTypes[cap.pileType]!.sectionResistance![kind]!,
          `/pileTypes/${cap.pileType.replaceAll('~', '~0').replaceAll('/', '~1')}/sectionResistance/${kind}`,
        )
      : c.check.startsWith('pile')
        ? safe.pile
        : c.check.startsWith('group')
          ? safe.piles
          : safe.block
  const utilisation = here.step(utilisationForce, { E, R })
  const pile =
    c.pile === undefined
      ? undefined
      : here.assumed(
          { symbol: 'i', name: 'number of the pile in its layout', unit: '1' },
          c.pile + 1,
          c.pulled ? 'the most pulled pile' : 'the most loaded pile',
          statics('largest pile load'),
        )
  return {
    check: c.check,
    combination: c.row.row.combination,
    demand: E,
    resistance: R,
    utilisation,
    satisfied: utilisation.value <= 1,
    ...(pile && { pile }),
  }
}

function loadOfPile(
  here: Sheet,
  set: ResistanceSet,
  row: Row,
  load: { V: Term<'kN'>; Mx: Term<'kN.m'>; My: Term<'kN.m'> },
  pile: number,
): Term<'kN'> {
  const { centroid } = set.statics
  const plane = set.statics.plane({ V: load.V.value, Mx: load.Mx.value, My: load.My.value }, `/loads/rows/${row.index}`)
  const slope = (symbol: 'a' | 'b') =>
    here.solution({
      symbol,
      name: `slope of the pile loads along ${symbol === 'a' ? 'x' : 'y'}`,
      unit: 'kN/m',
      value: plane[symbol],
      method: 'second moments of the pile positions about their centroid, 2 x 2',
      operands: [load.V, load.Mx, load.My],
      unknowns: [{ symbol, value: plane[symbol], unit: 'kN/m' }],
      residuals: [],
      tolerance: 1e-9,
      source: statics('rigid cap, pinned heads'),
    })
  const offset = (symbol: 'x' | 'y') =>
    here.solution({
      symbol,
      name: `${symbol} of pile ${pile + 1} from the centroid`,
      unit: 'm',
      value: set.points[pile]![symbol] - centroid[symbol],
      method: 'position less centroid',
      operands: [set.pileCount],
      unknowns: [{ symbol: `${symbol}_c`, value: centroid[symbol], unit: 'm' }],
      residuals: [],
      tolerance: 1e-9,
      source: statics('centroid'),
    })
  return here.step(pileLoad, {
    V: load.V,
    n: set.pileCount,
    a: slope('a'),
    x: offset('x'),
    b: slope('b'),
    y: offset('y'),
  })
}

function limit(
  sheet: Sheet,
  check: 'settlement' | 'tilt',
  all: readonly SettlementTerms[],
  value: number | undefined,
): CheckTerms | undefined {
  if (value === undefined || all.length === 0) return undefined
  const worst = all.reduce((a, b) => (Math.abs(b[check].value) > Math.abs(a[check].value) ? b : a))
  const here = sheet.within(check)
  const pointer = `/limits/${check}`
  const base = { check, combination: worst.combination } as const
  if (check === 'settlement') {
    const resistance = here.input({ symbol: 's_lim', name: 'limit of the settlement', unit: 'mm' }, value, pointer)
    const utilisation = here.step(utilisationSettlement, { s: worst.settlement, s_lim: resistance })
    return { ...base, demand: worst.settlement, resistance, utilisation, satisfied: utilisation.value <= 1 }
  }
  const resistance = here.input({ symbol: 't_lim', name: 'limit of the tilt', unit: '1' }, value, pointer)
  const utilisation = here.step(utilisationRatio, { t: worst.tilt, t_lim: resistance })
  return { ...base, demand: worst.tilt, resistance, utilisation, satisfied: utilisation.value <= 1 }
}
