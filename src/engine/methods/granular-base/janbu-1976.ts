import { cite } from '../../sources/bibliography.ts'
import { formula } from '../../trace/formula.ts'
import type { BaseMethod } from '../method.ts'
import { sandBase } from './navfac-1986.ts'

export const janbuNq = formula({
  symbol: 'N_q',
  name: 'bearing factor',
  unit: '1',
  text: '(tan(phi) + sqrt(1 + tan(phi)^2))^2 * exp(2 * psi_p * tan(phi))',
  where: { phi: 'deg', psi_p: 'deg' },
  source: cite('janbu-1976', 'bearing factor'),
})
/** Plastification angles that were published: loose to dense, degrees. */
const PUBLISHED = [75, 105] as const

/** N_q from friction and plastification angle. */
export const janbu1976: BaseMethod = {
  id: 'janbu-1976',
  kind: 'granular-base',
  title: 'Janbu (1976)',
  installations: ['driven', 'bored', 'continuous-flight-auger'],
  needs: ['frictionAngle'],
  parameters: {
    plastificationAngle: {
      symbol: 'psi_p',
      name: 'plastification angle',
      unit: 'deg',
      min: 60,
      max: 120,
      required: false,
    },
  },
  formulas: [janbuNq, sandBase],
  validity: 'Plastification angle 75 (loose) to 105 (dense) degrees.',
  source: 'janbu-1976',
  unitBaseResistance: (at) => {
    const psi_p =
      at.setting('plastificationAngle', 'psi_p', 'deg') ??
      at.sheet.assumed(
        { symbol: 'psi_p', name: 'plastification angle', unit: 'deg' },
        90,
        'no plastificationAngle was given',
        cite('janbu-1976', 'middle of 75 to 105 degrees'),
      )
    if (psi_p.value < PUBLISHED[0] || psi_p.value > PUBLISHED[1])
      at.notice({
        code: 'outside-range',
        level: 'warning',
        pointer: at.pointer,
        text: `janbu-1976 was published for plastification angles from ${PUBLISHED[0]} to ${PUBLISHED[1]} degrees; ${psi_p.value} was given.`,
      })
    const N_q = at.sheet.step(janbuNq, { phi: at.parameter('frictionAngle', 'phi', 'deg'), psi_p })
    return at.sheet.step(sandBase, { sigma_v: at.effectiveStress(), N_q })
  },
}
