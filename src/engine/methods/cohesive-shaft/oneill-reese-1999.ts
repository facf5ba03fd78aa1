import { refuse } from '../../faults.ts'
import { cite } from '../../sources/bibliography.ts'
import { formula } from '../../trace/formula.ts'
import type { ShaftMethod } from '../method.ts'
import { adhesion, byAdhesion, noticeInstallation } from './adhesion.ts'

export const oneillReeseAlpha = formula({
  symbol: 'alpha',
  name: 'adhesion factor',
  unit: '1',
  text: '0.55 - 0.1 * max(0, c_u / (100 kPa) - 1.5)',
  where: { c_u: 'kPa' },
  source: cite('fhwa-if-99-025', 'drilled shafts in cohesive soil'),
  range: [{ symbol: 'c_u', max: 250 }],
})
/** c_u above which the ground is designed as rock, kPa: 2.5 atmospheres. */
const ROCK_LIKE = 250

/** Bored piles; soil above 1.5 m carries nothing. */
export const oneillReese1999: ShaftMethod = {
  id: 'oneill-reese-1999',
  kind: 'cohesive-shaft',
  title: "O'Neill & Reese (1999), drilled shafts in clay",
  installations: ['bored', 'continuous-flight-auger'],
  needs: ['undrainedShearStrength'],
  parameters: {},
  formulas: [oneillReeseAlpha, adhesion],
  validity: 'Bored piles, c_u up to 250 kPa.',
  source: 'fhwa-if-99-025',
  idleDepth: 1.5,
  unitShaftResistance: byAdhesion((at, c_u) => {
    noticeInstallation(at, oneillReese1999)
    if (c_u.value > ROCK_LIKE)
      refuse('method-not-applicable', `${at.pointer}/undrainedShearStrength`, {
        method: 'oneill-reese-1999',
        layer: at.layer.name,
        got: c_u.value,
        limit: ROCK_LIKE,
        unit: 'kPa',
        reason: `Layer "${at.layer.name}" has c_u = ${c_u.value} kPa, and oneill-reese-1999 holds up to ${ROCK_LIKE} kPa: stronger ground is designed as rock`,
      })
    return at.sheet.step(oneillReeseAlpha, { c_u })
  }),
}
