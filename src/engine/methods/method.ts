import type { Layer } from '../ground/profile-types.ts'
import type { Notice } from '../notice.ts'
import type { Installation, Section } from '../piles/pile-type.ts'
import type { UnitCode } from '../quantities/units.ts'
import type { Formula } from '../trace/formula.ts'
import type { Sheet } from '../trace/sheet.ts'
import type { Term } from '../trace/term.ts'

/** A parameter of a method that a request may set. */
export type Parameter = {
  readonly symbol: string
  readonly name: string
  readonly unit: UnitCode
  readonly min: number
  readonly max: number
  readonly required: boolean
}

/** The shape that every resistance method has in common; the catalogue prints it. */
export type MethodCard = {
  readonly id: string
  readonly kind: 'cohesive-shaft' | 'cohesive-base' | 'granular-shaft' | 'granular-base' | 'settlement'
  readonly title: string
  readonly installations: readonly Installation[]
  /** Layer parameters that the method needs, by their field names. */
  readonly needs: readonly string[]
  readonly parameters: Readonly<Record<string, Parameter>>
  readonly formulas: readonly Formula[]
  readonly validity: string
  /** How it works, where the formulas alone do not tell. */
  readonly theory?: string
  /** How far from the truth it is known to lie. */
  readonly errorBounds?: string
  /** The source key of the method itself (not of auxiliary formulas). */
  readonly source: string
}

/** What a method sees at one place of the ground. */
export type MethodContext = {
  readonly sheet: Sheet
  readonly layer: Layer
  /** JSON Pointer of the layer in the request. */
  readonly pointer: string
  /** A parameter of the layer at this depth; a missing one is refused with layer, parameter and method. */
  readonly parameter: <U extends UnitCode>(name: string, symbol: string, unit: U) => Term<U>
  /** A parameter of the method from the request, undefined when the request does not set it. */
  readonly setting: <U extends UnitCode>(name: string, symbol: string, unit: U) => Term<U> | undefined
  readonly section: Section
  readonly installation: Installation
  readonly direction: 'compression' | 'uplift'
  readonly notice: (notice: Notice) => void
}

export type ShaftContext = MethodContext & {
  /** Middle of the sublayer. */
  readonly depth: Term<'m'>
  readonly effectiveStress: () => Term<'kPa'>
  /** Vertical effective stress at any depth (stresses held constant below 20 d). */
  readonly effectiveStressAt: (depth: Term<'m'>, id: string) => Term<'kPa'>
  readonly diameter: Term<'m'>
  readonly toeDepth: Term<'m'>
}
export type BaseContext = MethodContext & {
  readonly depth: Term<'m'>
  readonly effectiveStress: () => Term<'kPa'>
  readonly effectiveStressAt: (depth: Term<'m'>, id: string) => Term<'kPa'>
  /** Width of the base: d_b of a pile, breadth B of a block. */
  readonly breadth: Term<'m'>
  /** Length of a block; for one pile equal to the breadth. */
  readonly length: Term<'m'>
}

export type ShaftMethod = MethodCard & {
  /** Depth above which the soil carries nothing, m. */
  readonly idleDepth?: number
  readonly unitShaftResistance: (at: ShaftContext) => Term<'kPa'>
}
export type BaseMethod = MethodCard & { readonly unitBaseResistance: (at: BaseContext) => Term<'kPa'> }
