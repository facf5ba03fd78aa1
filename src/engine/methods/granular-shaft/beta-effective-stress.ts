import { isSteel } from '../../piles/section.ts'
import { practice } from '../../sources/bibliography.ts'
import { formula } from '../../trace/formula.ts'
import type { ShaftContext, ShaftMethod } from '../method.ts'
import { frictionShaft, interfaceAngle } from './friction.ts'

export const limitedShaft = formula({
  symbol: 'f',
  name: 'unit shaft resistance',
  unit: 'kPa',
  text: 'min(f_0, f_l)',
  where: { f_0: 'kPa', f_l: 'kPa' },
  source: practice('limit of the project'),
})
const pressure = { driven: 1.0, bored: 0.7, 'continuous-flight-auger': 0.8 } as const

const ratioFor = (at: ShaftContext): [number, string] =>
  at.installation !== 'driven'
    ? [1, 'cast in place']
    : isSteel(at.section)
      ? [0.7, 'driven steel']
      : [0.8, 'driven precast']

/** f = K tan(delta) sigma_v. */
export const betaEffectiveStress: ShaftMethod = {
  id: 'beta-effective-stress',
  kind: 'granular-shaft',
  title: 'Effective stress: K tan(delta)',
  installations: ['driven', 'bored', 'continuous-flight-auger'],
  needs: ['frictionAngle'],
  parameters: {
    earthPressure: { symbol: 'K', name: 'earth pressure coefficient', unit: '1', min: 0, max: 5, required: false },
    interfaceRatio: {
      symbol: 'r_d',
      name: 'interface angle over friction angle',
      unit: '1',
      min: 0,
      max: 1,
      required: false,
    },
    limit: {
      symbol: 'f_l',
      name: 'limit of the unit shaft resistance',
      unit: 'kPa',
      min: 0,
      max: 1000,
      required: false,
    },
  },
  formulas: [interfaceAngle, frictionShaft, limitedShaft],
  validity: 'Sand and gravel.',
  source: 'practice',
  unitShaftResistance: (at) => {
    const { sheet } = at
    const phi = at.parameter('frictionAngle', 'phi', 'deg')
    const K =
      at.setting('earthPressure', 'K', '1') ??
      sheet.assumed(
        { symbol: 'K', name: 'earth pressure coefficient', unit: '1' },
        pressure[at.installation],
        `no earthPressure was given: ${at.installation}`,
        practice('K by installation'),
      )
    const [ratio, kind] = ratioFor(at)
    const r_d =
      at.setting('interfaceRatio', 'r_d', '1') ??
      sheet.assumed(
        { symbol: 'r_d', name: 'interface angle over friction angle', unit: '1' },
        ratio,
        `no interfaceRatio was given: ${kind}`,
        practice('interface angle by installation'),
      )
    const terms = { K, delta: sheet.step(interfaceAngle, { r_d, phi }), sigma_v: at.effectiveStress() }
    const f_l = at.setting('limit', 'f_l', 'kPa')
    if (!f_l) return sheet.step(frictionShaft, terms)
    return sheet.step(limitedShaft, { f_0: sheet.step(frictionShaft, terms, 'f_0'), f_l })
  },
}
