import { practice } from '../../sources/bibliography.ts'
import { formula } from '../../trace/formula.ts'

export const frictionShaft = formula({
  symbol: 'f',
  name: 'unit shaft resistance',
  unit: 'kPa',
  text: 'K * tan(delta) * sigma_v',
  where: { K: '1', delta: 'deg', sigma_v: 'kPa' },
  source: practice('earth pressure and interface friction'),
})
export const limitedBetaShaft = formula({
  symbol: 'f',
  name: 'unit shaft resistance',
  unit: 'kPa',
  text: 'min(beta * sigma_v, f_l)',
  where: { beta: '1', sigma_v: 'kPa', f_l: 'kPa' },
  source: practice('effective stress (beta) method with a limit'),
})
export const interfaceAngle = formula({
  symbol: 'delta',
  name: 'interface friction angle',
  unit: 'deg',
  text: 'r_d * phi',
  where: { r_d: '1', phi: 'deg' },
  source: practice('share of the friction angle'),
})
