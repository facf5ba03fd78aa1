import { cite } from '../../sources/bibliography.ts'
import { formula } from '../../trace/formula.ts'
import { noticeInstallation } from '../cohesive-shaft/adhesion.ts'
import type { BaseMethod } from '../method.ts'
import { rp2geoClass, siltyParameter } from '../rp2geo-classes.ts'

export const limitedSandBase = formula({
  symbol: 'q_b',
  name: 'unit base resistance',
  unit: 'kPa',
  text: 'min(sigma_v * N_q, q_l)',
  where: { sigma_v: 'kPa', N_q: '1', q_l: 'kPa' },
  source: cite('api-rp2geo-2011', 'table 1'),
})

/** Driven pipe piles in sand, by density class. */
export const rp2geoBase2011: BaseMethod = {
  id: 'rp2geo-2011',
  kind: 'granular-base',
  title: 'API RP 2GEO (2011), N_q by density class',
  installations: ['driven'],
  needs: ['relativeDensity'],
  parameters: siltyParameter,
  formulas: [limitedSandBase],
  validity: 'Driven pipe piles in medium dense to very dense sand.',
  source: 'api-rp2geo-2011',
  unitBaseResistance: (at) => {
    noticeInstallation(at, rp2geoBase2011)
    const { read } = rp2geoClass(at)
    return at.sheet.step(limitedSandBase, {
      sigma_v: at.effectiveStress(),
      N_q: read('bearing', 'N_q', 'bearing factor', '1'),
      q_l: read('baseLimit', 'q_l', 'limit of the unit base resistance', 'kPa'),
    })
  },
}
