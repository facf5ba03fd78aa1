/** A ground profile as the engine takes it: quantities are plain numbers in m, kPa, kN/m3, deg. */

export type Varying = number | { readonly top: number; readonly bottom: number }

type AnyLayer = {
  readonly name: string
  /** Left out only on the last layer: it goes on. */
  readonly thickness?: number
  /** Bulk unit weight, below water: saturated. */
  readonly unitWeight: number
  readonly sptN60?: number
  readonly coneResistance?: Varying
  readonly youngsModulus?: Varying
  readonly poissonsRatio?: number
}
export type CohesiveLayer = AnyLayer & {
  readonly soil: 'cohesive'
  readonly undrainedShearStrength?: Varying
  readonly plasticityIndex?: number
  readonly overconsolidationRatio?: number
  readonly effectiveFrictionAngle?: number
}
export type GranularLayer = AnyLayer & {
  readonly soil: 'granular'
  readonly frictionAngle?: number
  readonly relativeDensity?: number
}
export type RockLayer = AnyLayer & {
  readonly soil: 'rock'
  readonly unconfinedCompressiveStrength?: Varying
  readonly rqd?: number
}
export type Layer = CohesiveLayer | GranularLayer | RockLayer
export type Soil = Layer['soil']

export type GroundProfile = {
  readonly name?: string
  /** Depth of the water table; left out: below all. */
  readonly waterTableDepth?: number
  readonly layers: readonly Layer[]
  /** True: the bottom of the last layer is rigid rock (settlement). */
  readonly rigidBase?: boolean
}
