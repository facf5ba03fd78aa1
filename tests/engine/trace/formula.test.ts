import { expect, test } from 'vitest'
import { EngineFault } from '../../../src/engine/faults.ts'
import type { UnitCode } from '../../../src/engine/quantities/units.ts'
import { formula } from '../../../src/engine/trace/formula.ts'
import { Sheet } from '../../../src/engine/trace/sheet.ts'

const source = { key: 'test', locator: '' }
const declare = (text: string, unit: UnitCode, where: Record<string, UnitCode>) =>
  formula({ symbol: 'y', name: 'y', unit, text, where, source })

const refused: readonly [string, string, UnitCode, Record<string, UnitCode>, RegExp][] = [
  ['an unknown symbol', 'a * b', 'm', { a: 'm' }, /unknown symbol b/],
  ['an unused operand', 'a', 'm', { a: 'm', b: 'm' }, /operand b is declared and not used/],
  ['a wrong dimension', 'a * b', 'm', { a: 'm', b: 'm' }, /has dimension m\^2 kN\^0, declared m/],
  ['a sum of unlike terms', 'a + b', 'm', { a: 'm', b: 'kN' }, /joins different dimensions/],
  ['a comparison of unlike terms', 'a < b ? a : a', 'm', { a: 'm', b: 'kPa' }, /joins different dimensions/],
  ['branches of unlike terms', 'a > 1 ? b : a', 'm', { a: '1', b: 'm' }, /branches differ/],
  ['the smallest of unlike terms', 'min(a, b)', 'm', { a: 'm', b: 'kN' }, /compares different dimensions/],
  ['the exponential of a length', 'exp(a)', '1', { a: 'm' }, /exp needs a ratio/],
  ['a variable power of a length', 'a^n', 'm', { a: 'm', n: '1' }, /constant power/],
  ['an implicit product', '2 a', 'm', { a: 'm' }, /write products with \*/],
  ['an implicit product of operands', 'a b', 'm2', { a: 'm', b: 'm' }, /write products with \*/],
  ['an unlisted function', 'gamma(a)', '1', { a: '1' }, /function gamma is not allowed/],
  ['an inherited name as function', 'toString(a)', '1', { a: '1' }, /function toString is not allowed/],
  ['an assignment', 'b = a', '1', { a: '1' }, /AssignmentNode is not allowed/],
  ['two statements', 'a; a', '1', { a: '1' }, /BlockNode is not allowed/],
  ['text', '"a"', '1', {}, /only numbers/],
  ['an access to a property', 'a.constructor', '1', { a: '1' }, /AccessorNode is not allowed/],
]

test.each(refused)('%s is refused when the formula is declared', (_, text, unit, where, why) => {
  expect(() => declare(text, unit, where)).toThrow(why)
})

const values: readonly [string, UnitCode, Record<string, [number, UnitCode]>, number][] = [
  ['sin(phi)', '1', { phi: [30, 'deg'] }, 0.5],
  ['tan(phi)', '1', { phi: [45, 'deg'] }, 1],
  ['sin(phi)', '1', { phi: [Math.PI / 6, 'rad'] }, 0.5],
  ['atan(t)', 'deg', { t: [1, '1'] }, 45],
  ['atan(t)', 'rad', { t: [1, '1'] }, Math.PI / 4],
  ['f * phi', 'deg', { f: [0.75, '1'], phi: [30, 'deg'] }, 22.5],
  ['P / k', 'mm', { P: [500, 'kN'], k: [100_000, 'kN/m'] }, 5],
  ['P / s', 'kN/m', { P: [500, 'kN'], s: [5, 'mm'] }, 100_000],
  ['s + d', 'm', { s: [250, 'mm'], d: [1, 'm'] }, 1.25],
  ['s + d', 'mm', { s: [250, 'mm'], d: [1, 'm'] }, 1250],
  ['max(s, (20 mm))', 'mm', { s: [5, 'mm'] }, 20],
  ['c_u / (100 kPa)', '1', { c_u: [50, 'kPa'] }, 0.5],
  ['c_u < (24 kPa) ? 0.67 : 1', '1', { c_u: [23.9, 'kPa'] }, 0.67],
  ['sqrt(A)', 'm', { A: [9, 'm2'] }, 3],
  ['-a^2', '1', { a: [3, '1'] }, -9],
  ['a - b - c', '1', { a: [1, '1'], b: [2, '1'], c: [4, '1'] }, -5],
  ['a / b / c', '1', { a: [8, '1'], b: [2, '1'], c: [2, '1'] }, 2],
  ['a^b^c', '1', { a: [2, '1'], b: [3, '1'], c: [2, '1'] }, 512],
]

test.each(values)('%s in %s', (text, unit, operands, expected) => {
  const where = Object.fromEntries(Object.entries(operands).map(([name, [, code]]) => [name, code]))
  const terms = Object.fromEntries(
    Object.entries(operands).map(([name, [value, code]]) => [name, { value, unit: code }]),
  )
  expect(declare(text, unit, where).evaluate(terms)).toBeCloseTo(expected, 12)
})

test('a term in another unit than the declared one is refused, also of the same dimension', () => {
  const double = formula({ symbol: 'y', name: 'y', unit: 'm', text: '2 * a', where: { a: 'm' }, source })
  for (const sheet of [Sheet.recording(), Sheet.silent]) {
    const inMillimetres = sheet.input({ symbol: 'a', name: 'a', unit: 'mm' }, 4, '/a')
    // @ts-expect-error the compiler refuses it too
    expect(() => sheet.step(double, { a: inMillimetres })).toThrow(EngineFault)
  }
})

test('a result that is not finite is refused', () => {
  const inverse = formula({ symbol: 'y', name: 'y', unit: '1', text: '1 / a', where: { a: '1' }, source })
  const sheet = Sheet.recording()
  const zero = sheet.input({ symbol: 'a', name: 'a', unit: '1' }, 0, '/a')
  expect(() => sheet.step(inverse, { a: zero })).toThrow(EngineFault)
})
