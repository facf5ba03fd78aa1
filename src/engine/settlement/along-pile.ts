import { practice, statics } from '../sources/bibliography.ts'
import { formula } from '../trace/formula.ts'
import type { Sheet } from '../trace/sheet.ts'
import type { Term } from '../trace/term.ts'
import type { PileResponse } from './pile-response.ts'

export const elementForce = formula({
  symbol: 'Q_i',
  name: 'load that an element takes up',
  unit: 'kN',
  text: 'P * q / k',
  where: { P: 'kN', q: 'kN/m', k: 'kN/m' },
  source: statics('share of the load'),
})
export const shearOf = formula({
  symbol: 'tau',
  name: 'shaft stress',
  unit: 'kPa',
  text: 'Q / (2 * pi * r_0 * (z_b - z_t))',
  where: { Q: 'kN', r_0: 'm', z_b: 'm', z_t: 'm' },
  source: statics('force over surface of the equal circle'),
})
export const loadBelow = formula({
  symbol: 'N',
  name: 'axial load at the bottom of an element',
  unit: 'kN',
  text: 'N_t - Q',
  where: { N_t: 'kN', Q: 'kN' },
  source: statics('equilibrium of an element'),
})

/** Axial load at the bottom of each shaft element and mean shaft stress on it, from the head down; positive loads press, positive stresses hold. */
export function alongPile(sheet: Sheet, pile: PileResponse, P: Term<'kN'>) {
  const { elements, stiffness: k } = pile
  if (!elements) return undefined
  const { solved, radius: r_0 } = elements
  const { edges } = solved.soil.mesh
  const depth = (i: number) =>
    sheet.assumed(
      { symbol: 'z', name: 'depth between elements', unit: 'm' },
      edges[i]!,
      'elements end at layer boundaries and grow finer towards them',
      practice('mesh graded by cosines'),
      `mesh/${i}/z`,
    )
  let above = P
  let z_t = depth(0)
  return Array.from({ length: edges.length - 1 }, (_, i) => {
    const here = sheet.within(`${i}`)
    const value = solved.forces[i]!
    const q = here.solution({
      symbol: 'q',
      name: 'force of the element for a unit settlement of the head',
      unit: 'kN/m',
      value,
      method: 'unknown of the solution of the pile',
      operands: [k],
      unknowns: [{ symbol: `q_${i + 1}`, value, unit: 'kN/m' }],
      residuals: [{ name: 'compatibility', value: solved.compatibility }],
      tolerance: 1e-9,
      source: pile.source,
    })
    const Q = here.step(elementForce, { P, q, k })
    const z_b = depth(i + 1)
    const shaftStress = here.step(shearOf, { Q, r_0, z_b, z_t })
    above = here.step(loadBelow, { N_t: above, Q })
    z_t = z_b
    return { depth: z_b, axialLoad: above, shaftStress }
  })
}
