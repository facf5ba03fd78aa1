import { cite, practice } from '../../sources/bibliography.ts'
import { formula } from '../../trace/formula.ts'
import type { Term } from '../../trace/term.ts'
import type { BaseContext, BaseMethod } from '../method.ts'

export const clayBase = formula({
  symbol: 'q_b',
  name: 'unit base resistance (net)',
  unit: 'kPa',
  text: 'N_c * c_u',
  where: { N_c: '1', c_u: 'kPa' },
  source: practice('undrained bearing resistance'),
})
export const skemptonNc = formula({
  symbol: 'N_c',
  name: 'bearing factor',
  unit: '1',
  text: '5 * (1 + 0.2 * min(D / B, 2.5)) * (1 + 0.2 * B / L_g)',
  where: { D: 'm', B: 'm', L_g: 'm' },
  source: cite('skempton-1951', 'rectangle rule'),
})
export const linearNc = formula({
  symbol: 'N_c',
  name: 'bearing factor',
  unit: '1',
  text: 'min(9, 5.6 + 0.85 * D / B)',
  where: { D: 'm', B: 'm' },
  source: practice('9 from D/B = 4'),
})
export const nhiNc = formula({
  symbol: 'N_c',
  name: 'bearing factor',
  unit: '1',
  text: 'min(9, 5 * (1 + 0.2 * D / B) * (1 + 0.2 * B / L_g))',
  where: { D: 'm', B: 'm', L_g: 'm' },
  source: cite('fhwa-nhi-05-042', '9.8.1.3'),
})

/** q_b = N_c c_u at the toe. */
export const byBearingFactor =
  (factor: (at: BaseContext) => Term<'1'>): BaseMethod['unitBaseResistance'] =>
  (at) => {
    const c_u = at.parameter('undrainedShearStrength', 'c_u', 'kPa')
    return at.sheet.step(clayBase, { N_c: factor(at), c_u })
  }
