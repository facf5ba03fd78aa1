import type { BaseMethod } from '../method.ts'
import { byBearingFactor, clayBase, skemptonNc } from './bearing.ts'

/** Skempton (1951): N_c from depth and shape. */
export const skempton1951: BaseMethod = {
  id: 'skempton-1951',
  kind: 'cohesive-base',
  title: 'Skempton (1951)',
  installations: ['driven', 'bored', 'continuous-flight-auger'],
  needs: ['undrainedShearStrength'],
  parameters: {},
  formulas: [skemptonNc, clayBase],
  validity: 'Saturated clay, undrained.',
  source: 'skempton-1951',
  unitBaseResistance: byBearingFactor((at) =>
    at.sheet.step(skemptonNc, { D: at.depth, B: at.breadth, L_g: at.length }),
  ),
}
