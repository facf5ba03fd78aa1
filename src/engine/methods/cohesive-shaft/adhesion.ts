import { practice } from '../../sources/bibliography.ts'
import { formula } from '../../trace/formula.ts'
import type { Term } from '../../trace/term.ts'
import type { ShaftContext, ShaftMethod } from '../method.ts'

export const strengthRatio = formula({
  symbol: 'psi',
  name: 'strength ratio',
  unit: '1',
  text: 'c_u / sigma_v',
  where: { c_u: 'kPa', sigma_v: 'kPa' },
  source: practice('definition'),
})
export const adhesion = formula({
  symbol: 'f',
  name: 'unit shaft resistance',
  unit: 'kPa',
  text: 'alpha * c_u',
  where: { alpha: '1', c_u: 'kPa' },
  source: practice('total stress (alpha) method'),
})

export const strengthOf = (at: ShaftContext): Term<'kPa'> => at.parameter('undrainedShearStrength', 'c_u', 'kPa')

/** f = alpha c_u, with alpha from the strength and the place. */
export const byAdhesion =
  (alpha: (at: ShaftContext, c_u: Term<'kPa'>) => Term<'1'>): ShaftMethod['unitShaftResistance'] =>
  (at) => {
    const c_u = strengthOf(at)
    return at.sheet.step(adhesion, { alpha: alpha(at, c_u), c_u })
  }

/** One notice when a pile is installed otherwise than the method's piles were. */
export function noticeInstallation(
  at: Pick<ShaftContext, 'installation' | 'notice'>,
  method: Pick<ShaftMethod, 'id' | 'installations'>,
): void {
  if (method.installations.includes(at.installation)) return
  at.notice({
    code: 'outside-range',
    level: 'warning',
    text: `${method.id} was published for ${method.installations.join(' and ')} piles; this one is ${at.installation}.`,
  })
}
