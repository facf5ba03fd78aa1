import { refuse } from '../../faults.ts'
import type { ShaftMethod } from '../method.ts'
import { adhesion, byAdhesion } from './adhesion.ts'

/** Alpha from the project's own load tests. */
export const specifiedAlpha: ShaftMethod = {
  id: 'specified-alpha',
  kind: 'cohesive-shaft',
  title: 'Alpha given by the project',
  installations: ['driven', 'bored', 'continuous-flight-auger'],
  needs: ['undrainedShearStrength'],
  parameters: { alpha: { symbol: 'alpha', name: 'adhesion factor', unit: '1', min: 0, max: 2, required: true } },
  formulas: [adhesion],
  validity: 'As far as the load tests behind it reach.',
  source: 'practice',
  unitShaftResistance: byAdhesion(
    (at) =>
      at.setting('alpha', 'alpha', '1') ??
      refuse('missing-parameter', '/methods/cohesiveShaft', {
        parameter: 'alpha',
        method: 'specified-alpha',
        layer: at.layer.name,
      }),
  ),
}
