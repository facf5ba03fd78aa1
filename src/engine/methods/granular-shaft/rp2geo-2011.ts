import { noticeInstallation } from '../cohesive-shaft/adhesion.ts'
import type { ShaftMethod } from '../method.ts'
import { rp2geoClass, siltyParameter } from '../rp2geo-classes.ts'
import { limitedBetaShaft } from './friction.ts'

/** Driven pipe piles in sand, by density class. */
export const rp2geoShaft2011: ShaftMethod = {
  id: 'rp2geo-2011',
  kind: 'granular-shaft',
  title: 'API RP 2GEO (2011), beta by density class',
  installations: ['driven'],
  needs: ['relativeDensity'],
  parameters: siltyParameter,
  formulas: [limitedBetaShaft],
  validity: 'Driven pipe piles in medium dense to very dense sand.',
  source: 'api-rp2geo-2011',
  unitShaftResistance: (at) => {
    noticeInstallation(at, rp2geoShaft2011)
    const { read } = rp2geoClass(at)
    return at.sheet.step(limitedBetaShaft, {
      beta: read('beta', 'beta', 'shaft factor', '1'),
      sigma_v: at.effectiveStress(),
      f_l: read('shaftLimit', 'f_l', 'limit of the unit shaft resistance', 'kPa'),
    })
  },
}
