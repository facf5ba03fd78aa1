import { cite } from '../../sources/bibliography.ts'
import { formula } from '../../trace/formula.ts'
import type { ShaftMethod } from '../method.ts'
import { adhesion, byAdhesion, noticeInstallation, strengthRatio } from './adhesion.ts'

export const rp2geoAlpha = formula({
  symbol: 'alpha',
  name: 'adhesion factor',
  unit: '1',
  text: 'psi <= 1 ? min(1, 0.5 * psi^(-0.5)) : min(1, 0.5 * psi^(-0.25))',
  where: { psi: '1' },
  source: cite('api-rp2geo-2011', '8.1.3'),
  range: [{ symbol: 'psi', min: 0, max: 3 }],
})

/** Driven piles in clay, alpha from c_u / sigma_v. */
export const rp2geo2011: ShaftMethod = {
  id: 'rp2geo-2011',
  kind: 'cohesive-shaft',
  title: 'API RP 2GEO (2011), alpha from the strength ratio',
  installations: ['driven'],
  needs: ['undrainedShearStrength'],
  parameters: {},
  formulas: [strengthRatio, rp2geoAlpha, adhesion],
  validity: 'Driven piles; caution for a strength ratio above 3.',
  source: 'api-rp2geo-2011',
  unitShaftResistance: byAdhesion((at, c_u) => {
    noticeInstallation(at, rp2geo2011)
    const psi = at.sheet.step(strengthRatio, { c_u, sigma_v: at.effectiveStress() })
    if (psi.value > 3)
      at.notice({
        code: 'outside-range',
        level: 'warning',
        pointer: at.pointer,
        text: `rp2geo-2011 asks for caution above a strength ratio of 3; ${at.layer.name} reaches more.`,
      })
    return at.sheet.step(rp2geoAlpha, { psi })
  }),
}
