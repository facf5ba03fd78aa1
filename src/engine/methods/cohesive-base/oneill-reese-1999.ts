import { cite } from '../../sources/bibliography.ts'
import { formula } from '../../trace/formula.ts'
import { noticeInstallation } from '../cohesive-shaft/adhesion.ts'
import type { BaseMethod } from '../method.ts'

export const oneillReeseNc = formula({
  symbol: 'N_c',
  name: 'bearing factor',
  unit: '1',
  text: 'min(9, 6 * (1 + 0.2 * D / d)) * (c_u < (24 kPa) ? 0.67 : 1)',
  where: { D: 'm', d: 'm', c_u: 'kPa' },
  source: cite('fhwa-if-99-025', 'base of drilled shafts in clay'),
})
export const limitedClayBase = formula({
  symbol: 'q_b',
  name: 'unit base resistance (net)',
  unit: 'kPa',
  text: 'min(N_c * c_u, (4000 kPa))',
  where: { N_c: '1', c_u: 'kPa' },
  source: cite('fhwa-if-99-025', 'limit of the base resistance'),
})
/** Base diameter above which base movement governs, m. */
const LARGE_BASE = 1.9

/** Bored piles in clay. */
export const oneillReeseBase1999: BaseMethod = {
  id: 'oneill-reese-1999',
  kind: 'cohesive-base',
  title: "O'Neill & Reese (1999), base of drilled shafts in clay",
  installations: ['bored', 'continuous-flight-auger'],
  needs: ['undrainedShearStrength'],
  parameters: {},
  formulas: [oneillReeseNc, limitedClayBase],
  validity: 'Bored piles in clay; above 1.9 m diameter base movement governs.',
  source: 'fhwa-if-99-025',
  unitBaseResistance: (at) => {
    noticeInstallation(at, oneillReeseBase1999)
    const c_u = at.parameter('undrainedShearStrength', 'c_u', 'kPa')
    if (at.breadth.value > LARGE_BASE)
      at.notice({
        code: 'base-movement-governs',
        level: 'warning',
        text: `The base is ${at.breadth.value.toFixed(2)} m wide: above ${LARGE_BASE} m the movement of the base governs.`,
      })
    return at.sheet.step(limitedClayBase, {
      N_c: at.sheet.step(oneillReeseNc, { D: at.depth, d: at.breadth, c_u }),
      c_u,
    })
  },
}
