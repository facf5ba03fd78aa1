import type { Notice } from '../notice.ts'
import { smallestSpacing } from '../piles/enclosing-prism.ts'
import type { SettlementRequest } from '../requests.ts'
import { cite, practice, statics } from '../sources/bibliography.ts'
import { formula } from '../trace/formula.ts'
import type { Sheet } from '../trace/sheet.ts'
import type { Term } from '../trace/term.ts'
import { groupSettlement } from './group-settlement.ts'
import { pilePlaces } from './pile-places.ts'
import type { CapLoadTerms } from './prepared-group.ts'
import { randolphWroth, type SettlementPlaces } from './randolph-wroth-1978.ts'

export { interactionOf } from './interaction.ts'

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
  source: cite('randolph-wroth-1978', 'load settlement ratio'),
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
) {
  const pile = randolphWroth(sheet, request.pile, request.ground, at, notice)
  notice({
    code: 'approximation',
    level: 'info',
    text: 'randolph-wroth-1978 is a closed form: about 7 to 10 % low in settlement for short piles, up to 18 % high for long compressible ones.',
  })
  const load = loadTerms(sheet, request, at.load)
  const places = request.layout && pilePlaces(sheet.within('group'), request.layout, at.layout)
  const label = { symbol: 'n', name: 'number of piles', unit: '1' } as const
  const n = places
    ? sheet.input(label, places.length, at.layout)
    : sheet.assumed(label, 1, 'no layout was given: one pile', practice('single pile'))
  const P = sheet.step(loadPerPile, { V: load.V, n })
  const s = sheet.step(headSettlement, { P, k: pile.stiffness })
  const single = {
    load: P,
    settlement: s,
    stiffness: pile.stiffness,
    baseLoadShare: pile.baseLoadShare,
    influenceFactor: sheet.step(influenceFactorOf, { E_s: pile.toeModulus, d: pile.width, k: pile.stiffness }),
  }
  if (!request.layout || !places) return { single }
  const points = places.map((p) => ({ x: p.x.value, y: p.y.value }))
  smallestSpacing(points, pile.width.value, at.layout)
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
      pointer: at.load,
    }),
  }
}

function loadTerms(sheet: Sheet, { load }: SettlementRequest, pointer: string): CapLoadTerms {
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
