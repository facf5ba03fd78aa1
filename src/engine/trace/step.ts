import type { UnitCode } from '../quantities/units.ts'
import type { Citation, Source } from '../sources/source.ts'

/** Steps as they stand on the wire. */
export type OperandLine = {
  readonly symbol: string
  readonly value: number
  readonly unit: UnitCode
  readonly from: string
}

type Line = {
  readonly id: string
  readonly symbol: string
  readonly name: string
  readonly value: number
  readonly unit: UnitCode
  readonly quantity: string
}
export type RangeLine = {
  readonly symbol: string
  readonly min?: number
  readonly max?: number
  readonly inside: boolean
}
export type InputStep = Line & {
  readonly kind: 'input'
  readonly from?: string
  readonly default?: true
  readonly reason?: string
  readonly source?: Citation
}
export type FormulaStep = Line & {
  readonly kind: 'formula'
  readonly formula: string
  readonly operands: readonly OperandLine[]
  readonly source: Citation
  readonly range?: readonly RangeLine[]
}
export type SumStep = Line & { readonly kind: 'sum'; readonly operands: readonly OperandLine[] }
export type LookupStep = Line & {
  readonly kind: 'lookup'
  readonly operands: readonly OperandLine[]
  /** The bracketing rows [argument, value]; linear between them. */
  readonly rows: readonly (readonly [number, number])[]
  readonly source: Citation
}
export type ChoiceStep = Line & {
  readonly kind: 'choice'
  readonly rule: 'smallest' | 'largest'
  readonly operands: readonly OperandLine[]
  readonly chosen: string
}
export type SolutionStep = Line & {
  readonly kind: 'solution'
  readonly method: string
  readonly operands: readonly OperandLine[]
  readonly unknowns: readonly { readonly symbol: string; readonly value: number; readonly unit: UnitCode }[]
  readonly residuals: readonly { readonly name: string; readonly value: number }[]
  readonly tolerance: number
  /** Depths between the elements that were solved for, m. */
  readonly mesh?: readonly number[]
  readonly table?: SolutionTable
  readonly source: Citation
}
/** Values that the solution is read from: one symbol and unit a column, one row a line. */
export type SolutionTable = {
  readonly columns: readonly { readonly symbol: string; readonly unit: UnitCode }[]
  readonly rows: readonly (readonly number[])[]
}
export type Step = InputStep | FormulaStep | SumStep | LookupStep | ChoiceStep | SolutionStep

/** The ordered lines from input to result; `results` ties each number of the result (JSON Pointer) to its step. */
export type Trace = {
  readonly steps: readonly Step[]
  readonly results: Readonly<Record<string, string>>
  readonly sources: readonly Source[]
}
