/** A pile type as the engine takes it: m, kN, kPa. */

export type Section =
  | { readonly shape: 'circular'; readonly diameter: number }
  | { readonly shape: 'square'; readonly width: number }
  | {
      readonly shape: 'tubular'
      readonly diameter: number
      readonly wallThickness: number
      readonly toe: 'open' | 'closed'
    }
  | { readonly shape: 'h'; readonly depth: number; readonly flangeWidth: number; readonly area: number }

export type Installation = 'driven' | 'bored' | 'continuous-flight-auger'

export type PileType = {
  readonly section: Section
  readonly length: number
  /** Head below the surface; the toe stands at headDepth + length. Default 0. */
  readonly headDepth?: number
  readonly installation: Installation
  readonly youngsModulus?: number
  /** Enlarged base. Default: the shaft's own width. */
  readonly baseDiameter?: number
  readonly unitWeight?: number
  readonly sectionResistance?: { readonly compression?: number; readonly tension?: number }
}
