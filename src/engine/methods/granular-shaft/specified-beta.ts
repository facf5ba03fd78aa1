import { refuse } from '../../faults.ts'
import { betaShaft } from '../cohesive-shaft/burland-1973.ts'
import type { ShaftMethod } from '../method.ts'

/** Beta from the project's own load tests. */
export const specifiedBeta: ShaftMethod = {
  id: 'specified-beta',
  kind: 'granular-shaft',
  title: 'Beta given by the project',
  installations: ['driven', 'bored', 'continuous-flight-auger'],
  needs: [],
  parameters: { beta: { symbol: 'beta', name: 'shaft factor', unit: '1', min: 0, max: 5, required: true } },
  formulas: [betaShaft],
  validity: 'As far as the load tests behind it reach.',
  source: 'practice',
  unitShaftResistance: (at) => {
    const beta =
      at.setting('beta', 'beta', '1') ??
      refuse('missing-parameter', '/methods/granularShaft', {
        parameter: 'beta',
        method: 'specified-beta',
        layer: at.layer.name,
      })
    return at.sheet.step(betaShaft, { beta, sigma_v: at.effectiveStress() })
  },
}
