import { cite } from '../../sources/bibliography.ts'
import { formula } from '../../trace/formula.ts'
import type { ShaftMethod } from '../method.ts'
import { adhesion, byAdhesion, noticeInstallation } from './adhesion.ts'

export const rp2aAlpha = formula({
  symbol: 'alpha',
  name: 'adhesion factor',
  unit: '1',
  text: 'max(0.5, min(1, 1 - 0.5 * (c_u - (24 kPa)) / (48 kPa)))',
  where: { c_u: 'kPa' },
  source: cite('api-rp2a-1984', 'alpha for 24 and 72 kPa'),
})

/** Alpha falls from 1 at 24 kPa to 0.5 at 72 kPa. */
export const rp2a1984: ShaftMethod = {
  id: 'rp2a-1984',
  kind: 'cohesive-shaft',
  title: 'API RP 2A (1980s), alpha from the strength',
  installations: ['driven'],
  needs: ['undrainedShearStrength'],
  parameters: {},
  formulas: [rp2aAlpha, adhesion],
  validity: 'Driven piles in clay.',
  source: 'api-rp2a-1984',
  unitShaftResistance: byAdhesion((at, c_u) => {
    noticeInstallation(at, rp2a1984)
    return at.sheet.step(rp2aAlpha, { c_u })
  }),
}
