import { practice } from '../../sources/bibliography.ts'
import { formula } from '../../trace/formula.ts'
import type { Sheet } from '../../trace/sheet.ts'
import type { Term } from '../../trace/term.ts'
import type { SettlementTerms } from '../settle-cap.ts'

export const utilisationSettlement = formula({
  symbol: 'u',
  name: 'utilisation',
  unit: '1',
  text: 'abs(s) / s_lim',
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

export type LimitTerms = {
  readonly combination: string
  readonly demand: Term
  readonly resistance: Term
  readonly utilisation: Term<'1'>
}

const largest = (all: readonly SettlementTerms[], of: 'settlement' | 'tilt') =>
  all.reduce((a, b) => (Math.abs(b[of].value) > Math.abs(a[of].value) ? b : a))

/** The largest settlement (or heave) of a cap against the limit. */
export function settlementCheck(sheet: Sheet, all: readonly SettlementTerms[], limit: number): LimitTerms {
  const { combination, settlement } = largest(all, 'settlement')
  const resistance = sheet.input(
    { symbol: 's_lim', name: 'limit of the settlement', unit: 'mm' },
    limit,
    '/limits/settlement',
  )
  return {
    combination,
    demand: settlement,
    resistance,
    utilisation: sheet.step(utilisationSettlement, { s: settlement, s_lim: resistance }),
  }
}

/** The largest tilt of a cap against the limit. */
export function tiltCheck(sheet: Sheet, all: readonly SettlementTerms[], limit: number): LimitTerms {
  const { combination, tilt } = largest(all, 'tilt')
  const resistance = sheet.input({ symbol: 't_lim', name: 'limit of the tilt', unit: '1' }, limit, '/limits/tilt')
  return {
    combination,
    demand: tilt,
    resistance,
    utilisation: sheet.step(utilisationRatio, { t: tilt, t_lim: resistance }),
  }
}
