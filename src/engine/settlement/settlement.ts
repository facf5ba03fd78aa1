import { refuse } from '../faults.ts'
import type { Notice } from '../notice.ts'
import { smallestSpacing } from '../piles/enclosing-prism.ts'
import type { Point } from '../piles/layout.ts'
import type { CapTerms } from '../piles/pile-plan.ts'
import type { SettlementRequest } from '../requests.ts'
import { practice, statics } from '../sources/bibliography.ts'
import { formula } from '../trace/formula.ts'
import type { Sheet } from '../trace/sheet.ts'
import type { Term } from '../trace/term.ts'
import { alongPile } from './along-pile.ts'
import { assertSpacing } from './assert-spacing.ts'
import { groupSettlement } from './group-settlement.ts'
import { pilePlaces } from './pile-places.ts'
import type { PileResponse, SettlementPlaces } from './pile-response.ts'
import { pileResponse } from './settlement-method.ts'
import { curveTerms, pileCurveWay, softening, type UltimateTerms } from './softening.ts'

export const loadPerPile = formula({
  symbol: 'P',
  name: 'load per pile',
  unit: 'kN',
  text: 'V / n',
  where: { V: 'kN', n: '1' },
  source: statics('equal share'),
})
export const headSettlement = formula({
  symbol: 's',
  name: 'settlement of the pile head',
  unit: 'mm',
  text: 'P / k',
  where: { P: 'kN', k: 'kN/m' },
  source: statics('stiffness of the head'),
})
export const influenceFactorOf = formula({
  symbol: 'I',
  name: 'influence factor',
  unit: '1',
  text: 'E_s * d / k',
  where: { E_s: 'kPa', d: 'm', k: 'kN/m' },
  source: practice('s = P I / (E_s d)'),
})

/** Settlement of one pile, and of the group where there is a layout. */
export function settlement(
  sheet: Sheet,
  request: SettlementRequest,
  at: SettlementPlaces,
  notice: (n: Notice) => void,
  resistance: UltimateTerms | undefined,
) {
  assertUsed(request)
  const pile = pileResponse(sheet, request.method, request.pile, request.ground, at, notice)
  const load = loadTerms(sheet, request, at.load)
  const places = request.layout && pilePlaces(sheet.within('group'), request.layout, at.layout)
  const label = { symbol: 'n', name: 'number of piles', unit: '1' } as const
  const n = places
    ? sheet.input(label, places.length, at.layout)
    : sheet.assumed(label, 1, 'no layout was given: one pile', practice('single pile'))
  const P = sheet.step(loadPerPile, { V: load.V, n })
  const soft = resistance && softening(sheet, request, pile, resistance)
  const s = soft ? soft.settle(P, `${at.load}/V`) : sheet.step(headSettlement, { P, k: pile.stiffness })
  // Shares of the load along the pile are those of the elastic solution; a softening pile sheds load downwards as it slips.
  const axial = soft ? undefined : alongPile(sheet.within('axial'), pile, P)
  const single = {
    load: P,
    settlement: s,
    stiffness: pile.stiffness,
    baseLoadShare: pile.baseLoadShare,
    influenceFactor: sheet.step(influenceFactorOf, { E_s: pile.toeModulus, d: pile.width, k: pile.stiffness }),
    ...(axial && { axial }),
    ...(soft && { curve: curveTerms(sheet.within('curve'), soft.curve, pileCurveWay(soft.operands)) }),
  }
  if (!request.layout || !places) return { single }
  const points = places.map((p) => ({ x: p.x.value, y: p.y.value }))
  const spacing = smallestSpacing(points, pile.width.value, at.layout)
  assertSpacing(pile, spacing, at.layout)
  return {
    single,
    group: groupSettlement(sheet.within('group'), {
      pile,
      single: s,
      layout: request.layout,
      cap: request.cap ?? 'rigid',
      places,
      n,
      load,
      coupled: coupledPiles(request, pile, points),
      soft,
      pointer: at.load,
    }),
  }
}

/** What only softening reads is refused where nothing softens: it would vanish. */
function assertUsed(request: SettlementRequest): void {
  if (request.nonlinearity) return
  for (const name of ['failureRatio', 'methods'] as const)
    if (request[name])
      refuse('method-not-applicable', `/${name}`, {
        method: 'elastic-continuum',
        reason: `${name} is read with nonlinearity "hyperbolic" only: add it, or leave ${name} out`,
      })
}

/** So many piles may be coupled element by element. */
const COUPLED = 64

function coupledPiles(
  { coupling, nonlinearity }: SettlementRequest,
  { elements }: PileResponse,
  points: readonly Point[],
) {
  if (coupling !== 'full') return undefined
  if (nonlinearity)
    refuse('method-not-applicable', '/coupling', {
      method: 'elastic-continuum',
      reason: 'coupling "full" is elastic throughout: leave out nonlinearity or coupling',
    })
  const method = 'elastic-continuum'
  if (!elements)
    refuse('method-not-applicable', '/coupling', {
      method,
      reason: 'coupling "full" is of the method elastic-continuum',
    })
  if (points.length > COUPLED)
    refuse('method-not-applicable', '/coupling', {
      method,
      reason: `coupling "full" takes up to ${COUPLED} piles, ${points.length} are laid out; leave it out to superpose interaction factors`,
    })
  return elements.coupled(points)
}

function loadTerms(sheet: Sheet, { load }: SettlementRequest, pointer: string): CapTerms {
  const moment = (symbol: 'Mx' | 'My', presses: string): Term<'kN.m'> => {
    const label = { symbol, name: `moment that presses piles at ${presses}`, unit: 'kN.m' } as const
    const value = load[symbol]
    return value === undefined
      ? sheet.assumed(label, 0, `no ${symbol} was given`, practice('no moment'))
      : sheet.input(label, value, `${pointer}/${symbol}`)
  }
  return {
    V: sheet.input({ symbol: 'V', name: 'vertical load on the cap', unit: 'kN' }, load.V, `${pointer}/V`),
    Mx: moment('Mx', '+y'),
    My: moment('My', '+x'),
  }
}
