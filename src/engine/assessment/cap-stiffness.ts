import { statics } from '../sources/bibliography.ts'
import type { Sheet } from '../trace/sheet.ts'
import type { Term } from '../trace/term.ts'
import { idPart } from './places.ts'
import type { ResistanceSet } from './resistance-set.ts'
import type { Cap } from './schedule.ts'

/** Springs of a cap for the structural model, each component acting alone; 0 where the piles cannot take it. */
export function capStiffness(sheet: Sheet, cap: Cap, set: ResistanceSet) {
  const here = sheet.within(`caps/${idPart(cap.mark)}/stiffness`)
  const { f, r_x, r_y } = set.prepared.flexibility
  const term = <const U extends 'kN/m' | 'kN.m/rad'>(symbol: string, name: string, unit: U, i: number): Term<U> => {
    const own = set.prepared.elastic.flexibility[i * 4]!
    const value = own > 0 ? 1 / own : 0
    return here.solution({
      symbol,
      name,
      unit,
      value,
      method: 'inverse of the flexibility about the centroid of the piles',
      operands: [f, r_x, r_y, set.prepared.stiffness],
      unknowns: [{ symbol, value, unit }],
      residuals: [{ name: 'stiffness times flexibility, less 1', value: own > 0 ? Math.abs(value * own - 1) : 0 }],
      tolerance: 1e-9,
      source: statics('inverse of the plane flexibility'),
    })
  }
  return {
    vertical: term('K_v', 'vertical stiffness', 'kN/m', 0),
    rockingAlongX: term('K_rx', 'rocking stiffness along x', 'kN.m/rad', 1),
    rockingAlongY: term('K_ry', 'rocking stiffness along y', 'kN.m/rad', 2),
    atOrigin: set.matrices,
  }
}
