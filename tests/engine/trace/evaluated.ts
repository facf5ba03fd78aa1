import type { UnitCode } from '../../../src/engine/quantities/units.ts'
import type { Formula } from '../../../src/engine/trace/formula.ts'

/** The value of a formula for bare numbers in its declared units. */
export const evaluated = <W extends Record<string, UnitCode>, U extends UnitCode>(
  f: Pick<Formula<W, U>, 'evaluate' | 'where'>,
  values: { readonly [K in keyof W]: number },
): number =>
  f.evaluate(Object.fromEntries(Object.entries(values).map(([name, value]) => [name, { value, unit: f.where[name]! }])))
