import { cite } from '../../sources/bibliography.ts'
import { formula } from '../../trace/formula.ts'
import type { ShaftMethod } from '../method.ts'
import { noticeInstallation, strengthOf } from './adhesion.ts'

export const skemptonShaft = formula({
  symbol: 'f',
  name: 'unit shaft resistance',
  unit: 'kPa',
  text: 'min(0.45 * c_u, (100 kPa))',
  where: { c_u: 'kPa' },
  source: cite('skempton-1959', 'bored piles in London clay'),
})

/** Bored piles in stiff fissured clay. */
export const skempton1959: ShaftMethod = {
  id: 'skempton-1959',
  kind: 'cohesive-shaft',
  title: 'Skempton (1959), bored piles in stiff fissured clay',
  installations: ['bored', 'continuous-flight-auger'],
  needs: ['undrainedShearStrength'],
  parameters: {},
  formulas: [skemptonShaft],
  validity: 'Bored piles in stiff fissured clay.',
  source: 'skempton-1959',
  unitShaftResistance: (at) => {
    noticeInstallation(at, skempton1959)
    return at.sheet.step(skemptonShaft, { c_u: strengthOf(at) })
  },
}
