import type { DesignBasis } from '../design-basis/design-basis.ts'
import type { GroundProfile } from '../ground/profile-types.ts'
import type { MethodChoices } from '../methods/method-choice.ts'
import type { Layout } from '../piles/layout.ts'
import type { PileType } from '../piles/pile-type.ts'
import type { SettlementMethod } from '../requests.ts'

export type LimitState = 'ultimate' | 'working' | 'serviceability'
export type Signs = 'pressing' | 'right-handed-z-up' | 'right-handed-z-down'

export type Cap = {
  readonly mark: string
  readonly x: number
  readonly y: number
  readonly ground: string
  readonly pileType: string
  readonly layout: Layout
  /** Added to V. Default 0, kN. */
  readonly capWeight?: number
}

export type ModelRow = {
  readonly cap: string
  readonly combination: string
  readonly Fx: number
  readonly Fy: number
  readonly Fz: number
  readonly Mx: number
  readonly My: number
  readonly Mz: number
}
export type PressingRow = {
  readonly cap: string
  readonly combination: string
  readonly V: number
  readonly Mx: number
  readonly My: number
}

export type Loads = {
  readonly signs: Signs
  readonly loadsAre: 'actions' | 'reactions'
  readonly combinations: Readonly<Record<string, { readonly limitState: LimitState }>>
  readonly rows: readonly (ModelRow | PressingRow)[]
}

export type Limits = { readonly settlement?: number; readonly tilt?: number; readonly angularDistortion?: number }

/** The input of the main job. */
export type Schedule = {
  readonly title: string
  readonly designBasis: DesignBasis
  readonly methods?: MethodChoices
  readonly settlementMethod?: SettlementMethod
  /** Each cap also settles in the field of all others. */
  readonly capInteraction?: boolean
  readonly ground: Readonly<Record<string, GroundProfile>>
  readonly pileTypes: Readonly<Record<string, PileType>>
  readonly caps: readonly Cap[]
  readonly loads: Loads
  readonly limits?: Limits
}
