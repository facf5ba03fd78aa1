import { cite } from '../../sources/bibliography.ts'
import { formula } from '../../trace/formula.ts'
import type { ShaftMethod } from '../method.ts'
import { adhesion, byAdhesion, noticeInstallation } from './adhesion.ts'

export const gec10Alpha = formula({
  symbol: 'alpha',
  name: 'adhesion factor',
  unit: '1',
  text: 'min(1, 0.30 + 0.17 / (c_u / (100 kPa)))',
  where: { c_u: 'kPa' },
  source: cite('fhwa-nhi-18-024', 'alpha of drilled shafts'),
})

/** Bored piles; soil above 1.5 m carries nothing. */
export const gec102018: ShaftMethod = {
  id: 'gec10-2018',
  kind: 'cohesive-shaft',
  title: 'GEC 10 (2018), drilled shafts in clay',
  installations: ['bored', 'continuous-flight-auger'],
  needs: ['undrainedShearStrength'],
  parameters: {},
  formulas: [gec10Alpha, adhesion],
  validity: 'Bored piles in clay.',
  source: 'fhwa-nhi-18-024',
  idleDepth: 1.5,
  unitShaftResistance: byAdhesion((at, c_u) => {
    noticeInstallation(at, gec102018)
    return at.sheet.step(gec10Alpha, { c_u })
  }),
}
