import type { UnitCode } from '../quantities/units.ts'

/** A number with its unit, its symbol, and where it came from: the id of a step ('' on a silent sheet). */
export type Term<U extends UnitCode = UnitCode> = {
  readonly value: number
  readonly unit: U
  readonly symbol: string
  readonly from: string
}

export function isTerm(x: unknown): x is Term {
  return typeof x === 'object' && x !== null && 'value' in x && 'unit' in x && 'symbol' in x && 'from' in x
}
