import { cite } from '../../sources/bibliography.ts'
import { formula } from '../../trace/formula.ts'
import type { ShaftMethod } from '../method.ts'
import { adhesion, byAdhesion, noticeInstallation, strengthRatio } from './adhesion.ts'

export const randolphMurphyAlpha = formula({
  symbol: 'alpha',
  name: 'adhesion factor',
  unit: '1',
  text: 'psi <= 1 ? min(1, n^0.5 * psi^(-0.5)) : min(1, n^0.5 * psi^(-0.25))',
  where: { psi: '1', n: '1' },
  source: cite('randolph-murphy-1985', 'equations for alpha'),
})

/** Driven piles; scaled by the normally consolidated strength ratio. */
export const randolphMurphy1985: ShaftMethod = {
  id: 'randolph-murphy-1985',
  kind: 'cohesive-shaft',
  title: 'Randolph & Murphy (1985)',
  installations: ['driven'],
  needs: ['undrainedShearStrength'],
  parameters: {
    normallyConsolidatedRatio: {
      symbol: 'n',
      name: 'normally consolidated strength ratio',
      unit: '1',
      min: 0.05,
      max: 1,
      required: false,
    },
  },
  formulas: [strengthRatio, randolphMurphyAlpha, adhesion],
  validity: 'Driven piles in clay.',
  source: 'randolph-murphy-1985',
  unitShaftResistance: byAdhesion((at, c_u) => {
    noticeInstallation(at, randolphMurphy1985)
    const psi = at.sheet.step(strengthRatio, { c_u, sigma_v: at.effectiveStress() })
    const n =
      at.setting('normallyConsolidatedRatio', 'n', '1') ??
      at.sheet.assumed(
        { symbol: 'n', name: 'normally consolidated strength ratio', unit: '1' },
        0.25,
        'no normallyConsolidatedRatio was given',
        cite('randolph-murphy-1985', 'typical value'),
      )
    return at.sheet.step(randolphMurphyAlpha, { psi, n })
  }),
}
