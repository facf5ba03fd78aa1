import { cite } from '../sources/bibliography.ts'
import type { Sheet } from '../trace/sheet.ts'
import type { Term } from '../trace/term.ts'
import type { CapActions } from './cap-loads.ts'
import { idPart } from './places.ts'
import type { ResistanceSet } from './resistance-set.ts'

export type SettlementTerms = {
  readonly combination: string
  readonly settlement: Term<'mm'>
  readonly tilt: Term<'1'>
}

/** Settlement at the centroid of the piles and slope of the cap under one combination: the prepared plane times the actions. */
export function settleCap(
  sheet: Sheet,
  set: ResistanceSet,
  combination: string,
  load: CapActions,
  pointer: string,
): SettlementTerms {
  const plane = set.elastic.plane(load, pointer)
  const here = sheet.within(`settlement/${idPart(combination)}`)
  const solved = {
    method: 'prepared plane flexibility times the actions',
    operands: [set.pileStiffness],
    residuals: [],
    tolerance: 1e-9,
    source: cite('randolph-wroth-1978', 'superposition'),
  }
  const value = plane.centre * 1000
  const tilt = Math.hypot(plane.alongX, plane.alongY)
  const slopes = [
    { symbol: 'theta_x', value: plane.alongX, unit: '1' as const },
    { symbol: 'theta_y', value: plane.alongY, unit: '1' as const },
  ]
  return {
    combination,
    settlement: here.solution({
      symbol: 's',
      name: 'settlement of the cap at the centroid of its piles',
      unit: 'mm',
      value,
      unknowns: [{ symbol: 's', value, unit: 'mm' }],
      ...solved,
    }),
    tilt: here.solution({
      symbol: 'theta',
      name: 'tilt of the cap',
      unit: '1',
      value: tilt,
      unknowns: slopes,
      ...solved,
    }),
  }
}
