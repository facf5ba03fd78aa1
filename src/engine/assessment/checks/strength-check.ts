import type { Sheet } from '../../trace/sheet.ts'
import type { Term } from '../../trace/term.ts'
import type { CapActions } from '../cap-loads.ts'
import type { ResistanceSet } from '../resistance-set.ts'
import type { Cap, Schedule } from '../schedule.ts'

export type StrengthKind =
  | 'pile-compression'
  | 'pile-uplift'
  | 'group-compression'
  | 'block-compression'
  | 'group-uplift'
  | 'block-uplift'
  | 'pile-section'

/** A cap under one combination: the actions and the extreme pile loads, as bare numbers. */
export type LoadedCap = {
  readonly schedule: Schedule
  readonly cap: Cap
  readonly set: ResistanceSet
  readonly load: CapActions
  readonly most: { readonly pile: number; readonly load: number }
  readonly least: { readonly pile: number; readonly load: number }
}

/** What a combination asks of one part: a positive number, of which pile, and whether it pulls. */
export type Demand = { readonly value: number; readonly pile?: number; readonly pulled: boolean }

/** One comparison of demand and resistance. The demand is a bare number, so that thousands of combinations stay cheap; the resistance is a step. */
export type StrengthCheck = {
  readonly kind: StrengthKind
  /** Undefined where the check does not apply to this combination. */
  readonly demand: (at: LoadedCap) => Demand | undefined
  readonly resistance: (at: Pick<LoadedCap, 'schedule' | 'cap' | 'set'>, demand: Demand, sheet: Sheet) => Term<'kN'>
}

/** Tension below this is rounding of the pile loads, kN. */
export const NO_TENSION = 1e-9
