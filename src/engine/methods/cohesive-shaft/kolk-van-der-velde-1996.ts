import { cite } from '../../sources/bibliography.ts'
import { formula } from '../../trace/formula.ts'
import type { ShaftMethod } from '../method.ts'
import { adhesion, byAdhesion, noticeInstallation, strengthRatio } from './adhesion.ts'

export const kolkAlpha = formula({
  symbol: 'alpha',
  name: 'adhesion factor',
  unit: '1',
  text: 'min(1, 0.9 * ((D - z) / d)^(-0.2) * psi^(-0.3))',
  where: { D: 'm', z: 'm', d: 'm', psi: '1' },
  source: cite('kolk-van-der-velde-1996', 'local form'),
})

/** Driven piles; alpha grows towards the toe. */
export const kolkVanDerVelde1996: ShaftMethod = {
  id: 'kolk-van-der-velde-1996',
  kind: 'cohesive-shaft',
  title: 'Kolk & van der Velde (1996)',
  installations: ['driven'],
  needs: ['undrainedShearStrength'],
  parameters: {},
  formulas: [strengthRatio, kolkAlpha, adhesion],
  validity: 'Driven piles in clay.',
  source: 'kolk-van-der-velde-1996',
  unitShaftResistance: byAdhesion((at, c_u) => {
    noticeInstallation(at, kolkVanDerVelde1996)
    const psi = at.sheet.step(strengthRatio, { c_u, sigma_v: at.effectiveStress() })
    return at.sheet.step(kolkAlpha, { D: at.toeDepth, z: at.depth, d: at.diameter, psi })
  }),
}
