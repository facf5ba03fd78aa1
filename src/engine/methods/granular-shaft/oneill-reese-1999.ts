import { cite } from '../../sources/bibliography.ts'
import { formula } from '../../trace/formula.ts'
import { noticeInstallation } from '../cohesive-shaft/adhesion.ts'
import type { ShaftMethod } from '../method.ts'

const source = cite('fhwa-if-99-025', 'beta of drilled shafts in sand')
export const oneillReeseBeta = formula({
  symbol: 'beta',
  name: 'shaft factor',
  unit: '1',
  text: 'max(0.25, min(1.2, 1.5 - 0.245 * sqrt(z / (1 m))))',
  where: { z: 'm' },
  source,
})
export const looseBeta = formula({
  symbol: 'beta_N',
  name: 'shaft factor, reduced for N60 below 15',
  unit: '1',
  text: 'beta * min(1, N_60 / 15)',
  where: { beta: '1', N_60: '1' },
  source,
})
export const limitedBoredShaft = formula({
  symbol: 'f',
  name: 'unit shaft resistance',
  unit: 'kPa',
  text: 'min(beta * sigma_v, (200 kPa))',
  where: { beta: '1', sigma_v: 'kPa' },
  source,
})

/** Bored piles in sand: beta from depth, reduced in loose sand. */
export const oneillReeseShaft1999: ShaftMethod = {
  id: 'oneill-reese-1999',
  kind: 'granular-shaft',
  title: "O'Neill & Reese (1999), drilled shafts in sand",
  installations: ['bored', 'continuous-flight-auger'],
  needs: ['sptN60'],
  parameters: {},
  formulas: [oneillReeseBeta, looseBeta, limitedBoredShaft],
  validity: 'Bored piles in sand.',
  source: 'fhwa-if-99-025',
  unitShaftResistance: (at) => {
    noticeInstallation(at, oneillReeseShaft1999)
    const N_60 = at.parameter('sptN60', 'N_60', '1')
    const beta = at.sheet.step(looseBeta, { beta: at.sheet.step(oneillReeseBeta, { z: at.depth }), N_60 })
    return at.sheet.step(limitedBoredShaft, { beta, sigma_v: at.effectiveStress() })
  },
}
