import { refuse } from '../faults.ts'
import type { UnitCode } from '../quantities/units.ts'
import type { Citation } from '../sources/source.ts'
import { compile, type Operands } from './compile.ts'
import { plain } from './plain-string.ts'
import type { Term } from './term.ts'

export type Range = { readonly symbol: string; readonly min?: number; readonly max?: number }

export type Declaration<W extends Record<string, UnitCode>, U extends UnitCode> = {
  readonly symbol: string
  readonly name: string
  readonly unit: U
  /** The formula as text; `100 kPa` is a quantity literal, every product is written with `*`. */
  readonly text: string
  readonly where: W
  readonly source: Citation
  /** Published range of validity, in the declared units of the operands. */
  readonly range?: readonly Range[]
}

export type TermsOf<W extends Record<string, UnitCode>> = { readonly [K in keyof W]: Term<W[K]> }

export type Formula<
  W extends Record<string, UnitCode> = Record<string, UnitCode>,
  U extends UnitCode = UnitCode,
> = Declaration<W, U> & {
  readonly names: readonly string[]
  /** Refuses an operand whose unit is not the declared one. */
  readonly evaluate: (operands: Operands) => number
}

const declared: Formula[] = []

/** Every formula that loaded modules have declared: what the tests walk. */
export const declaredFormulas = (): readonly Formula[] => declared

/**
 * Declares a formula once: value, printed line, dimension check and native code come from this text.
 * Throws when the module loads if a symbol is unknown, an operand unused or the dimension wrong.
 */
export function formula<const W extends Record<string, UnitCode>, const U extends UnitCode>(
  declaration: Declaration<W, U>,
): Formula<W, U> {
  const { text, where, unit } = declaration
  const made = {
    ...declaration,
    symbol: plain(declaration.symbol),
    name: plain(declaration.name),
    text: plain(text),
    names: Object.keys(where),
    evaluate: compile(text, where, unit, (odd, got) =>
      refuse('wrong-dimension', '', { field: `${declaration.name}: ${odd}`, got, expected: where[odd]! }),
    ),
  }
  declared.push(made as unknown as Formula)
  return made
}
