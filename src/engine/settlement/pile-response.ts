import type { Point } from '../piles/layout.ts'
import type { Citation } from '../sources/source.ts'
import type { Sheet } from '../trace/sheet.ts'
import type { Term } from '../trace/term.ts'
import type { CoupledPiles } from './continuum/coupled-piles.ts'
import type { SolvedPile } from './continuum/single-pile.ts'

/** Places of the parts of a request, as JSON Pointers. */
export type SettlementPlaces = {
  readonly pile: string
  readonly ground: string
  readonly layout: string
  readonly load: string
}

/** How one pile answers to load, and what it does to its neighbours, whatever the method. */
export type PileResponse = {
  readonly stiffness: Term<'kN/m'>
  readonly baseLoadShare: Term<'1'>
  readonly width: Term<'m'>
  /** Young's modulus of the ground at the toe. */
  readonly toeModulus: Term<'kPa'>
  /** Interaction factor of two equal piles at a spacing in m. */
  readonly interaction: (spacing: number) => number
  /** Terms that the interaction in a group rests on; the smallest spacing is where the group asks the curve first. */
  readonly basis: (sheet: Sheet, smallestSpacing: number) => readonly Term[]
  readonly source: Citation
  /** Of the method that resolves the pile by its elements. */
  readonly elements?: {
    readonly solved: SolvedPile
    readonly radius: Term<'m'>
    readonly coupled: (points: readonly Point[]) => CoupledPiles
  }
}
