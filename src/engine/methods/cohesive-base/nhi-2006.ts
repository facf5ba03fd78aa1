import type { BaseMethod } from '../method.ts'
import { byBearingFactor, clayBase, nhiNc } from './bearing.ts'

/** FHWA NHI-05-042, block of a group: N_c from depth and shape. */
export const nhi2006: BaseMethod = {
  id: 'nhi-2006',
  kind: 'cohesive-base',
  title: 'FHWA NHI-05-042, block of a group',
  installations: ['driven', 'bored', 'continuous-flight-auger'],
  needs: ['undrainedShearStrength'],
  parameters: {},
  formulas: [nhiNc, clayBase],
  validity: 'Blocks of pile groups in clay.',
  source: 'fhwa-nhi-05-042',
  unitBaseResistance: byBearingFactor((at) => at.sheet.step(nhiNc, { D: at.depth, B: at.breadth, L_g: at.length })),
}
