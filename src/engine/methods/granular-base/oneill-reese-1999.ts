import { cite } from '../../sources/bibliography.ts'
import { formula } from '../../trace/formula.ts'
import { noticeInstallation } from '../cohesive-shaft/adhesion.ts'
import type { BaseMethod } from '../method.ts'

export const blowCountBase = formula({
  symbol: 'q_b',
  name: 'unit base resistance',
  unit: 'kPa',
  text: 'min((57.5 kPa) * N_60, (2900 kPa))',
  where: { N_60: '1' },
  source: cite('fhwa-if-99-025', 'base of drilled shafts in sand'),
  range: [{ symbol: 'N_60', max: 50 }],
})
/** Blow count up to which the rule was published. */
const LARGEST_N60 = 50

/** Bored piles in sand, from the blow count. */
export const oneillReeseSandBase1999: BaseMethod = {
  id: 'oneill-reese-1999',
  kind: 'granular-base',
  title: "O'Neill & Reese (1999), base of drilled shafts in sand",
  installations: ['bored', 'continuous-flight-auger'],
  needs: ['sptN60'],
  parameters: {},
  formulas: [blowCountBase],
  validity: 'Bored piles in sand, N60 up to 50.',
  source: 'fhwa-if-99-025',
  unitBaseResistance: (at) => {
    noticeInstallation(at, oneillReeseSandBase1999)
    const N_60 = at.parameter('sptN60', 'N_60', '1')
    if (N_60.value > LARGEST_N60)
      at.notice({
        code: 'outside-range',
        level: 'warning',
        pointer: at.pointer,
        text: `oneill-reese-1999 was published for N60 up to ${LARGEST_N60}; ${at.layer.name} has ${N_60.value}.`,
      })
    return at.sheet.step(blowCountBase, { N_60 })
  },
}
