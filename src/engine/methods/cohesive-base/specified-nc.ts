import { refuse } from '../../faults.ts'
import type { BaseMethod } from '../method.ts'
import { byBearingFactor, clayBase } from './bearing.ts'

/** N_c given by the project. */
export const specifiedNc: BaseMethod = {
  id: 'specified-nc',
  kind: 'cohesive-base',
  title: 'Bearing factor given by the project',
  installations: ['driven', 'bored', 'continuous-flight-auger'],
  needs: ['undrainedShearStrength'],
  parameters: { bearingFactor: { symbol: 'N_c', name: 'bearing factor', unit: '1', min: 0, max: 30, required: true } },
  formulas: [clayBase],
  validity: 'As far as the evidence behind it reaches.',
  source: 'practice',
  unitBaseResistance: byBearingFactor(
    (at) =>
      at.setting('bearingFactor', 'N_c', '1') ??
      refuse('missing-parameter', '/methods/cohesiveBase', {
        parameter: 'bearingFactor',
        method: 'specified-nc',
        layer: at.layer.name,
      }),
  ),
}
