import type { DesignBasis } from './design-basis/design-basis.ts'
import type { GroundProfile } from './ground/profile-types.ts'
import type { MethodChoices } from './methods/method-choice.ts'
import type { Layout } from './piles/layout.ts'
import type { PileType } from './piles/pile-type.ts'

/** Requests of the calculators. */
export type SinglePileRequest = {
  readonly pile: PileType
  readonly ground: GroundProfile
  readonly direction?: 'compression' | 'uplift'
  readonly methods?: MethodChoices
  readonly designBasis?: DesignBasis
}
export type GroupRequest = SinglePileRequest & { readonly layout: Layout }
export type SettlementMethod = 'elastic-continuum' | 'randolph-wroth-1978'
export type SettlementRequest = {
  readonly pile: PileType
  readonly ground: GroundProfile
  readonly layout?: Layout
  readonly load: { readonly V: number; readonly Mx?: number; readonly My?: number }
  readonly cap?: 'rigid' | 'flexible'
  readonly method?: SettlementMethod
  /** `full` lets every element of every pile act on every other, up to 64 piles; left out: superposed interaction factors. */
  readonly coupling?: 'full'
  /** `hyperbolic`: the pile's own springs soften towards its resistance by `methods`. */
  readonly nonlinearity?: 'hyperbolic'
  readonly failureRatio?: { readonly shaft?: number; readonly base?: number }
  readonly methods?: MethodChoices
}
