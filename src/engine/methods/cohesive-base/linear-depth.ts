import type { BaseMethod } from '../method.ts'
import { byBearingFactor, clayBase, linearNc } from './bearing.ts'

/** Linear with depth to 9: N_c from depth and shape. */
export const linearDepth: BaseMethod = {
  id: 'linear-depth',
  kind: 'cohesive-base',
  title: 'Linear with depth to 9',
  installations: ['driven', 'bored', 'continuous-flight-auger'],
  needs: ['undrainedShearStrength'],
  parameters: {},
  formulas: [linearNc, clayBase],
  validity: 'Saturated clay, undrained.',
  source: 'practice',
  unitBaseResistance: byBearingFactor((at) => at.sheet.step(linearNc, { D: at.depth, B: at.breadth })),
}
