import { isSteel } from '../../piles/section.ts'
import { cite } from '../../sources/bibliography.ts'
import { formula } from '../../trace/formula.ts'
import type { Sheet } from '../../trace/sheet.ts'
import type { Term } from '../../trace/term.ts'
import type { ShaftContext, ShaftMethod } from '../method.ts'
import { frictionShaft, interfaceAngle } from './friction.ts'

export const heldDepth = formula({
  symbol: 'z_c',
  name: 'depth that the stress is taken at',
  unit: 'm',
  text: 'min(z, 20 * d)',
  where: { z: 'm', d: 'm' },
  source: cite('navfac-dm-7-02', 'stress held below 20 diameters'),
})

/** Stress at the depth, or at 20 widths where that is shallower. */
export function heldStress(
  at: { sheet: Sheet; depth: Term<'m'>; effectiveStressAt: (z: Term<'m'>, id: string) => Term<'kPa'> },
  d: Term<'m'>,
): Term<'kPa'> {
  return at.effectiveStressAt(at.sheet.step(heldDepth, { z: at.depth, d }), 'sigma_v')
}

/** Earth pressure coefficients in compression and tension: middle of the printed ranges. */
const K = { displacement: [1.0, 0.8], h: [0.75, 0.4], bored: [0.7, 0.4] } as const

function coefficient(at: ShaftContext): Term<'1'> {
  const row = at.installation !== 'driven' ? 'bored' : at.section.shape === 'h' ? 'h' : 'displacement'
  const value = K[row][at.direction === 'compression' ? 0 : 1]
  return at.sheet.assumed(
    { symbol: 'K', name: `earth pressure coefficient in ${at.direction}`, unit: '1' },
    value,
    `${row} pile`,
    cite('navfac-dm-7-02', 'p. 7.2-194, earth pressure coefficients'),
  )
}

export const navfac1986: ShaftMethod = {
  id: 'navfac-1986',
  kind: 'granular-shaft',
  title: 'NAVFAC DM 7.02',
  installations: ['driven', 'bored', 'continuous-flight-auger'],
  needs: ['frictionAngle'],
  parameters: {},
  formulas: [heldDepth, interfaceAngle, frictionShaft],
  validity: 'Sand; stress held constant below 20 diameters.',
  source: 'navfac-dm-7-02',
  unitShaftResistance: (at) => {
    const { sheet } = at
    const source = cite('navfac-dm-7-02', 'p. 7.2-194, friction angles')
    const delta = isSteel(at.section)
      ? sheet.assumed({ symbol: 'delta', name: 'interface friction angle', unit: 'deg' }, 20, 'steel pile', source)
      : sheet.step(interfaceAngle, {
          r_d: sheet.assumed(
            { symbol: 'r_d', name: 'interface angle over friction angle', unit: '1' },
            0.75,
            'concrete pile',
            source,
          ),
          phi: at.parameter('frictionAngle', 'phi', 'deg'),
        })
    return sheet.step(frictionShaft, { K: coefficient(at), delta, sigma_v: heldStress(at, at.diameter) })
  },
}
